import { describe, expect, it } from 'vitest';
import { problemText } from '../../../../src/core/problemText.ts';
import { meterPeriods } from '../../../../src/scenario/readings/meterPeriods.ts';
import { dayText } from '../../../../src/scenario/readings/readingDates.ts';
import { readMeter } from '../../../../src/scenario/readings/readMeter.ts';

function periodsOf(text: string) {
  const { meter, problems } = readMeter(text, 'meter.csv', undefined);
  if (meter === undefined) throw new Error(problems.map(problemText).join('\n'));
  return meterPeriods(meter, 'meter.csv');
}

/** Periods as `from..to amount`. */
function listOf(text: string): string[] {
  const { made } = periodsOf(text);
  return (made?.periods ?? []).map(({ fromDay, toDay, amount }) => `${dayText(fromDay)}..${dayText(toDay)} ${amount}`);
}

describe('periods of a meter', () => {
  it('run from reading to reading', () => {
    expect(listOf('date,reading kWh\n2024-01-01,100\n2024-02-01,350\n2024-03-01,550')).toEqual([
      '2024-01-01..2024-02-01 250',
      '2024-02-01..2024-03-01 200',
    ]);
  });

  it('are one on both sides of an estimated reading, even where that one was too high', () => {
    const text = 'date,reading kWh,estimated\n2024-01-01,100,\n2024-02-01,600,x\n2024-03-01,550,';
    expect(listOf(text)).toEqual(['2024-01-01..2024-03-01 450']);
    expect(periodsOf(text).made).toMatchObject({ estimated: 1, unused: [] });
  });

  it('begin anew with a marked meter, on the day or later', () => {
    const text = (day: string) =>
      `date,reading kWh,new meter\n2024-01-01,900,\n2024-02-01,990,\n${day},3,x\n2024-03-01,53,`;
    expect(listOf(text('2024-02-01'))).toEqual(['2024-01-01..2024-02-01 90', '2024-02-01..2024-03-01 50']);
    expect(periodsOf(text('2024-02-01')).made?.unused).toEqual([]);
    expect(listOf(text('2024-02-05'))).toEqual(['2024-01-01..2024-02-01 90', '2024-02-05..2024-03-01 50']);
    const unused = periodsOf(text('2024-02-05')).made?.unused ?? [];
    expect(unused.map(({ fromDay, toDay }) => [dayText(fromDay), dayText(toDay)])).toEqual([
      ['2024-02-01', '2024-02-05'],
    ]);
  });

  it('leave out what lies before the first and after the last real reading', () => {
    const text = 'date,reading kWh,estimated\n2024-01-01,1,x\n2024-02-01,9,\n2024-03-01,20,\n2024-04-01,31,x';
    expect(listOf(text)).toEqual(['2024-02-01..2024-03-01 11']);
    const unused = periodsOf(text).made?.unused ?? [];
    expect(unused.map(({ fromDay, toDay }) => [dayText(fromDay), dayText(toDay)])).toEqual([
      ['2024-01-01', '2024-02-01'],
      ['2024-03-01', '2024-04-01'],
    ]);
  });

  it('cannot have a falling reading: both lines are named', () => {
    const { made, problems } = periodsOf('date,reading kWh\n2024-01-01,9100\n2024-02-01,9350\n2024-03-01,40');
    expect(made).toBeUndefined();
    expect(problems.map(problemText)).toEqual([
      expect.stringContaining('meter.csv:4:12  the reading falls to 40, from 9350 in line 3'),
    ]);
    expect(problemText(problems[0]!)).toContain('mark the second in a column “exchange”');
  });
});

describe('periods of use and of fills', () => {
  it('belong to the time since the date before; the first line only starts', () => {
    expect(listOf('date,use kWh\n2024-01-01,\n2024-02-01,250\n2024-03-01,200')).toEqual([
      '2024-01-01..2024-02-01 250',
      '2024-02-01..2024-03-01 200',
    ]);
    expect(listOf('date,fill litre\n2023-09-01,2400\n2024-02-01,1900\n2024-09-01,1100')).toEqual([
      '2023-09-01..2024-02-01 1900',
      '2024-02-01..2024-09-01 1100',
    ]);
  });

  it('add an estimated bill to the next one, which sets it right', () => {
    expect(listOf('date,use kWh,estimated\n2024-01-01,,\n2024-02-01,250,x\n2024-03-01,200,')).toEqual([
      '2024-01-01..2024-03-01 450',
    ]);
  });
});
