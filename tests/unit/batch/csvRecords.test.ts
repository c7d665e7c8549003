import { describe, expect, it } from 'vitest';
import { type CsvRecord, CsvRecords, LONGEST_RECORD } from '../../../src/batch/csvRecords.ts';

const bytes = (text: string) => new TextEncoder().encode(text);
const texts = (records: CsvRecord[]) =>
  records.map(({ line, offset, bytes: each }) => ({ line, offset, text: new TextDecoder().decode(each) }));

function read(...pieces: string[]) {
  const records = new CsvRecords();
  return texts([...pieces.flatMap((piece) => records.push(bytes(piece))), ...records.end()]);
}

describe('the rows of a table', () => {
  it('have their line and their place in the file', () => {
    expect(read('a,b\n1,2\r\n\n3,4')).toEqual([
      { line: 1, offset: 0, text: 'a,b' },
      { line: 2, offset: 4, text: '1,2' },
      { line: 3, offset: 9, text: '' },
      { line: 4, offset: 10, text: '3,4' },
    ]);
  });

  it('hold line ends that stand within quotes', () => {
    expect(read('"a\nb",1\n"c ""d""",2\n')).toEqual([
      { line: 1, offset: 0, text: '"a\nb",1' },
      { line: 3, offset: 8, text: '"c ""d""",2' },
    ]);
  });

  it('are the same wherever the pieces are cut', () => {
    const text = 'ä,b\n"x\ny",2\nlast,3';
    const whole = read(text);
    for (let at = 1; at < text.length; at++) expect(read(text.slice(0, at), text.slice(at))).toEqual(whole);
  });

  it('go on from a place in the file', () => {
    const records = new CsvRecords({ offset: 100, line: 7 });
    expect(texts(records.push(bytes('a\nb\n')))).toEqual([
      { line: 7, offset: 100, text: 'a' },
      { line: 8, offset: 102, text: 'b' },
    ]);
  });

  it('end in spite of a quote that was not closed, and the rows behind it are found again', () => {
    const found = read(`"open${'x'.repeat(LONGEST_RECORD)}\nnext,1\n`);
    expect(found[0]?.text.length).toBeGreaterThan(LONGEST_RECORD);
    expect(found[1]).toMatchObject({ line: 2, text: 'next,1' });
  });
});
