import { describe, expect, it } from 'vitest';
import { batchSentences } from '../../../../../src/report/html/batch/batchAnswer.ts';
import { batchPage, batchText } from '../../../../../src/report/html/batch/batchPage.ts';
import { examplesOf } from '../../../../../src/report/html/batch/batchTrouble.ts';
import { readText, requestsIn } from '../pageText.ts';
import { batchReportOf, type InventedBatch, sampleBatch } from './batchReports.ts';

const page = batchPage(sampleBatch());

/** Batches of every form, by what they are. */
const forms: Readonly<Record<string, Partial<InventedBatch>>> = {
  'homes alone': { axes: [], year: (home) => ({ cost: 500 + home, h4: 3, backupHours: home }) },
  'one axis without homes': { homes: 1, axes: [{ name: 'loss', values: [1, 2, 3] }] },
  'one axis with homes': { axes: [{ name: 'loss', values: [1, 2, 3] }] },
  'an axis of a thousand values': {
    homes: 1,
    axes: [
      { name: 'loss', values: Array.from({ length: 1000 }, (_, i) => i) },
      { name: 'flow', values: [35, 45, 55] },
    ],
  },
  'nothing but failures': { year: () => ({ fails: true }) },
  'no heat asked': { year: () => ({ cost: 100, h4: 'no heat', backupHours: 0 }) },
  'no tariff': { year: (home) => ({ h4: 3 + home / 10, backupHours: home, carbon: 5 }) },
  'the same in every year': { year: () => ({ cost: 100, saving: 0, h4: 3, backupHours: 0 }) },
  'several currencies': {
    year: (home) => ({ cost: 9 + home, h4: 3, backupHours: 1, currency: home > 3 ? 'CHF' : 'EUR' }),
  },
  'a part': { manifest: { part: { shard: 2, shards: 3, fromJob: 25, toJob: 48 } } },
  'missing parts': { manifest: { missing: ['2/3'] } },
};

describe('the report of a batch', () => {
  it('asks nothing of anywhere, and its policy lets nothing run', () => {
    expect(requestsIn(page)).toEqual([]);
    expect(page).toContain(`content="default-src 'none'; style-src 'unsafe-inline'; img-src data:;`);
    expect(page).not.toContain('<script');
  });

  it('has its headings in order and every name once', () => {
    const levels = [...page.matchAll(/<h([1-6])[ >]/g)].map(([, level]) => Number(level));
    expect(levels.filter((level) => level === 1).length).toBe(1);
    for (let i = 1; i < levels.length; i++) expect(levels[i]! - levels[i - 1]!).toBeLessThanOrEqual(1);
    const ids = [...page.matchAll(/\sid="([^"]*)"/g)].map(([, id]) => id);
    expect(new Set(ids).size).toBe(ids.length);
    const labels = [...page.matchAll(/role="region" tabindex="0" aria-label="([^"]*)"/g)].map(([, label]) => label);
    expect(labels.length).toBeGreaterThan(8);
    expect(new Set(labels).size).toBe(labels.length);
  });

  it('has a title, a description and a table of figures with every chart', () => {
    const figures = page.split('<figure>').slice(1);
    // The map, years, homes, and one for each of two axes.
    expect(figures.length).toBe(5);
    for (const figure of figures) {
      expect(figure).toMatch(
        /<svg class="chart"[^>]* role="img" aria-labelledby="[^"]+"><title[^>]*>[^<]+<\/title><desc/,
      );
      expect(figure).toMatch(/<details><summary>[^<]+<\/summary><div class="wide".*<table>/);
    }
  });

  it('writes the median into each cell of the map', () => {
    const [, map = ''] = page.split('<figure>');
    const drawn = [...map.split('</svg>')[0]!.matchAll(/class="mid on-(?:dark|light)">([^<]*)</g)].map(
      ([, text]) => text,
    );
    // Homes 0 … 9 at 900 + 40 a home: median 1080; the small unit 90 more, 55 °C 250 more.
    expect(drawn).toEqual(['1\u202f170', '1\u202f420', '1\u202f080', '1\u202f330', '1\u202f080', '1\u202f330']);
  });

  it('says first what the batch was, its answer in three sentences, and what failed', () => {
    const text = readText(page);
    expect(text).toContain('12 homes × 6 options = 72 years.');
    expect(text).toContain('12 years failed and are left out of every figure: batch.worker-failed 12.');
    const [heat, cost, best] = batchSentences(sampleBatch());
    expect(heat).toContain('each kWh bought gives 3.20 kWh of heat (half of the years: 2.80 to 3.60)');
    // Saved is 500 − 60 a home: of 10 homes 9 with either large unit at 35 °C, 7 with the small one (90 less); at 55 °C
    // (250 less) 5, 5 and 3. That is 38 of 60.
    expect(cost).toContain('in 63\u00a0% of the years the heat pump is the cheaper one');
    // The middle unit and the large one cost the same; the first of the plan is named. Of its 20 costs 900, 940 … 1260 and
    // 1150 … 1510 the middle two are 1190 and 1220; of the 30 at 35 °C (900 … twice, 990 … once) 1100 and 1110.
    expect(best).toBe(
      'Best at the median by cost of heating: unit middle-8 (1\u202f205\u00a0EUR), flow 35 (1\u202f105\u00a0EUR).',
    );
  });

  it('speaks of more that is paid where the median saves nothing', () => {
    const dear = sampleBatch({ year: (home) => ({ cost: 100, saving: home - 20, h4: 3, backupHours: 0 }) });
    expect(batchSentences(dear)[1]).toMatch(
      /against the boiler 15\u00a0EUR a year more is paid at the median \(saving −17 to −12\)/,
    );
  });

  it('names inputs with their SHA-256, the columns, and the commands that make it again', () => {
    expect(page).toContain('a'.repeat(64));
    const asked = batchPage(
      sampleBatch({ by: 'seasonalFactor', chosen: ['flow', 'unit'], language: 'de', date: '2025-03-31' }),
    );
    expect(asked).toContain('winterledger batch plan.yaml --out results\n');
    expect(asked).toContain(
      'winterledger report results --out report.html --by seasonalFactor --axes flow,unit --language de --date 2025-03-31',
    );
    expect(readText(page)).toMatch(/tariff1\.saving\s+money\s+what the heat pump saves/);
  });

  it('shows failed years of every cause, twenty in all', () => {
    const problem = (code: string) => ({ code, place: '', text: '', remedy: '' });
    const cause = (code: string, years: number) => ({
      code,
      years,
      examples: Array.from({ length: Math.min(20, years) }, (_, job) => ({ job, home: '', problem: problem(code) })),
    });
    const shown = examplesOf({ causes: [cause('a', 500), cause('b', 3), cause('c', 30)] });
    const count = (code: string) => shown.filter((each) => each.problem.code === code).length;
    expect([shown.length, count('b')]).toEqual([20, 3]);
    expect(Math.abs(count('a') - count('c'))).toBeLessThanOrEqual(1);
  });

  it('is said in short on the terminal', () => {
    expect(batchText(sampleBatch())).toMatch(/^Invented\n─+\n12 homes × 6 options = 72 years\.\n\nAt the median/);
  });
});

describe('the report of a batch with', () => {
  it.each(Object.entries(forms))('%s makes sense, in both languages and by every figure', (_, form) => {
    for (const language of ['en', 'de'] as const) {
      for (const by of ['cost', 'carbon', 'seasonalFactor', 'backupHours']) {
        const text = batchPage(sampleBatch({ ...form, language, by }));
        expect(text).not.toMatch(/NaN|Infinity|undefined|\[object/);
        expect(requestsIn(text)).toEqual([]);
      }
    }
  });

  it('too little to map says why', () => {
    expect(readText(batchPage(sampleBatch(forms['homes alone'])))).toContain('for no axis is varied');
    expect(readText(batchPage(sampleBatch(forms['one axis without homes'])))).toContain('there are not two homes');
    expect(readText(batchPage(sampleBatch(forms['one axis with homes'])))).toContain('in groups of equal number');
  });

  it('a part, or missing parts, or several currencies says so', () => {
    const textOf = (form: string) => readText(batchPage(sampleBatch(forms[form])));
    expect(textOf('a part')).toContain('These are the years 25 to 48 of it, part 2/3.');
    expect(textOf('missing parts')).toContain('Parts that were not there when the results were gathered: 2/3.');
    expect(textOf('several currencies')).toContain('The years are in several currencies');
  });

  it('one value alone writes it with its own decimals', () => {
    const text = readText(batchPage(sampleBatch({ ...forms['the same in every year'], by: 'seasonalFactor' })));
    expect(text).toContain('Nine in ten lie between 3.00 and 3.00; most often: 3.00.');
  });

  it('hundreds of files lists some of them and says how many more there are', () => {
    const inputs = Array.from({ length: 500 }, (_, i) => ({
      file: `unit-${i}.yaml`,
      role: 'unit',
      sha256: 'b'.repeat(64),
    }));
    const text = batchPage(sampleBatch({ manifest: { inputs } }));
    expect(text).toContain('And 440 more files, in manifest.json.');
    expect(text.match(/<bdi>unit-\d+\.yaml/g)?.length).toBe(60);
  });

  it('words of German is German, its figures too', () => {
    const text = readText(batchPage(sampleBatch({ language: 'de' })));
    expect(text).toContain('gibt jede gekaufte kWh 3,20 kWh Wärme');
    expect(text).not.toMatch(/ the | years /);
  });

  it('a hundred thousand years stays below 600 kB', () => {
    const long = 'x'.repeat(900);
    const values = (name: string, count: number) => ({
      name,
      values: Array.from({ length: count }, (_, i) => `${name} ${i} ${long}`),
    });
    const input = batchReportOf({
      homes: 40,
      axes: [values('a', 50), values('b', 25), values('c', 2)],
      year: (_, __, job) =>
        job % 9 === 0 ? { fails: true } : { cost: (job * 7919) % 10_007, h4: 3, backupHours: job % 90 },
    });
    expect(input.years.rows).toBe(100_000);
    expect(input.years.causes).toMatchObject([{ years: 11_111, examples: { length: 20 } }]);
    expect(new TextEncoder().encode(batchPage(input)).length).toBeLessThan(600_000);
  }, 60_000);
});

describe('names of a batch that are not meant well', () => {
  const name = `</title><script>alert(1)</script><img src=http://x.y/ onerror=alert(1)>'"&`;
  const right = 'בית 😀\u202eabc';
  const text = batchPage(
    sampleBatch({
      plan: `${name}${right}`,
      axes: [
        { name, values: [name, right] },
        { name: right, values: ['<b>bold</b>', '😀'.repeat(60), 'x'.repeat(300)] },
      ],
      homeName: (home) => `${name}${home}`,
      year: (home, _, job) =>
        home === 1 ? { fails: true } : { cost: job, h4: 3, backupHours: 1, warnings: ['<i>x</i>'] },
      manifest: { inputs: [{ file: name, role: '<u>role</u>', sha256: '<s>' }] },
      date: '<b>date</b>',
    }),
  );

  it('land as text', () => {
    expect(text).not.toMatch(/<script|<img|<b>bold|<i>x|<u>role|<s>|<b>date/);
    expect(text).toContain('&lt;script&gt;');
  });

  it('turn no direction around them', () => {
    expect(text).not.toContain('\u202e');
    expect(text).toContain('\\u202e');
  });
});
