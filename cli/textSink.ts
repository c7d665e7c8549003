import type { Writable } from 'node:stream';
import { faultCode } from './faultWords.ts';
import { OutputFault } from './outputFile.ts';

/** Somewhere text goes. */
export interface TextSink {
  /** Resolves when the text is taken. A reader that has gone away is no fault. @throws OutputFault */
  write(text: string): Promise<void>;
}

const READER_GONE = ['EPIPE', 'ERR_STREAM_DESTROYED', 'ERR_STREAM_WRITE_AFTER_END'];

/**
 * A standard stream as a place for text.
 *
 * @param stream standard output or error
 * @param name what a fault calls it
 */
export function textSink(stream: Writable, name: string): TextSink {
  // Each write reports its own fault; without a listener the stream would end the program by itself.
  stream.on('error', () => {});
  return {
    write: (text) =>
      new Promise((resolve, reject) => {
        stream.write(text, (fault) => {
          if (fault && !READER_GONE.includes(faultCode(fault))) reject(new OutputFault(name, fault));
          else resolve();
        });
      }),
  };
}
