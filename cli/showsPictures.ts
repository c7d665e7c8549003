/** Whether results may hold pictures of block letters: on a terminal, unless it is one that writes plain lines only. */
export function showsPictures(stream: { isTTY?: boolean }, env: Readonly<Record<string, string | undefined>>): boolean {
  return stream.isTTY === true && env.TERM !== 'dumb';
}
