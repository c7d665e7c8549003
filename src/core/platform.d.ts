/** The one thing of the platform that src uses; it exists in node, in a worker and in a browser. */
declare class TextDecoder {
  constructor(label?: string, options?: { fatal?: boolean });
  decode(input?: Uint8Array): string;
}
