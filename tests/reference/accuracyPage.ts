import { existsSync } from 'node:fs';

/** The page, from the root. */
export const PAGE = 'docs/accuracy.md';

const HEAD = `# Accuracy

Written by the reference tests (\`npm run accuracy\`); a test fails where this page does not say what it finds.

Each row is a comparison that runs with every test: how many values, with what they are held against, the largest deviation
found, and how much is allowed with the reason. 'Rounding' is less than a billionth. Sources 'from memory' were written down
without the document at hand; 'worked by hand' stands with its arithmetic in the test. Agreement with formulas is not
agreement with a house: see the end of the page.`;

const TAIL = `## What was not compared, and why

- **July and August of the hourly normals.** Averaging thirty years hides their cool days: the file has 29 °F·d where 85 are
  published. The other ten months are compared.
- **Published degree days of other stations** (Boston, De Bilt, the UK standard year, stations with many bases): no hourly or
  daily weather that belongs to them comes with a package, and none is fetched.
- **Climates colder and warmer of the label.** Bins, ratios and hours are held against the tables; certified results at hand
  are of the average climate only.
- **A real house over a real year.** No open record has heat loss, unit, weather and meters by the hour. What stands in for it
  is a warning where the seasonal factor leaves 1.8–4.5; field trials of air-to-water units found 2.8 to 2.9.
- **Loss by frost.** The index is held against the same index put together from a published library; that frost takes so
  much of capacity and COP at the reference point is what the maker says or the usual value.
- **The house with mass** against other programs: steady state, decay and jump are worked by hand from the equations of
  ISO 13790, whose constants are from memory.
- **Starts of the compressor, water content, gain below the lowest flow:** rules of thumb without a published source.
- **Bills of suppliers.** Tariffs are priced by hand in the unit tests; no published bill with its hourly use is at hand.

A second, plain implementation of the model (\`tests/oracle\`) agrees with the program in every hour of random houses
(\`tests/laws/plainModel.test.ts\`); it was written from the same description, so it finds slips, not errors of the model.
`;

const MARK = /^<!-- tests\/reference\/([\w.]+) -->\n\n/gm;

/** Sections of a page by the file of tests that wrote them. */
export function sectionsOf(page: string): Map<string, string> {
  const [, ...parts] = page.split(MARK);
  const sections = new Map<string, string>();
  for (let i = 0; i + 1 < parts.length; i += 2) {
    const text = parts[i + 1] ?? '';
    const end = text.indexOf('\n\n## What was not compared');
    sections.set(parts[i] ?? '', (end < 0 ? text : text.slice(0, end)).trimEnd());
  }
  return sections;
}

/** The page of some sections, in the order of their files; a section whose file is gone goes too. */
export function accuracyPage(sections: ReadonlyMap<string, string>): string {
  const kept = [...sections].filter(([name]) => existsSync(new URL(name, import.meta.url)));
  const texts = kept
    .sort(([a], [b]) => (a < b ? -1 : 1))
    .map(([name, text]) => `<!-- tests/reference/${name} -->\n\n${text}`);
  return [HEAD, ...texts, TAIL].join('\n\n');
}
