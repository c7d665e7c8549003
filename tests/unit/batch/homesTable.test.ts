import { describe, expect, it } from 'vitest';
import { CsvRecords, LONGEST_RECORD } from '../../../src/batch/csvRecords.ts';
import { homeOf, homesHeader, isBlank, isRemark } from '../../../src/batch/homesTable.ts';
import { problemText } from '../../../src/core/problemText.ts';

const recordsOf = (text: string) => {
  const records = new CsvRecords();
  return [...records.push(new TextEncoder().encode(text)), ...records.end()];
};

function table(text: string, nameColumn = 'home') {
  const [first, ...rows] = recordsOf(text);
  const { header, problems } = homesHeader(first!, 'homes.csv', nameColumn);
  const homes = header === undefined ? [] : rows.map((row, i) => homeOf(header, row, i + 1));
  return { header, homes, texts: problems.map(problemText) };
}

describe('the columns of a table of homes', () => {
  it('are places in a scenario, beside the names of the homes', () => {
    const { header, texts } = table('house.heatLoss.value,home,tariffs[0]\n');
    expect(texts).toEqual([]);
    expect(header?.nameColumn).toBe(1);
    expect(header?.columns.map(({ name, index }) => [name, index])).toEqual([
      ['house.heatLoss.value', 0],
      ['tariffs[0]', 2],
    ]);
  });

  it('that no scenario has are told all at once, with the nearest', () => {
    const { header, texts } = table('home,house.heatLos.value,colour,house.need\n');
    expect(header).toBeUndefined();
    expect(texts).toEqual([
      "homes.csv:1:6  column 'house.heatLos.value' is no place in a scenario\n    → perhaps house.heatLoss is meant",
      expect.stringMatching(/^homes.csv:1:26 {2}column 'colour' is no place in a scenario\n {4}→ call it as in docs/),
      "homes.csv:1:33  column 'house.need' holds a section, not a single value\n    → name one of the entries in it, a column each",
    ]);
  });

  it('need one with the names, and none twice', () => {
    expect(table('id,site.altitude\n').texts[0]).toMatch(/has no column 'home'; its columns are id and site\.altitude/);
    expect(table('id,site.altitude\n', 'id').texts).toEqual([]);
    expect(table('home,site.altitude,site.altitude\n').texts).toEqual([
      "homes.csv:1  column 'site.altitude' stands twice\n    → keep one of the two",
    ]);
  });
});

describe('the row of a home', () => {
  it('says what is otherwise; an empty cell says nothing', () => {
    const { homes } = table('home,house.heatLoss.value,site.altitude\nMill Lane 1,180.5,\n');
    expect(homes[0]).toMatchObject({
      name: 'Mill Lane 1',
      line: 2,
      problems: [],
      changes: [
        { path: ['house', 'heatLoss', 'value'], value: 180.5, origin: { file: 'homes.csv', line: 2, column: 13 } },
      ],
    });
  });

  it('may be parted by semicolons, with decimal commas and quotes', () => {
    const { homes } = table('home;house.heatLoss.value;heatPump.unit\n"Lane; 1";180,5;" a.yaml "\n');
    expect(homes[0]?.name).toBe('Lane; 1');
    expect(homes[0]?.changes.map(({ value }) => value)).toEqual([180.5, 'a.yaml']);
    expect(homes[0]?.changes[1]?.origin.column).toBe(17);
  });

  it('has a number for a name where it gives none', () => {
    expect(table('home,site.altitude\nA,1\n,2\n').homes.map(({ name }) => name)).toEqual(['A', 'home 2']);
  });

  it('with too many or too few cells has that for its problem', () => {
    const { homes } = table('home,site.altitude\nA,1,2\nB\n');
    expect(homes.map(({ problems }) => problems.map(problemText))).toEqual([
      [expect.stringMatching(/^homes.csv:2 {2}cells in this row: 3; names of columns: 2\n/)],
      [expect.stringMatching(/^homes.csv:3 {2}cells in this row: 1;/)],
    ]);
  });

  it('with a quote that does not end has that for its problem', () => {
    const { homes } = table(`home,site.altitude\n"A,${'x'.repeat(LONGEST_RECORD)}\nB,1\n`);
    expect(homes[0]?.problems.map(problemText)).toEqual([
      expect.stringMatching(/^homes.csv:2 {2}a quoted text begins in this row and does not end within 65536 bytes\n/),
    ]);
    expect(homes[1]).toMatchObject({ name: 'B', line: 3, problems: [] });
  });

  it('may be in Latin-1', () => {
    const [first] = recordsOf('home,site.altitude\n');
    const { header } = homesHeader(first!, 'homes.csv', 'home');
    const bytes = Uint8Array.from([...'M\u00fchle,1'].map((letter) => letter.charCodeAt(0)));
    expect(homeOf(header!, { line: 2, offset: 0, bytes }, 1).name).toBe('Mühle');
  });
});

describe('rows that are no homes', () => {
  it('are blank ones, and remarks above the names of the columns', () => {
    const [blank, commas, remark, row] = recordsOf('  \n,,;\n# invented\na,b\n');
    expect([blank, commas, remark, row].map((record) => isBlank(record!))).toEqual([true, true, false, false]);
    expect(isRemark(remark!)).toBe(true);
    expect(isRemark(row!)).toBe(false);
  });
});
