import { decodeText } from '../../core/decodeText.ts';
import type { Problem } from '../../core/problem.ts';
import type { InputBytes } from '../fileSource.ts';

/**
 * The text of an input file, or the problem that it is none: control characters that no text holds stand in it.
 *
 * @param input any bytes
 */
export function textOf(input: InputBytes): { text: string; problems: [] } | { text?: undefined; problems: Problem[] } {
  const { text } = decodeText(input.bytes);
  // biome-ignore lint/suspicious/noControlCharactersInRegex: control characters are what this looks for
  if (/[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f]/.test(text)) {
    return { problems: [{ code: 'yaml.not-text', severity: 'error', file: input.name }] };
  }
  return { text, problems: [] };
}
