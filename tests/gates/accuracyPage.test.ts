import { expect, test } from 'vitest';
import { accuracyPage, PAGE, sectionsOf } from '../reference/accuracyPage.ts';
import { filesIn, textOf } from './houseFiles.ts';

// That each section says what its tests find is held where they run: tests/reference/accuracyRecord.ts.

const page = textOf(PAGE);
const sections = sectionsOf(page);

test('the page of accuracy has a section of every file of reference tests, and no other', () => {
  const files = filesIn('tests/reference').filter((path) => path.endsWith('.test.ts'));
  expect(files.length).toBeGreaterThan(12);
  expect([...sections.keys()].map((name) => `tests/reference/${name}`)).toEqual(files.sort());
});

test('nothing stands on the page but those sections and its own words', () => {
  expect(page).toBe(accuracyPage(sections));
  expect(page).toContain('July and August');
});

test('every row says how much was compared and how much is allowed', () => {
  const rows = page.split('\n').filter((line) => line.startsWith('| ') && !line.startsWith('| what'));
  expect(rows.length).toBeGreaterThan(40);
  for (const row of rows)
    expect(row).toMatch(
      /^\| .+ \| .+ \| [1-9]\d* \| (?:none|rounding|[\d.e-]+(?: \S+)?) \| [\d.e-]+(?: \S+)? \| .+ \|$/,
    );
});
