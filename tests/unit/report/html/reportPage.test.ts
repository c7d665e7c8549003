import { describe, expect, it } from 'vitest';
import { reportPage } from '../../../../src/report/html/reportPage.ts';
import { scenarioText, tariffText, unitText } from '../../scenario/sampleFiles.ts';
import { readText, requestsIn } from './pageText.ts';
import { demoReport, houses, sampleReport } from './reportsOf.ts';

const demo = reportPage(demoReport());

describe('the report of the demo', () => {
  it('asks nothing of anywhere', () => {
    expect(requestsIn(demo)).toEqual([]);
    expect(demo).toContain(`content="default-src 'none'; style-src 'unsafe-inline'; img-src data:;`);
  });

  it.each(['<a href="http://x.y/">', '<b style="background:url(x)">', '<script>1</script>', '<p onclick="x">'])(
    '%s would be seen',
    (markup) => {
      expect(requestsIn(markup).length).toBeGreaterThan(0);
    },
  );

  it('is smaller than 600 kB, and the same each time', () => {
    expect(new TextEncoder().encode(demo).length).toBeLessThan(600_000);
    expect(reportPage(demoReport())).toBe(demo);
  });

  it('has its headings in order, from one h1 down', () => {
    const levels = [...demo.matchAll(/<h([1-6])[ >]/g)].map(([, level]) => Number(level));
    expect(levels.filter((level) => level === 1).length).toBe(1);
    expect(levels[0]).toBe(1);
    for (let i = 1; i < levels.length; i++) expect(levels[i]! - levels[i - 1]!).toBeLessThanOrEqual(1);
  });

  it('names every part once', () => {
    const ids = [...demo.matchAll(/\sid="([^"]*)"/g)].map(([, id]) => id);
    expect(ids.length).toBeGreaterThan(20);
    expect(new Set(ids).size).toBe(ids.length);
    const labels = [...demo.matchAll(/role="region" tabindex="0" aria-label="([^"]*)"/g)].map(([, label]) => label);
    expect(new Set(labels).size).toBe(labels.length);
  });

  it('has a table of figures behind every chart, and a title and description on it', () => {
    const figures = demo.split('<figure>').slice(1);
    expect(figures.length).toBeGreaterThan(9);
    for (const figure of figures) {
      expect(figure).toMatch(
        /<svg class="chart"[^>]* role="img" aria-labelledby="[^"]+"><title[^>]*>[^<]+<\/title><desc/,
      );
      expect(figure).toMatch(/<details><summary>[^<]+<\/summary><div class="wide".*<table>/);
    }
  });

  it('names every input with its SHA-256, every assumption, and every section of the model', () => {
    const input = demoReport();
    for (const { sha256 } of input.document.inputs) expect(demo).toContain(sha256);
    for (const { path } of input.document.assumptions) expect(demo).toContain(path);
    for (const { section } of input.words.formulas) expect(demo).toContain(section);
    expect(input.document.inputs.length).toBe(8);
  });

  it('leaves the date to the hand unless it is told one', () => {
    expect(demo).not.toContain('2025-03-31');
    expect(reportPage(demoReport('en', '2025-03-31'))).toContain('2025-03-31');
  });

  it('is German where that is asked for, its figures too', () => {
    const page = reportPage(demoReport('de'));
    expect(page).toContain('<html lang="de">');
    expect(readText(page)).not.toContain('The answer');
    const { h4 } = demoReport().document.annual.seasonalFactor;
    expect(readText(page)).toContain(Number(h4).toFixed(2).replace('.', ','));
    expect(readText(demo)).toContain(Number(h4).toFixed(2));
  });
});

describe('the report of a house with', () => {
  it.each(Object.entries(houses))('%s makes sense', (_, scenario) => {
    for (const language of ['en', 'de'] as const) {
      const text = reportPage(sampleReport(scenario, {}, language));
      expect(requestsIn(text)).toEqual([]);
      expect(text).not.toMatch(/NaN|Infinity|undefined|\[object/);
      expect(text).toContain('class="signature"');
    }
  });

  it('no tariff says that no cost is known', () => {
    expect(readText(reportPage(sampleReport(houses['no tariff'])))).toContain('no tariff is entered');
  });

  it('no boiler speaks of none', () => {
    expect(readText(reportPage(sampleReport(scenarioText)))).not.toMatch(/boiler would cost|The boiler instead/);
  });

  it('no need of heat says so', () => {
    const text = readText(reportPage(sampleReport(houses['no need of heat'])));
    expect(text).toContain('The rooms need no heat in this year.');
    expect(text).toContain('The unit gives no heat in this year.');
  });

  it('a unit far too small says that the rooms would lack heat, and warns', () => {
    const text = readText(reportPage(sampleReport(houses['a unit far too small'])));
    expect(text).toContain('the rooms would lack heat');
    expect(text).toContain('far smaller than the house needs');
  });
});

describe('names that are not meant well', () => {
  const name = `</title><img src=http://x.y/ onerror=alert(1)>'"&`;
  const note = `</script><script>alert(1)</script>${name}`;
  const yaml = (text: string) => JSON.stringify(text);
  const page = reportPage(
    sampleReport(scenarioText.replace('name: Test house', `name: ${yaml(name)}\nnote: ${yaml(note)}`), {
      'tariff.yaml': tariffText
        .replace('Test tariff', yaml(name))
        .replace('name: night', `name: ${yaml('<b>night</b>')}`),
      'unit.yaml': unitText.replace('Test unit', yaml('<u>unit</u>')),
    }),
  );

  it('land as text', () => {
    expect(page.match(/<script/g)).toEqual(['<script']);
    expect(page.match(/<\/script/g)).toEqual(['</script']);
    expect(page).not.toMatch(/<img|<b>night|<u>unit/);
    expect(page).toContain('&lt;img src=http:');
  });

  it('run from right to left within their own place, and override nothing', () => {
    const right = 'בית 😀\u202eabc';
    const text = reportPage(sampleReport(scenarioText.replace('Test house', yaml(right))));
    expect(text).toContain('<h1><bdi>בית 😀\\u202eabc</bdi></h1>');
    expect(text).not.toContain('\u202e');
  });

  it('may be very long', () => {
    const long = 'x'.repeat(60);
    const text = reportPage(
      sampleReport(scenarioText.replace('Test house', long), {
        'tariff.yaml': tariffText.replace('Test tariff', long),
      }),
    );
    // In drawings the name is cut, in tables it stands whole.
    expect(text).toContain(`<bdi>${long}</bdi>`);
    expect(text).toContain(`<h4>Cost of the heating by month on ${'x'.repeat(27)}…</h4>`);
  });
});
