import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { YearColumns } from '../../../../src/sim/columns.ts';
import { explainHour } from '../../../../src/sim/explain/explainHour.ts';
import type { Finding, StageName } from '../../../../src/sim/explain/stage.ts';
import { simulateYear } from '../../../../src/sim/year.ts';
import { anyPlan } from '../anyPlan.ts';
import { type ExplainedCase, explainedCases, explainedPlans, figureOf } from './explainedYears.ts';

/** Figures of an explanation that are not what the year has, and how many were held to it. */
function strangers({ plan, year, i, stages }: Omit<ExplainedCase, 'name'>) {
  const others = { outdoorTemperature: plan.weather.temperature, setPoint: plan.house.setPoint };
  const columns: Record<string, unknown> = { ...year, ...others, ...plan.weather, temperature: undefined };
  const wrong: string[] = [];
  let held = 0;
  for (const { stage, figures } of stages) {
    for (const { name, value } of figures) {
      if (!Number.isFinite(value)) wrong.push(`${stage}: ${name} is ${value}`);
      const values = columns[name];
      if (!(values instanceof Float64Array)) continue;
      held++;
      if (value !== values[i]) wrong.push(`${stage}: ${name} is ${value}, not ${values[i]}`);
    }
  }
  return { wrong, held };
}

const findings = new Set<Finding>();
const stagesSeen = new Set<StageName>();

describe('an explained hour', () => {
  test.each(Object.keys(explainedPlans))('has the figures of the simulated year, to the last bit: %s', (name) => {
    let total = 0;
    for (const one of explainedCases(1, { [name]: explainedPlans[name]! })) {
      const { wrong, held } = strangers(one);
      expect(wrong, `hour ${one.i}`).toEqual([]);
      total += held;
      for (const { stage, findings: said } of one.stages) {
        stagesSeen.add(stage);
        for (const finding of said) findings.add(finding);
      }
    }
    expect(total).toBeGreaterThan(480 * 15);
  });

  test('has them on random plans too', () => {
    let total = 0;
    const law = fc.property(anyPlan, fc.nat(), (plan, start) => {
      const year = simulateYear(plan);
      for (let k = 0; k < 20; k++) {
        const i = (start + 37 * k) % year.hours;
        const air = { kind: 'relative', humidity: 80, humidityMeasured: true, pressureMeasured: true } as const;
        const { wrong, held } = strangers({ plan, year, i, stages: explainHour(plan, year, i, air) });
        expect(wrong, `hour ${i}`).toEqual([]);
        total += held;
      }
    });
    fc.assert(law, { seed: 20250215, numRuns: 60 });
    expect(total).toBeGreaterThan(60 * 20 * 15);
  });

  test('was looked at in every situation that it can speak of', () => {
    const missing = Object.keys(KNOWN).filter((finding) => !findings.has(finding as Finding));
    // what weather file, bill and carbon factors say is spoken of elsewhere
    expect(missing.sort()).toEqual(
      ['blocksNotSeen', 'carbonByHour', 'humidityAssumed', 'noCarbonFactor', 'noTariff', 'pricedByBlocks'].sort(),
    );
    expect(stagesSeen.size).toBe(17);
  });

  test('has a word for each stage that has nothing to do, and no stage without either', () => {
    for (const { stages } of explainedCases(7)) {
      for (const { stage, figures, findings: said } of stages) {
        expect(figures.length + said.length, stage).toBeGreaterThan(0);
      }
    }
  });

  test('keeps the order of the model', () => {
    const [first] = explainedCases(480, { all: explainedPlans['a house with mass, and hot water']! });
    const order: StageName[] = ['air', 'need', 'hotWater', 'reheat', 'flow', 'map', 'frost', 'levels', 'running'];
    expect(first!.stages.map(({ stage }) => stage)).toEqual([
      ...order,
      ...(['rate', 'backup', 'room', 'auxiliaries', 'sums'] as const),
    ]);
  });

  test('leaves the simulated year as it is', () => {
    const plan = explainedPlans['the cheaper of two sources']!;
    const year = simulateYear(plan);
    const before = structuredClone(year) as YearColumns;
    const air = { kind: 'relative', humidity: 80, humidityMeasured: true, pressureMeasured: true } as const;
    for (let i = 0; i < 480; i += 5) explainHour(plan, year, i, air);
    expect(year).toEqual(before);
  });

  test('hands on what the hour before left: waiting heat, cylinder, mass', () => {
    for (const { year, i, stages } of explainedCases(3)) {
      if (i === 0) continue;
      const named = new Map(stages.map((stage) => [stage.stage, stage]));
      const water = named.get('hotWater');
      if (water !== undefined && water.figures.length > 0) {
        expect(figureOf(water, 'cylinderTemperatureBefore')).toBe(year.cylinderTemperature[i - 1]);
      }
      const room = named.get('room');
      if (room !== undefined && i + 1 < year.hours) {
        expect(figureOf(room, 'massTemperatureAfter')).toBe(year.massTemperature[i + 1]);
      }
      const running = named.get('running');
      if (room === undefined && running !== undefined && running.figures.length > 0) {
        expect(figureOf(running, 'waitingBefore')).toBe(year.waitingHeat[i - 1]);
      }
    }
  });
});

/** Every finding; the compiler refuses one that is missing here. */
const KNOWN: Record<Finding, true> = {
  humidityAssumed: true,
  pressureAssumed: true,
  noFrost: true,
  heatingLimitHolds: true,
  noNeed: true,
  noHotWater: true,
  hotWaterShort: true,
  reheatNotDue: true,
  reheatNotAllowed: true,
  hygienePending: true,
  reheatUnderWay: true,
  cylinderCool: true,
  restsForWater: true,
  cylinderAboveReach: true,
  reheatGoesOn: true,
  noHeatAsked: true,
  emittersHarder: true,
  heldAtLowestFlow: true,
  heldAtHighestFlow: true,
  tooCold: true,
  restsByBackup: true,
  colderThanMap: true,
  warmerThanMap: true,
  belowLowestFlow: true,
  hotterThanMap: true,
  oneFlowColumn: true,
  insideMap: true,
  frostIncluded: true,
  noFrostLoss: true,
  singleSpeed: true,
  flowAboveLimit: true,
  quietHour: true,
  lastHour: true,
  heatPumpGivesNothing: true,
  cycling: true,
  noBackupNeeded: true,
  boilerCarries: true,
  heatPumpCheaper: true,
  unmet: true,
  roomNeedsNothing: true,
  compressorRuns: true,
  compressorIdle: true,
  noTariff: true,
  pricedByBlocks: true,
  blocksNotSeen: true,
  carbonByHour: true,
  noCarbonFactor: true,
};
