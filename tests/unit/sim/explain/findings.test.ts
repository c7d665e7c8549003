import { expect, test } from 'vitest';
import { MARK } from '../../../../src/sim/columns.ts';
import type { StageName } from '../../../../src/sim/explain/stage.ts';
import { planOf } from '../planBuilder.ts';
import { type ExplainedCase, explainedCases, explainedPlans, figureOf, withRest } from './explainedYears.ts';

// What is said of an hour beside its figures is held against the columns of the year, which other tests hold.

const stageOf = ({ stages }: ExplainedCase, name: StageName) => stages.find(({ stage }) => stage === name);

test('the compressor is said to run in just the hours in which it gives heat', () => {
  const hours = { running: 0, idle: 0 };
  for (const one of explainedCases(1)) {
    const { year, i } = one;
    const runs = year.heatPumpSpaceHeat[i]! > 0 || year.heatPumpWaterHeat[i]! > 0;
    hours[runs ? 'running' : 'idle']++;
    const { findings } = stageOf(one, 'auxiliaries')!;
    expect(findings.includes('compressorRuns'), `${one.name} ${i}`).toBe(runs);
    expect(findings.includes('compressorIdle'), `${one.name} ${i}`).toBe(!runs);
  }
  expect(Math.min(hours.running, hours.idle)).toBeGreaterThan(100);
});

test('it is said to run below its lowest level in just the hours that are marked so', () => {
  let cycling = 0;
  for (const one of explainedCases(1)) {
    const { year, i } = one;
    const marked = (year.marks[i]! & MARK.cycling) !== 0;
    // the rate that was only offered to a cheaper boiler is not the one that was run
    const rate = stageOf(one, 'rateLeft') ?? stageOf(one, 'rate');
    expect(rate?.findings.includes('cycling') ?? false, `${one.name} ${i}`).toBe(marked);
    if (marked) cycling++;
  }
  expect(cycling).toBeGreaterThan(100);
});

test('of two sources the one is said to be cheaper whose cost is less; ties go to the heat pump', () => {
  const said = { boiler: 0, heatPump: 0, neither: 0 };
  for (const one of explainedCases(1, { cheaper: explainedPlans['the cheaper of two sources']! })) {
    const stage = stageOf(one, 'backup');
    const isCompared = stage?.figures.some(({ name }) => name === 'costByBoiler') ?? false;
    const dearer = isCompared && figureOf(stage, 'costByHeatPump') > figureOf(stage, 'costByBoiler');
    expect(stage?.findings.includes('boilerCarries'), `${one.i}`).toBe(dearer);
    expect(stage?.findings.includes('heatPumpCheaper'), `${one.i}`).toBe(isCompared && !dearer);
    said[dearer ? 'boiler' : isCompared ? 'heatPump' : 'neither']++;
  }
  expect(Math.min(said.boiler, said.heatPump, said.neither)).toBeGreaterThan(5);
});

test('the backup is said to be short, or not to be needed, by what it was asked and gave', () => {
  const said = { unmet: 0, notNeeded: 0, asked: 0 };
  for (const one of explainedCases(1)) {
    const { year, i } = one;
    const stage = stageOf(one, 'backup')!;
    if (stage.findings.includes('noHeatAsked')) continue;
    const unmet = year.unmetHeat[i]! > 0;
    expect(stage.findings.includes('unmet'), `${one.name} ${i}`).toBe(unmet);
    const carries = stage.findings.includes('boilerCarries');
    const asked = carries || figureOf(stage, 'backupAsked') > 0;
    expect(stage.findings.includes('noBackupNeeded'), `${one.name} ${i}`).toBe(!asked);
    if (unmet) said.unmet++;
    said[asked ? 'asked' : 'notNeeded']++;
  }
  expect(Math.min(said.unmet, said.asked, said.notNeeded)).toBeGreaterThan(20);
});

test('a reheat is put down to hygiene in the hour that asks for it, and to nothing of the kind where none is asked', () => {
  let asked = 0;
  for (const one of explainedCases(1)) {
    const { hotWater } = one.plan;
    if (hotWater === null) continue;
    const findings = stageOf(one, 'reheat')!.findings;
    if (hotWater.hygieneAsked.every((each) => each === 0)) expect(findings).not.toContain('hygienePending');
    if (hotWater.hygieneAsked[one.i] !== 1 || hotWater.allowed[one.i] !== 1) continue;
    expect(findings, `${one.name} ${one.i}`).toContain('hygienePending');
    expect(findings, `${one.name} ${one.i}`).not.toContain('cylinderCool');
    asked++;
  }
  expect(asked).toBeGreaterThan(5);
});

test('a hygiene run goes on under its name until its temperature is reached', () => {
  let later = 0;
  for (const [name, plan] of Object.entries(explainedPlans)) {
    const { hotWater } = plan;
    if (hotWater === null) continue;
    let pending = false;
    for (const one of explainedCases(1, { [name]: plan })) {
      const { i, year } = one;
      const asked = hotWater.hygieneAsked[i] === 1;
      pending ||= asked;
      const isSaid = stageOf(one, 'reheat')!.findings.includes('hygienePending');
      // the last hour comes twice
      if (i < year.hours - 1) expect(isSaid, `${name} ${i}`).toBe(pending && hotWater.allowed[i] === 1);
      if (isSaid && !asked) later++;
      // it is tried where reheating is allowed, and reached but for rounding
      if (hotWater.allowed[i] === 1 && year.cylinderTemperature[i]! >= hotWater.hygieneTemperature - 1e-9)
        pending = false;
    }
  }
  expect(later).toBeGreaterThan(0);
});

test('only a cylinder that the heat pump did not heat is said to be above its reach', () => {
  let above = 0;
  for (const one of explainedCases(1)) {
    const findings = stageOf(one, 'reheat')?.findings ?? [];
    if (!findings.includes('cylinderAboveReach')) continue;
    expect(one.year.heatPumpWaterHeat[one.i], `${one.name} ${one.i}`).toBe(0);
    above++;
  }
  expect(above).toBeGreaterThan(0);
});

test('the flow is said to be held in just the hours in which the emitters stand at an end of their range', () => {
  const said = { lowest: 0, highest: 0, between: 0 };
  for (const one of explainedCases(1)) {
    const { flow } = one.plan;
    const stage = stageOf(one, 'flow');
    if (stage === undefined || stage.findings.includes('noHeatAsked')) continue;
    const found = one.year.flowTemperature[one.i]!;
    const ends = flow.set === null ? { lowest: found === flow.lowest, highest: found === flow.highest } : {};
    expect(stage.findings.includes('heldAtLowestFlow'), `${one.name} ${one.i}`).toBe(ends.lowest ?? false);
    expect(stage.findings.includes('heldAtHighestFlow'), `${one.name} ${one.i}`).toBe(ends.highest ?? false);
    said[ends.lowest ? 'lowest' : ends.highest ? 'highest' : 'between']++;
  }
  expect(Math.min(said.lowest, said.between)).toBeGreaterThan(20);
});

test('how frost grows is shown in just the hours with a coil below freezing', () => {
  const shown = { frost: 0, above: 0, justAbove: 0 };
  for (const one of explainedCases(1)) {
    const air = stageOf(one, 'air')!;
    const coil = figureOf(air, 'coilTemperature');
    const names = air.figures.map(({ name }) => name);
    expect(names.includes('coilHumidityRatio'), `${one.name} ${one.i}`).toBe(coil < 0);
    shown[coil < 0 ? 'frost' : 'above']++;
    if (coil >= 0 && coil < 1) shown.justAbove++;
  }
  expect(Math.min(shown.frost, shown.above, shown.justAbove)).toBeGreaterThan(5);
});

test('rooms are said to be held back by the heating limit, or to need nothing, in just those hours', () => {
  const said = { held: 0, noNeed: 0, needs: 0 };
  for (const one of explainedCases(1)) {
    const { plan, year, i } = one;
    const { findings } = stageOf(one, 'need')!;
    const held = plan.weather.trailingMeanTemperature[i]! >= plan.house.heatingLimit;
    const noNeed = !held && year.spaceHeatNeed[i] === 0;
    expect(findings.includes('heatingLimitHolds'), `${one.name} ${i}`).toBe(held);
    expect(findings.includes('noNeed'), `${one.name} ${i}`).toBe(noNeed);
    said[held ? 'held' : noNeed ? 'noNeed' : 'needs']++;
  }
  expect(Math.min(said.held, said.noNeed, said.needs)).toBeGreaterThan(20);
});

test('a heating limit holds at the limit itself', () => {
  const flat = planOf({
    hours: 48,
    temperature: new Float64Array(48).fill(12),
    house: { heatingLimit: 12 },
  });
  for (const one of explainedCases(12, { flat })) {
    expect(stageOf(one, 'need')!.findings).toContain('heatingLimitHolds');
    expect(one.year.spaceHeatNeed[one.i]).toBe(0);
  }
});

test('a cylinder is said to be without the heat pump in just the reheats in which that rests', () => {
  const said = { rests: 0, runs: 0 };
  const resting = withRest(explainedPlans['hot water with a hygiene run']!, -2);
  for (const one of explainedCases(1, { ...explainedPlans, resting })) {
    const { findings = [] } = stageOf(one, 'reheat') ?? {};
    if (!(stageOf(one, 'reheat')?.figures ?? []).some(({ name }) => name === 'reheatTarget')) continue;
    const rests = one.plan.resting[one.i] === 1;
    expect(findings.includes('restsForWater'), `${one.name} ${one.i}`).toBe(rests);
    said[rests ? 'rests' : 'runs']++;
  }
  expect(Math.min(said.rests, said.runs)).toBeGreaterThan(3);
});

test('the sums of an hour name the electricity for water in just the houses that have a cylinder', () => {
  for (const one of explainedCases(200)) {
    const names = stageOf(one, 'sums')!.figures.map(({ name }) => name);
    expect(names.includes('heatPumpWaterElectricity'), one.name).toBe(one.plan.hotWater !== null);
  }
});
