import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { fitResultSchema } from '../../src/report/fitResultSchema.ts';
import { folderWithDemo, namesIn, PROBLEM_SHAPE, run, STACK_LINE } from './program.ts';

const folder = folderWithDemo();
const house = 'data/demo/house.yaml';
const meter = 'data/demo/meter.csv';
const at = (name: string) => join(folder, name);

/** A file with one passage replaced, beside the original. */
function changed(original: string, name: string, passage: string, by: string): string {
  const text = readFileSync(at(original), 'utf8');
  expect(text.split(passage).length).toBe(2);
  writeFileSync(at(`data/demo/${name}`), text.replace(passage, by));
  return `data/demo/${name}`;
}

describe('fit on the house of the demo', () => {
  it('prints the heat loss, its lines and every period within 80 columns, and nothing on standard error', async () => {
    const { code, stdout, stderr } = await run(folder, 'fit', house, '--readings', meter);
    expect({ code, stderr }).toEqual({ code: 0, stderr: '' });
    expect(stdout).toMatch(
      /By its readings the house loses \d+ W\/K \(standard error [\d.]+; with\s+the\s+uncertainty\s+of\s+the\s+base\s+temperature\s+it\s+lies\s+between/,
    );
    expect(stdout).toMatch(/\nhouse:\n {2}heatLoss: \{ given: coefficient, value: [\d.]+ \}\n/);
    expect(stdout.match(/│ 2025-\d\d-\d\d – /g)).toHaveLength(11);
    // The name of the house is longer than a line.
    const long = stdout
      .split('\n')
      .slice(2)
      .filter((line) => [...line].length > 80);
    expect(long).toEqual([]);
  });

  it('finds the 195 W/K that the readings were invented with, within its interval', async () => {
    const { stdout } = await run(folder, 'fit', house, '--readings', meter, '--json', '-');
    const { heatLoss, believed, doubts, readings, periods } = fitResultSchema.parse(JSON.parse(stdout));
    expect(heatLoss.low).toBeLessThan(195);
    expect(heatLoss.high).toBeGreaterThan(195);
    expect({ believed, doubts }).toEqual({ believed: true, doubts: [] });
    expect(readings).toMatchObject({ rows: 13, estimated: 1, efficiency: 0.88, efficiencyFrom: 'boiler', unused: [] });
    expect(periods.reduce((days, period) => days + period.days, 0)).toBe(365);
  });

  it('gives lines that the scenario takes as they are', async () => {
    const { stdout } = await run(folder, 'fit', house, '--readings', meter, '--json', '-');
    const { scenarioLines } = fitResultSchema.parse(JSON.parse(stdout));
    const text = readFileSync(at(house), 'utf8');
    const before = '  heatLoss: { given: coefficient, value: 195 }';
    expect(text).toContain(before);
    expect(text).toContain(`\n${scenarioLines[0]}\n`);
    const fitted = changed(house, 'fitted.yaml', before, scenarioLines[1] ?? '');
    const again = await run(folder, 'fit', fitted, '--readings', meter, '--json', '-');
    const { heatLoss } = fitResultSchema.parse(JSON.parse(again.stdout));
    expect(heatLoss.entered).toBeCloseTo(heatLoss.value, 0);
  });

  it('writes the same document to a file and to standard output', async () => {
    const { code, stdout } = await run(folder, 'fit', house, '--readings', meter, '--json', 'fit.json');
    expect(code).toBe(0);
    expect(stdout).toContain('Period by period');
    const printed = await run(folder, 'fit', house, '--readings', meter, '--json', '-');
    expect(readFileSync(at('fit.json'), 'utf8')).toBe(printed.stdout);
  });

  it('says that the line does not fit, and why that may be, and offers no lines', async () => {
    const use = [1500, 3500, 800, 2600, 200, 1900, 300, 1500, 300, 2900, 1800, 2600];
    const rows = use.map(
      (kWh, month) => `${month < 11 ? 2025 : 2026}-${String(((month + 1) % 12) + 1).padStart(2, '0')}-01,${kWh}`,
    );
    writeFileSync(at('odd.csv'), `date,use kWh\n2025-01-01,\n${rows.join('\n')}\n`);
    const { code, stdout } = await run(folder, 'fit', house, '--readings', 'odd.csv');
    expect(code).toBe(0);
    expect(stdout).toMatch(/The\s+line\s+does\s+not\s+fit/);
    expect(stdout).toMatch(/\n! R² is 0\.\d+; at least 0\.75 is asked/);
    expect(stdout).not.toContain('given: coefficient');
  });
});

describe('fit refuses', () => {
  it('a command line without readings', async () => {
    const { code, stdout, stderr } = await run(folder, 'fit', house);
    expect({ code, stdout }).toEqual({ code: 2, stdout: '' });
    expect(stderr).toMatch(PROBLEM_SHAPE);
    expect(stderr).toContain('--readings FILE is missing');
  });

  it('what is wrong in readings and scenario at once, with line and cure, and writes nothing', async () => {
    const before = namesIn(folder);
    const wrongMeter = changed(meter, 'wrong.csv', '2025-04-03', '2025-04-31');
    const wrongHouse = changed(house, 'wrong.yaml', 'floorArea: 138', 'floorArea: none');
    const { code, stdout, stderr } = await run(
      folder,
      'fit',
      wrongHouse,
      '--readings',
      wrongMeter,
      '--json',
      'no.json',
    );
    expect({ code, stdout }).toEqual({ code: 2, stdout: '' });
    expect(stderr).toMatch(PROBLEM_SHAPE);
    expect(stderr).toContain('wrong.csv:5:1  the date is “2025-04-31”');
    expect(stderr).toContain('house.floorArea is');
    expect(stderr).not.toMatch(STACK_LINE);
    expect(namesIn(folder)).toEqual(before);
  });

  it('readings of a time without weather', async () => {
    const moved = changed(meter, 'moved.csv', '2026-01-01', '2026-02-01');
    const { code, stderr } = await run(folder, 'fit', house, '--readings', moved);
    expect(code).toBe(2);
    expect(stderr).toMatch(PROBLEM_SHAPE);
    expect(stderr).toContain('does not cover the period 2025-12-01 to 2026-01-31; it holds 2025-01-01 to 2025-12-31');
  });

  it('to write its result over the readings', async () => {
    const { code, stderr } = await run(folder, 'fit', house, '--readings', meter, '--json', meter);
    expect(code).toBe(2);
    expect(stderr).toContain('which is read as an input');
  });
});
