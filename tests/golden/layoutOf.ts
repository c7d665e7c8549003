/** Tables of hours, months and inputs have a row each of one kind: of more than this many such rows the rest is left out. */
const ROWS_SHOWN = 4;

/**
 * The layout alone: each element that holds text on a line of its own, groups of digits #, hashes h, drawings and data
 * left out, and of long tables the first rows.
 */
export function layoutOf(page: string): string {
  const read = page
    .replace(/<(style|script)[^>]*>[\s\S]*?<\/\1>/g, '')
    .replace(/<svg class="(\w+)".*?<\/svg>/gs, (_, kind) => `[${kind}]`)
    .replace(/<pre.*?<\/pre>/gs, '[text]')
    .replace(/<\/(?:td|th)>(?=<t[dh])/g, ' | ')
    .replace(/<(?!\/?(?:h[1-6]|tr|p|li|figure|figcaption|summary|dt|caption|header|footer|section|pre)\b)[^>]*>/g, '')
    .replace(/<\/[^>]*>/g, '\n')
    .replace(/<(h[1-6])[^>]*>/g, '\n$1 ')
    .replace(/<(?:tr|li)[^>]*>/g, '  ')
    .replace(/<[^>]*>/g, '\n')
    .replace(/[0-9a-f]{64}/g, 'h')
    .replace(/[−+]?[\d.\u202f]*\d/g, '#');
  const lines = read.split('\n').filter((line) => line.trim() !== '');
  let alike = 0;
  return `${lines
    .filter((line, i) => {
      const sameKind = line.startsWith('  ') && i > 0 && lines[i - 1]!.startsWith('  ');
      alike = sameKind ? alike + 1 : 0;
      return alike < ROWS_SHOWN;
    })
    .join('\n')}\n`;
}
