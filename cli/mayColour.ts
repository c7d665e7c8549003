/**
 * Whether text may be coloured: only on a terminal that can, and only if the user has not said otherwise.
 *
 * Reference: no-color.org: NO_COLOR, when present and not empty, turns colours off.
 */
export function mayColour(stream: { isTTY?: boolean }, env: Readonly<Record<string, string | undefined>>): boolean {
  return stream.isTTY === true && !env.NO_COLOR && env.TERM !== 'dumb';
}
