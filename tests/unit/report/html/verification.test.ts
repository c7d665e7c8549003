import { describe, expect, it } from 'vitest';
import { readDataBlock } from '../../../../src/report/html/dataBlock.ts';
import { reportPage } from '../../../../src/report/html/reportPage.ts';
import { firstDifference, heldFigures, heldFiles } from '../../../../src/report/html/verification.ts';
import { holds, verificationText } from '../../../../src/report/html/verificationText.ts';
import { scenarioText } from '../../scenario/sampleFiles.ts';
import { sampleReport } from './reportsOf.ts';

const input = sampleReport();
const page = reportPage(input);

describe('the data of a report', () => {
  it('come back from its page', () => {
    const block = readDataBlock(page);
    expect(block).toEqual({
      form: 1,
      language: 'en',
      scenario: { file: 'house.yaml', content: scenarioText, written: 'text' },
      result: input.document,
    });
  });

  it('keep a scenario that is not plain UTF-8 byte for byte', () => {
    const marked = `\ufeff${scenarioText}`;
    const block = readDataBlock(reportPage(sampleReport(marked)));
    expect(typeof block === 'object' && block.scenario.written).toBe('base64');
    const content = typeof block === 'object' ? block.scenario.content : '';
    expect(Buffer.from(content, 'base64').toString('utf8')).toBe(marked);
  });

  it.each([
    ['', 'absent'],
    ['<html></html>', 'absent'],
    [page + page, 'absent'],
    ['<script type="application/json" id="winterledger-report">{', 'absent'],
    ['<script type="application/json" id="winterledger-report">{</script>', 'broken'],
    ['<script type="application/json" id="winterledger-report">{"form":1}</script>', 'broken'],
    [page.replace('"form":1', '"form":2'), 'broken'],
  ])('are refused where they are not one report’s', (text, why) => {
    expect(readDataBlock(text)).toBe(why);
  });
});

describe('figures held against each other', () => {
  const { document } = input;

  it('all hold against themselves, and a rounding is no difference', () => {
    const nearly = { ...document, house: { ...document.house, heatLoss: document.house.heatLoss * (1 + 1e-12) } };
    const { compared, differences } = heldFigures(document, nearly);
    expect(differences).toEqual([]);
    expect(compared).toBeGreaterThan(400);
  });

  it('differ by name, with what they were and are', () => {
    const { boiler: _, ...others } = document;
    const changed = { ...others, house: { ...document.house, heatLoss: 181 }, currency: 'CHF' };
    expect(heldFigures(document, changed).differences).toEqual([
      { path: 'currency', was: 'EUR', is: 'CHF' },
      { path: 'house.heatLoss', was: '180', is: '181' },
    ]);
  });

  it('are written short where that shows the difference, and in full where it does not', () => {
    const at = (heatLoss: number) => ({ ...document, house: { ...document.house, heatLoss } });
    const [short] = heldFigures(at(1 / 3), at(2 / 3)).differences;
    expect(short).toEqual({ path: 'house.heatLoss', was: '0.3333333', is: '0.6666667' });
    const [full] = heldFigures(at(1), at(1.00000001)).differences;
    expect(full).toEqual({ path: 'house.heatLoss', was: '1', is: '1.00000001' });
  });

  it('differ where one has what the other has not', () => {
    const [cost] = document.costs;
    const more = { ...document, costs: [cost!, { ...cost!, file: 'other.yaml' }] };
    const gone = heldFigures(more, document).differences;
    expect(gone.every(({ path, is }) => path.startsWith('costs[1].') && is === undefined)).toBe(true);
    expect(heldFigures(document, more).differences.length).toBe(gone.length);
  });

  it('leave version and inputs to be held on their own', () => {
    expect(heldFigures(document, { ...document, version: '9', inputs: [] }).differences).toEqual([]);
    const [first, ...rest] = document.inputs;
    const held = heldFiles(document.inputs, [{ ...first!, sha256: 'x' }, ...rest]);
    expect(held.filter((file) => !file.held)).toEqual([{ file: first!.file, held: false }]);
    expect(heldFiles([first!], []).map((file) => file.held)).toEqual([false]);
  });
});

describe('pages held against each other', () => {
  it('differ first where the passages say', () => {
    expect(firstDifference('a saves 1 EUR', 'a saves 2 EUR')).toEqual({ was: 'a saves 1 EUR', is: 'a saves 2 EUR' });
    expect(firstDifference('same', 'same')).toBeUndefined();
    expect(firstDifference('same', 'same and more')?.is).toBe('same and more');
  });
});

describe('what is said of a verification', () => {
  const good = {
    file: 'r.html',
    scenario: 'house.yaml',
    version: { was: '1', is: '1' },
    files: [{ file: 'house.yaml', held: true }],
    figures: { compared: 1234, differences: [] },
    page: undefined,
  };

  it('is that all holds', () => {
    expect(holds(good)).toBe(true);
    expect(verificationText(good)).toBe(
      'r.html: report on house.yaml, made by Winterledger 1.\nFiles: all 1 are as they were.\nFigures: all 1\u202f234 hold.\nPage: word for word as it is made now.\nAll of the report holds.\n',
    );
  });

  it('is what differs: files, figures, page', () => {
    const differences = [
      { path: 'annual.fuel', was: '1', is: '2' },
      { path: 'costs[0].total', was: '7' },
    ];
    const bad = { ...good, files: [{ file: 'a\u001bb', held: false }], figures: { compared: 5, differences } };
    expect(holds(bad)).toBe(false);
    const text = verificationText({ ...bad, page: 'not looked at' });
    expect(text).toContain('Files: 1 of 1 are not as they were.\n  a\\u001bb\n');
    expect(text).toContain('  annual.fuel  1 → 2\n  costs[0].total  7 → nothing\n');
    expect(text).toContain('The report does not hold.');
    const worded = { ...good, version: { was: '1', is: '2' }, page: { was: 'saves 900', is: 'saves 700' } };
    expect(holds(worded)).toBe(false);
    expect(verificationText(worded)).toContain('  it says  saves 900\n  now      saves 700\n');
  });

  it('is that it does not hold where one thing alone differs', () => {
    const changed = [{ file: 'house.yaml', held: false }];
    const differences = [{ path: 'annual.fuel', was: '1', is: '2' }];
    expect(holds({ ...good, files: changed })).toBe(false);
    expect(holds({ ...good, figures: { compared: 2, differences } })).toBe(false);
    expect(holds({ ...good, page: { was: 'a', is: 'b' } })).toBe(false);
  });

  it('counts what it does not list', () => {
    const differences = Array.from({ length: 50 }, (_, i) => ({ path: `x${i}`, was: '1', is: '2' }));
    expect(verificationText({ ...good, figures: { compared: 60, differences } })).toContain('  and 10 more\n');
  });
});
