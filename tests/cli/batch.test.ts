import { existsSync, mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { parseDocument } from 'yaml';
import { batchManifestSchema } from '../../src/report/batchManifest.ts';
import { folderWithDemo, namesIn, PROBLEM_SHAPE, run, STACK_LINE, start } from './program.ts';

const folder = folderWithDemo();
const RESULTS = ['manifest.json', 'results.csv', 'results.jsonl', 'summary.csv'];
const inFolder = (...names: string[]) => join(folder, ...names);
const bytesOf = (out: string) => RESULTS.map((name) => readFileSync(inFolder(out, name), 'utf8'));
const linesOf = (out: string, name = 'results.csv') => readFileSync(inFolder(out, name), 'utf8').trimEnd().split('\n');
const rowsOf = (out: string) => linesOf(out, 'results.jsonl').map((line) => JSON.parse(line));

/** A plan over the demo house, in the folder of the demo. */
function writePlan(name: string, text: string): string {
  writeFileSync(inFolder('data/demo', name), `name: Test\nscenario: house.yaml\n${text}`);
  return `data/demo/${name}`;
}

const fourHundred = writePlan(
  'four-hundred.yaml',
  [
    'axes:',
    '  - { given: range, name: loss, path: house.heatLoss.value, from: 101, to: 200, step: 1 }',
    '  - { given: values, name: flow, path: flowTemperature.flow, values: [45, 48, 51, 54] }',
    '',
  ].join('\n'),
);

describe('a batch', () => {
  it('says what it comes to, and writes a row a year in the order of the plan', async () => {
    const { code, stdout, stderr } = await run(folder, 'batch', 'data/demo/plan.yaml', '--out', 'demo');
    expect({ code, stderr }).toEqual({ code: 0, stderr: '' });
    expect(stdout.split('\n')[0]).toBe('120 homes × 4 options = 480 years');
    expect(namesIn(inFolder('demo'))).toEqual(RESULTS);
    const rows = rowsOf('demo');
    expect(rows.map(({ job }) => job)).toEqual(Array.from({ length: 480 }, (_, i) => i + 1));
    expect(rows.slice(0, 5).map(({ axes }) => [axes.unit.slice(6, 10), axes.radiators])).toEqual([
      ['quar', 'as they are'],
      ['quar', 'larger'],
      ['holl', 'as they are'],
      ['holl', 'larger'],
      ['quar', 'as they are'],
    ]);
    expect(new Set(rows.map(({ home }) => home)).size).toBe(120);
    expect(linesOf('demo')).toHaveLength(481);
  });

  it('finds to the last digit what simulate finds for the same home', async () => {
    const [header, ...homes] = readFileSync(inFolder('data/demo/homes.csv'), 'utf8').trimEnd().split('\n').slice(1);
    for (const job of [1, 4, 6, 327]) {
      const row = rowsOf('demo')[job - 1];
      const scenario = parseDocument(readFileSync(inFolder('data/demo/house.yaml'), 'utf8'));
      const cells = homes[Math.floor((job - 1) / 4)]!.split(',');
      header!.split(',').forEach((place, i) => {
        const cell = cells[i]!;
        if (i > 0 && cell !== '') scenario.setIn(place.split('.'), /^[\d.]+$/.test(cell) ? Number(cell) : cell);
      });
      scenario.setIn(['heatPump', 'unit'], row.axes.unit);
      if (row.axes.radiators === 'larger') {
        scenario.setIn(['flowTemperature', 'flow'], 42);
        scenario.setIn(['flowTemperature', 'return'], 36);
      }
      writeFileSync(inFolder('data/demo/one.yaml'), scenario.toString());
      const { code } = await run(folder, 'simulate', 'data/demo/one.yaml', '--json', 'one.json');
      expect(code).toBe(0);
      const { annual, costs, carbon, boiler, warnings } = JSON.parse(readFileSync(inFolder('one.json'), 'utf8'));
      const { figures } = row;
      expect(figures).toMatchObject({
        spaceHeatNeed: annual.spaceHeatNeed,
        heatPumpHeat: annual.heatPumpHeat,
        backupHeat: annual.backupHeat,
        electricity: annual.electricity.total,
        ...annual.seasonalFactor,
        backupHours: annual.backupHours,
        starts: annual.starts,
        carbonHeatPump: carbon.heatPump,
        carbonBoiler: carbon.boiler,
        boilerFuel: boiler.fuel,
      });
      const { tariffs } = row;
      expect(
        tariffs.map(({ total, systemTotal, saving }: Record<string, number>) => [total, systemTotal, saving]),
      ).toEqual(costs.map(({ total, systemTotal, saving }: Record<string, number>) => [total, systemTotal, saving]));
      expect(row.warnings).toEqual(warnings.map(({ code: each }: { code: string }) => each));
    }
  });

  it('has a summary of each figure, over all and by each value of each axis', () => {
    const [header, ...lines] = linesOf('demo', 'summary.csv');
    expect(header).toBe('figure,unit,axis,value,count,mean,least,q10,q25,median,q75,q90,most');
    const need = rowsOf('demo').map(({ figures }) => figures.spaceHeatNeed as number);
    const [all, ...byAxis] = lines.filter((line) => line.startsWith('spaceHeatNeed,')).map((line) => line.split(','));
    expect(Number(all![5])).toBeCloseTo(need.reduce((sum, each) => sum + each, 0) / 480, 6);
    expect([Number(all![6]), Number(all![12])]).toEqual([Math.min(...need), Math.max(...need)]);
    expect(byAxis.map(([, , axis, value, count]) => [axis, value, count])).toEqual([
      ['unit', 'units/quarkenfels-8.yaml', '240'],
      ['unit', 'units/hollerwisch-6.yaml', '240'],
      ['radiators', 'as they are', '240'],
      ['radiators', 'larger', '240'],
    ]);
  });

  it('tells in its manifest what it rests on', () => {
    const manifest = batchManifestSchema.parse(JSON.parse(readFileSync(inFolder('demo/manifest.json'), 'utf8')));
    expect(manifest).toMatchObject({ homes: 120, options: 4, jobs: 480, rows: 480, failed: 0, tariffs: 4 });
    expect(manifest.inputs.map(({ role }) => role).sort()).toEqual(
      ['homes', 'plan', 'priceSeries', 'scenario', 'weather']
        .concat(['tariff', 'tariff', 'tariff', 'tariff', 'unit', 'unit'])
        .sort(),
    );
    for (const { sha256 } of manifest.inputs) expect(sha256).toMatch(/^[0-9a-f]{64}$/);
    expect(manifest.assumptions.map(({ path }) => path)).toContain('circulation.waterContent');
  });

  it('gives the same bytes on one worker and on two, and on a second run', async () => {
    expect((await run(folder, 'batch', fourHundred, '--out', 'one', '--workers', '1')).code).toBe(0);
    expect((await run(folder, 'batch', fourHundred, '--out', 'two', '--workers', '2')).code).toBe(0);
    expect(bytesOf('two')).toEqual(bytesOf('one'));
    const before = bytesOf('one');
    const again = await run(folder, 'batch', fourHundred, '--out', 'one');
    expect(again.code).toBe(0);
    expect(bytesOf('one')).toEqual(before);
  });
});

describe('a batch of ten thousand homes, seven of them bad', () => {
  // a house of few sections, so that so many years take seconds
  const lean = [
    'name: Lean house',
    'site: { zone: Europe/Berlin }',
    'weather: { file: weather.csv, read: { stamps: begin, offset: "+01:00", clock: standard } }',
    'house:',
    '  heatLoss: { given: coefficient, value: 195 }',
    '  design: { outdoorTemperature: -12 }',
    '  need: { model: degreeHours }',
    'flowTemperature:',
    '  method: emitters',
    '  flow: 50',
    '  return: 42',
    'heatPump: { unit: units/quarkenfels-8.yaml }',
    '',
  ].join('\n');
  const header = 'home,house.heatLoss.value,flowTemperature.return,heatPump.unit';
  const lossOf = (job: number) => 100 + (job % 100);
  const homes = Array.from({ length: 10_000 }, (_, i) => `home ${i + 1},${lossOf(i + 1)},,`);
  const bad: Record<number, string> = {
    7: 'much,a lot,,',
    60: '=cmd|calc,-5,,',
    61: 'too many,150,,,,',
    2000: 'exchanged,150,60,',
    3000: 'no such unit,150,,units/none.yaml',
    7301: '@two faults,-5,99,',
    9998: 'percent,120 W/K,,',
  };
  for (const [i, row] of Object.entries(bad)) homes[Number(i)] = row;
  homes[9999] = '+last,100,,';
  const badJobs = Object.keys(bad).map((i) => Number(i) + 1);

  it('has exactly seven rows of problems among the results of the others, all in the order of the table', async () => {
    writeFileSync(inFolder('data/demo/lean.yaml'), lean);
    writeFileSync(inFolder('data/demo/bad.csv'), `${header}\n${homes.join('\n')}\n`);
    writeFileSync(inFolder('data/demo/bad.yaml'), 'name: Bad\nscenario: lean.yaml\nhomes: { file: bad.csv }\n');
    const { code, stdout, stderr } = await run(folder, 'batch', 'data/demo/bad.yaml', '--out', 'bad');
    expect({ code, stderr }).toEqual({ code: 1, stderr: '' });
    expect(stdout).toMatch(/^9.993 years simulated; 7 with a problem/m);
    const rows = rowsOf('bad');
    expect(rows.map(({ job }) => job)).toEqual(Array.from({ length: 10_000 }, (_, i) => i + 1));
    const failed = rows.filter(({ problems }) => problems.length > 0);
    expect(failed.map(({ job, homesLine }) => [job, homesLine])).toEqual(badJobs.map((job) => [job, job + 1]));
    expect(failed.every(({ figures }) => figures === undefined)).toBe(true);
    const good = rows.filter(({ problems }) => problems.length === 0);
    expect(good.map(({ figures }) => figures.heatLoss)).toEqual(good.map(({ job }) => lossOf(job)));
    const texts = failed.map(({ problems }) =>
      problems.map((each: Record<string, string>) => `${each.place}  ${each.text}`),
    );
    expect(texts).toEqual([
      ["data/demo/bad.csv:9:6  house.heatLoss.value is 'a lot'; a heat loss lies between 1 and 100000 W/K"],
      ['data/demo/bad.csv:62:11  house.heatLoss.value is -5; a heat loss lies between 1 and 100000 W/K'],
      ['data/demo/bad.csv:63  cells in this row: 6; names of columns: 4'],
      [
        expect.stringMatching(
          /^data\/demo\/lean.yaml:10:9 {2}flowTemperature.flow is 50 °C; it must lie above the return temperature \(60 °C\)/,
        ),
      ],
      ['data/demo/units/none.yaml:3002:19  there is no such file'],
      [
        'data/demo/bad.csv:7303:13  house.heatLoss.value is -5; a heat loss lies between 1 and 100000 W/K',
        expect.stringContaining('flowTemperature.return is 99'),
      ],
      ["data/demo/bad.csv:10000:9  house.heatLoss.value is '120 W/K'; a heat loss lies between 1 and 100000 W/K"],
    ]);
  });

  it('has one line a home in the table, in the same order', () => {
    const [, ...lines] = linesOf('bad');
    expect(lines.map((line) => Number(line.split(',', 1)[0]))).toEqual(Array.from({ length: 10_000 }, (_, i) => i + 1));
  });

  it('has no text that a spreadsheet would take for a formula', () => {
    const lines = linesOf('bad');
    expect(lines[61]).toMatch(/^61,"'=cmd\|calc",62,/);
    expect(lines[7302]).toMatch(/^7302,"'@two faults",/);
    expect(lines[10_000]).toMatch(/^10000,"'\+last",/);
  });
});

describe('a batch that is stopped', () => {
  /** Begins the batch of 400 years and stops it when some of them are finished. */
  async function stopped(out: string, signal: 'SIGKILL' | 'SIGINT') {
    const { child, ended } = start(folder, ['batch', fourHundred, '--out', out, '--workers', '1']);
    const chunks = () =>
      existsSync(inFolder(out, 'unfinished'))
        ? namesIn(inFolder(out, 'unfinished')).filter((name) => /^chunk-\d+$/.test(name))
        : [];
    while (chunks().length < 2 && child.exitCode === null) await new Promise((resolve) => setTimeout(resolve, 5));
    child.kill(signal);
    expect((await ended).signal).toBe(signal);
    expect(namesIn(inFolder(out))).not.toContain('manifest.json');
    return chunks().length;
  }

  it.each(['SIGKILL', 'SIGINT'] as const)(
    'by %s goes on where it was, and ends with the same bytes',
    async (signal) => {
      const finished = await stopped(signal, signal);
      expect(finished).toBeGreaterThanOrEqual(2);
      expect(finished).toBeLessThan(8);
      const { code } = await run(folder, 'batch', fourHundred, '--out', signal);
      expect(code).toBe(0);
      expect(bytesOf(signal)).toEqual(bytesOf('one'));
      expect(namesIn(inFolder(signal))).toEqual(RESULTS);
    },
  );

  it('does a damaged chunk again, and what could not be written when it can be', async () => {
    await stopped('damaged', 'SIGKILL');
    const unfinished = inFolder('damaged/unfinished');
    const chunk = join(unfinished, 'chunk-000001');
    writeFileSync(chunk, readFileSync(chunk, 'utf8').replace('"home"', '"hole"'));
    const obstacle = join(unfinished, 'chunk-000008.tmp');
    mkdirSync(obstacle);
    const { code, stderr } = await run(folder, 'batch', fourHundred, '--out', 'damaged', '--workers', '1');
    expect(code).toBe(3);
    expect(stderr).toMatch(/unfinished\/chunk-000008 {2}the file cannot be written: this is a folder/);
    const kept = readdirSync(unfinished).filter((name) => /^chunk-\d+$/.test(name));
    expect(kept.length).toBeGreaterThanOrEqual(2);
    rmSync(obstacle, { recursive: true });
    expect((await run(folder, 'batch', fourHundred, '--out', 'damaged')).code).toBe(0);
    expect(bytesOf('damaged')).toEqual(bytesOf('one'));
  });

  it('is not mixed with another plan, other files or another version', async () => {
    await stopped('mixed', 'SIGKILL');
    const other = await run(folder, 'batch', 'data/demo/plan.yaml', '--out', 'mixed');
    expect(other.code).toBe(2);
    expect(other.stderr).toMatch(
      /mixed {2}this folder holds unfinished results of another run: its plan was .*four-hundred/,
    );
    const shard = await run(folder, 'batch', fourHundred, '--out', 'mixed', '--shard', '1/2');
    expect(shard.stderr).toContain('another run: it ran the whole plan');
    const tariff = inFolder('data/demo/tariffs/night.yaml');
    const text = readFileSync(tariff, 'utf8');
    writeFileSync(tariff, text.replace('0.215', '0.225'));
    const changed = await run(folder, 'batch', fourHundred, '--out', 'mixed');
    writeFileSync(tariff, text);
    expect(changed.code).toBe(2);
    expect(changed.stderr).toContain('another run: data/demo/tariffs/night.yaml has other content now');
    const noted = inFolder('mixed/unfinished/run.json');
    writeFileSync(noted, readFileSync(noted, 'utf8').replace(/"version":"[^"]*"/, '"version":"0.0.1"'));
    const version = await run(folder, 'batch', fourHundred, '--out', 'mixed');
    expect(version.stderr).toContain('another run: it was made by version 0.0.1');
  });

  it('leaves finished results of another run alone too', async () => {
    const before = bytesOf('one');
    const { code, stderr } = await run(folder, 'batch', 'data/demo/plan.yaml', '--out', 'one');
    expect(code).toBe(2);
    expect(stderr).toMatch(/this folder holds finished results of another run: its plan was/);
    expect(bytesOf('one')).toEqual(before);
  });
});

describe('a table of homes that is changed while its homes are simulated', () => {
  it('ends the batch without results, and the next run begins elsewhere', async () => {
    const rows = Array.from({ length: 400 }, (_, i) => `home ${i + 1},${100 + (i % 100)}`);
    const table = inFolder('data/demo/changing.csv');
    writeFileSync(table, `home,house.heatLoss.value\n${rows.join('\n')}\n`);
    const plan = writePlan('changing.yaml', 'homes: { file: changing.csv }\n');
    const { child, ended } = start(folder, ['batch', plan, '--out', 'changing', '--workers', '1']);
    const first = inFolder('changing/unfinished/chunk-000001');
    while (!existsSync(first) && child.exitCode === null) await new Promise((resolve) => setTimeout(resolve, 5));
    writeFileSync(table, `home,house.heatLoss.value\n${rows.toReversed().join('\n')}\n`);
    const { code, stderr } = await ended;
    expect(code).toBe(2);
    expect(stderr).toBe(
      'data/demo/changing.csv  the table of homes was changed while its homes were simulated\n    → empty the folder of results and begin again\n',
    );
    expect(namesIn(inFolder('changing'))).toEqual(['unfinished']);
    const again = await run(folder, 'batch', plan, '--out', 'changing');
    expect(again.stderr).toContain('another run: its table of homes was data/demo/changing.csv with other content');
  });
});

describe('a folder of results', () => {
  it('is refused while another run writes into it', async () => {
    mkdirSync(inFolder('busy'));
    const { host } = { host: (await import('node:os')).hostname() };
    writeFileSync(inFolder('busy/batch.lock'), JSON.stringify({ pid: process.pid, host, began: '' }));
    const { code, stderr } = await run(folder, 'batch', fourHundred, '--out', 'busy');
    expect(code).toBe(2);
    expect(stderr).toBe(
      `busy  another run (process ${process.pid} on ${host}) is writing into this folder\n    → wait for it, or name another folder; if no such run exists any more, remove busy/batch.lock\n`,
    );
    expect(namesIn(inFolder('busy'))).toEqual(['batch.lock']);
  });

  it('is refused where it holds a file that no batch has written', async () => {
    mkdirSync(inFolder('foreign'));
    writeFileSync(inFolder('foreign/results.csv'), 'mine');
    const { code, stderr } = await run(folder, 'batch', fourHundred, '--out', 'foreign');
    expect(code).toBe(2);
    expect(stderr).toContain('foreign  the folder holds a file results.csv that no batch has written');
    expect(readFileSync(inFolder('foreign/results.csv'), 'utf8')).toBe('mine');
  });

  it('that cannot be made ends the batch with 3', async () => {
    writeFileSync(inFolder('file'), '');
    const { code, stderr } = await run(folder, 'batch', fourHundred, '--out', 'file/results');
    expect(code).toBe(3);
    expect(stderr).toMatch(PROBLEM_SHAPE);
  });
});

describe('what is wrong with a whole batch', () => {
  const refused = async (...words: string[]) => {
    const { code, stderr } = await run(folder, 'batch', ...words, '--out', 'never');
    expect(code).toBe(2);
    expect(stderr).not.toMatch(STACK_LINE);
    expect(existsSync(inFolder('never'))).toBe(false);
    return stderr;
  };

  it('is a grid above the limit, told with its count and the flag that raises it', async () => {
    expect(await refused(fourHundred, '--limit', '399')).toBe(
      'data/demo/four-hundred.yaml  the plan comes to 400 years; at most 399 are simulated unless more are allowed\n    → vary less, or allow more with --limit 400\n',
    );
    const axis = (n: number) =>
      `  - { given: range, name: a${n}, path: house.need.internalGains, from: 0, to: 999, step: 1 }`;
    const huge = writePlan('huge.yaml', `axes:\n${axis(1)}\n${axis(2)}\n`);
    expect(await refused(huge)).toContain('the plan comes to 1000000 years; at most 200000');
  });

  it('is a column that no scenario has, and a table without homes', async () => {
    writeFileSync(inFolder('data/demo/columns.csv'), 'home,house.heatLos.value\nA,1\n');
    const columns = writePlan('columns.yaml', 'homes: { file: columns.csv }\n');
    expect(await refused(columns)).toBe(
      "data/demo/columns.csv:1:6  column 'house.heatLos.value' is no place in a scenario\n    → perhaps house.heatLoss is meant\n",
    );
    writeFileSync(inFolder('data/demo/none.csv'), '# nothing\nhome,site.altitude\n\n');
    const none = writePlan('none.yaml', 'homes: { file: none.csv }\n');
    expect(await refused(none)).toMatch(/none.csv {2}the table holds no homes\n {4}→ write a row for each home/);
    const missing = writePlan('missing.yaml', 'homes: { file: nowhere.csv }\n');
    expect(await refused(missing)).toMatch(/data\/demo\/nowhere.csv {2}there is no such file/);
  });

  it('is a fault of the base scenario that no home and no axis mends', async () => {
    const house = readFileSync(inFolder('data/demo/house.yaml'), 'utf8');
    writeFileSync(
      inFolder('data/demo/broken.yaml'),
      house.replace('pumpPower: 35', 'pumpPower: -1').replace('value: 195', 'value: -1'),
    );
    writeFileSync(
      inFolder('data/demo/on-broken.yaml'),
      'name: T\nscenario: broken.yaml\naxes: [{ given: values, name: a, path: house.heatLoss.value, values: [100, 200] }]\n',
    );
    const stderr = await refused('data/demo/on-broken.yaml');
    expect(stderr).toMatch(/broken.yaml:\d+:27 {2}circulation.pumpPower is -1/);
    expect(stderr).not.toContain('heatLoss');
  });

  it('is a wrong word behind an option', async () => {
    expect((await run(folder, 'batch', fourHundred)).stderr).toContain("option '--out' is needed");
    expect(await refused(fourHundred, '--workers', '0')).toContain(
      "--workers is '0'; it is a whole number from 1 to 512",
    );
    expect(await refused(fourHundred, '--shard', '3/2')).toContain("--shard is '3/2'; it is a part");
    expect(await refused(fourHundred, '--limit', 'x')).toContain("--limit is 'x'");
  });
});

describe('check', () => {
  it('looks through a plan with its homes and its first year', async () => {
    expect(await run(folder, 'check', 'data/demo/plan.yaml')).toMatchObject({
      code: 0,
      stdout: expect.stringContaining('taken for a plan of a batch: in order'),
    });
    expect((await run(folder, 'check', 'data/demo/columns.yaml')).stderr).toContain("column 'house.heatLos.value'");
  });
});
