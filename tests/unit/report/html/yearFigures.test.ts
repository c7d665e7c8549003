import { describe, expect, it } from 'vitest';
import { backupClasses } from '../../../../src/report/html/backupByTemperature.ts';
import { coldestWeek } from '../../../../src/report/html/coldSpell.ts';
import { durationOf } from '../../../../src/report/html/loadDuration.ts';
import { beyondEdges } from '../../../../src/report/html/mapTables.ts';
import { monthsOfRates } from '../../../../src/report/html/ratesByMonth.ts';
import { whatIf } from '../../../../src/report/html/whatIf.ts';
import { heatCells } from '../../../../src/report/html/whereSpent.ts';
import { demoReport, houses, sampleReport } from './reportsOf.ts';

const { answer } = demoReport();
const hybrid = sampleReport(houses['mass, hot water and a hybrid']).answer;
const small = sampleReport(houses['a unit far too small']).answer;
const sum = (values: ArrayLike<number>) => Array.from(values).reduce((total, value) => total + value, 0);

describe('the load-duration curve', () => {
  it('falls, holds all need of the year, and counts the hours in which the unit falls short', () => {
    for (const each of [answer, small]) {
      const { need, capacity, shortHours, warmestShort } = durationOf(each);
      for (let i = 1; i < need.length; i++) expect(need[i]).toBeLessThanOrEqual(need[i - 1]!);
      expect(need.length).toBe(each.totals.hours.heating);
      expect(sum(need)).toBeCloseTo(each.totals.annual.spaceHeatNeed, 6);
      expect(Array.from(need).filter((value, i) => value > capacity[i]! + 1e-9).length).toBe(shortHours);
      expect(warmestShort).toBeLessThan(15);
    }
  });
});

describe('where the year is spent', () => {
  it('holds all heat of the unit, to the rooms and to the cylinder', () => {
    for (const each of [answer, hybrid, small]) {
      const cells = heatCells(each);
      expect(sum(cells.map(({ amount }) => amount))).toBeCloseTo(
        each.totals.annual.heatPumpSpaceHeat + each.totals.annual.heatPumpWaterHeat,
        6,
      );
      expect(new Set(cells.map(({ x, y }) => `${x} ${y}`)).size).toBe(cells.length);
    }
  });
});

describe('the heating by rate and month', () => {
  it('adds up to what each rate takes in the year, and over the rates to the months', () => {
    for (const { bill, householdBill } of answer.costs) {
      const rates = monthsOfRates(bill, householdBill);
      for (const { rate, kWh, cost } of rates) {
        expect(sum(kWh)).toBeCloseTo(bill.byRate[rate]!.kWh - householdBill.byRate[rate]!.kWh, 8);
        expect(sum(cost)).toBeCloseTo(bill.byRate[rate]!.cost - householdBill.byRate[rate]!.cost, 8);
      }
      for (const month of [0, 6]) {
        const added = bill.monthly[month]!.energy - householdBill.monthly[month]!.energy;
        expect(sum(rates.map(({ cost }) => cost[month]!))).toBeCloseTo(added, 8);
      }
    }
  });
});

describe('the coldest week', () => {
  it('is the one with the lowest mean, from midnight on', () => {
    const temperature = new Float64Array(8760).fill(10);
    temperature.fill(-5, 24 * 100 + 6, 24 * 107 + 6);
    // Six hours later than midnight: the week from day 100 loses six cold hours, that from day 101 eighteen.
    expect(coldestWeek(temperature)).toBe(24 * 100);
    expect(coldestWeek(new Float64Array(8760))).toBe(0);
  });
});

describe('backup by outdoor temperature', () => {
  it('adds up to the backup hours and heat of the year', () => {
    for (const { totals, ...each } of [answer, hybrid, small]) {
      const classes = backupClasses({ totals, ...each });
      expect(classes.length).toBeGreaterThan(0);
      expect(sum(classes.map(({ rooms, waterAlone }) => rooms + waterAlone))).toBe(totals.hours.backup);
      expect(sum(classes.map(({ rooms }) => rooms))).toBe(totals.hours.backupForSpace);
      const heat = totals.annual.backupSpaceHeat + totals.annual.backupWaterHeat;
      expect(sum(classes.map(({ heat: part }) => part))).toBeCloseTo(heat, 6);
      for (const { hours, rooms, waterAlone } of classes) expect(rooms + waterAlone).toBeLessThanOrEqual(hours);
    }
  });

  it('is empty where there is no backup', () => {
    expect(backupClasses(sampleReport(houses['no backup']).answer)).toEqual([]);
  });
});

describe('hours beyond the edges of the table', () => {
  it('are those that the run marks, where no hot water is made', () => {
    const { answer: rooms } = sampleReport();
    const { colder, warmer, hotter, cooler } = beyondEdges(rooms);
    const { outsideMap, belowLowestFlow } = rooms.totals.hours;
    expect(cooler.hours).toBe(belowLowestFlow);
    expect(colder.hours + warmer.hours + hotter.hours).toBe(outsideMap);
    expect(cooler.heat).toBeGreaterThan(0);
  });
});

describe('what could change the year', () => {
  const changes = whatIf(answer);
  const [present] = answer.costs;

  it('has the greatest change first', () => {
    const sizes = changes.map(({ cost = 0, saving = 0 }) => Math.max(Math.abs(cost), Math.abs(saving)));
    expect(sizes.length).toBe(4);
    expect([...sizes].sort((a, b) => b - a)).toEqual(sizes);
  });

  it('agrees with the table of other prices', () => {
    const row = answer.comparison!.sensitivity.find((each) => each.electricityChange === 0.2 && each.fuelChange === 0)!;
    const dearer = changes.find(({ kind }) => kind === 'electricity')!;
    expect(present!.saving! + dearer.saving!).toBeCloseTo(row.annualSaving, 9);
    const fuel = answer.comparison!.sensitivity.find(
      (each) => each.electricityChange === 0 && each.fuelChange === 0.2,
    )!;
    expect(present!.saving! + changes.find(({ kind }) => kind === 'fuel')!.saving!).toBeCloseTo(fuel.annualSaving, 9);
  });

  it('takes 1.5 to 4 % more electricity for each kelvin of flow', () => {
    // Common practice: 2 to 3 % a kelvin; the map's own points lie near it.
    const { electricity } = changes.find(({ kind }) => kind === 'flow')!;
    const share = electricity / answer.totals.annual.heatPumpSpaceElectricity / 5;
    expect(share).toBeGreaterThan(0.015);
    expect(share).toBeLessThan(0.04);
  });

  it('is nothing where no heat is asked and nothing is used', () => {
    expect(whatIf(sampleReport(houses['no need of heat']).answer).filter(({ kind }) => kind === 'flow')).toEqual([]);
  });

  it('speaks of kWh alone where there is no tariff', () => {
    for (const change of whatIf(sampleReport(houses['no tariff']).answer)) expect(change.cost).toBeUndefined();
  });
});
