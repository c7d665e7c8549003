import { execFileSync, spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { YearPlan } from '../src/sim/yearPlan.ts';

/** A plain C loop of a plan's year, compiled on this machine. */
export interface PlainC {
  /** Nanoseconds an hour over so many years. */
  readonly time: (years: number) => number;
  /** Electricity of its year, kWh: it must be the program's. */
  readonly electricity: number;
  readonly close: () => void;
}

/**
 * Compiles `bench/c/year.c` and hands it the plan.
 *
 * @param plan degree hours with gains, emitters, tables for both levels on the same axes, frost by humidity, hot water, an
 *   electric backup
 * @returns nothing where there is no C compiler
 */
export function plainC(plan: YearPlan): PlainC | undefined {
  const folder = mkdtempSync(join(tmpdir(), 'winterledger-bench-'));
  const program = join(folder, 'year');
  const built = spawnSync('gcc', ['-O3', '-march=native', '-o', program, 'bench/c/year.c', '-lm']);
  if (built.status !== 0) {
    rmSync(folder, { recursive: true });
    return undefined;
  }
  const data = join(folder, 'plan.bin');
  writeFileSync(data, Buffer.from(numbersOf(plan).buffer));
  const run = (years: number) => {
    const printed = execFileSync(program, [data, String(years)], { encoding: 'utf8' });
    return printed.trim().split(' ').map(Number);
  };
  return {
    time: (years) => run(years)[0],
    electricity: run(1)[1],
    close: () => rmSync(folder, { recursive: true }),
  };
}

function numbersOf(plan: YearPlan): Float64Array {
  const { weather, house, flow, unitOnWeather, hotWater, backup } = plan;
  const { unit } = unitOnWeather;
  const { full, lowest, defrost, cycling } = unit;
  if (lowest.given !== 'table' || defrost.method !== 'humidity' || cycling.method !== 'degradation' || !hotWater) {
    throw new Error('the plain loop knows one kind of plan only');
  }
  const head = [weather.hours, full.outdoor.length, full.flow.length];
  const parameters = [
    ...[house.heatLoss, house.designLoad, house.setPoint[0], house.internalGains, house.solarAperture],
    ...[
      flow.roomTemperature,
      flow.overTemperature,
      flow.inverseExponent.exponent,
      flow.spread,
      flow.lowest,
      flow.highest,
    ],
    ...[unitOnWeather.highestFlow[0], defrost.capacityLoss, defrost.copLoss, cycling.coefficient, plan.cycleWater],
    ...[backup.power, plan.circulationPower, unit.standbyPower, unit.crankcasePower, unit.crankcaseBelow],
    ...[hotWater.volume, hotWater.setPoint, hotWater.hysteresis, hotWater.lossCoefficient],
    ...[hotWater.surroundingTemperature, hotWater.hygieneTemperature, hotWater.immersionPower],
  ];
  const tables = [full.outdoor, full.flow, full.capacity, full.quality, lowest.map.capacity, lowest.map.quality];
  const columns = [weather.temperature, weather.trailingMeanRadiation, weather.frostIndex, hotWater.draw];
  return Float64Array.from([
    ...head,
    ...parameters,
    ...[...tables, ...columns, hotWater.coldWater].flatMap((column) => [...column]),
    ...hotWater.hygieneAsked,
  ]);
}
