import fc from 'fast-check';
import type { PlainBackup, PlainCase, PlainFlow, PlainHotWater, PlainHouse, PlainMass } from './plainCase.ts';
import { type Draws, drawsFrom } from './plainDraws.ts';
import { inventUnit, thresholdOf, type UnitForms } from './plainUnitCase.ts';
import { inventWeather } from './plainWeatherCase.ts';

/** Which forms a case takes; its numbers follow from the seed. */
export interface CaseForms extends UnitForms {
  readonly seed: number;
  readonly hours: number;
  readonly rooms: 'gains' | 'enteredBase' | PlainMass['massClass'];
  readonly flow: PlainFlow['kind'];
  readonly hotWater: 'none' | 'always' | 'windows';
  readonly backup: 'electric' | 'boiler';
  readonly mode: PlainBackup['mode']['kind'];
}

/** Short runs mostly, for speed; now and then a whole year, common or leap. */
const hours = fc.oneof(
  { weight: 20, arbitrary: fc.integer({ min: 700, max: 760 }) },
  { weight: 1, arbitrary: fc.constantFrom(8760, 8784) },
);

export const caseForms: fc.Arbitrary<CaseForms> = fc.record({
  seed: fc.integer({ min: 0, max: 2 ** 32 - 1 }),
  hours,
  rooms: fc.oneof(
    { weight: 2, arbitrary: fc.constantFrom('gains' as const, 'enteredBase' as const) },
    { weight: 1, arbitrary: fc.constantFrom('veryLight', 'light', 'medium', 'heavy', 'veryHeavy') },
  ),
  flow: fc.constantFrom('line', 'emitters', 'emitters'),
  lowest: fc.constantFrom('share', 'share', 'singleSpeed', 'table'),
  linear: fc.boolean(),
  defrost: fc.constantFrom('included', 'humidity', 'table'),
  cycling: fc.constantFrom('degradation', 'offPower'),
  quiet: fc.constantFrom('none', 'none', 'stop', 'some'),
  hotWater: fc.constantFrom('none', 'always', 'windows'),
  backup: fc.constantFrom('electric', 'boiler'),
  mode: fc.constantFrom('parallel', 'alternative', 'cheapest'),
});

/** The case that belongs to its forms. The mode `cheapest` needs a boiler, so it brings one. */
export function inventCase(forms: CaseForms): PlainCase {
  const draws = drawsFrom(forms.seed);
  const weather = inventWeather(draws, forms.hours);
  const house = inventHouse(draws, forms, weather.temperature);
  return {
    weather,
    house,
    flow: inventFlow(draws, forms.flow),
    unit: inventUnit(draws, forms, house.designLoad, weather.temperature),
    hotWater: forms.hotWater === 'none' ? null : inventHotWater(draws, forms),
    backup: inventBackup(draws, forms, house.designLoad, weather.temperature),
    pump: draws.between(0, 80),
  };
}

/** By whole days with degree hours (absence); with mass also by hours (set-back). */
function inventSetPoint(draws: Draws, count: number, hasMass: boolean): number[] {
  const usual = draws.between(18, 22);
  const lower = usual - draws.between(0, 5);
  const awayFrom = draws.whole(0, 40);
  const awayDays = draws.whole(0, 4);
  const nights = hasMass && draws.chance(0.6);
  return Array.from({ length: count }, (_, i) => {
    const day = Math.floor(i / 24);
    const isAway = day >= awayFrom && day < awayFrom + awayDays;
    return isAway || (nights && i % 24 < 6) ? lower : usual;
  });
}

function inventHeatingLimit(draws: Draws, temperature: readonly number[]): number | null {
  const first = temperature[0] as number;
  if (temperature.every((outdoor) => outdoor === first)) return draws.oneOf([first, null]);
  return draws.chance(0.4) ? draws.between(4, 16) : null;
}

/** A usual house, or a small one of glass that loses more than its inner surfaces can pass on. */
function inventMass(draws: Draws) {
  if (draws.chance(0.2)) {
    return { floorArea: draws.between(8, 20), windows: 0.9, opaque: draws.between(0.02, 0.05), ventilation: 0.3 };
  }
  return {
    floorArea: draws.between(80, 260),
    windows: draws.between(0.1, 1),
    opaque: draws.between(0.2, 1.5),
    ventilation: draws.between(0.1, 1),
  };
}

function inventHouse(draws: Draws, { rooms }: CaseForms, temperature: readonly number[]): PlainHouse {
  const hasMass = rooms !== 'gains' && rooms !== 'enteredBase';
  const heatLoss = draws.between(60, 450);
  const setPoint = inventSetPoint(draws, temperature.length, hasMass);
  return {
    heatLoss,
    designLoad: (heatLoss * draws.between(15, 38)) / 1000,
    setPoint,
    enteredBase: rooms === 'enteredBase' ? { base: draws.between(12, 18), atSetPoint: draws.between(18, 22) } : null,
    internalGains: draws.between(0, 1200),
    solarAperture: draws.chance(0.7) ? draws.between(0, 12) : 0,
    heatingLimit: inventHeatingLimit(draws, temperature),
    mass: hasMass ? { ...inventMass(draws), massClass: rooms } : null,
  };
}

function inventFlow(draws: Draws, kind: PlainFlow['kind']): PlainFlow {
  if (kind === 'line') {
    const at = draws.rising(draws.whole(1, 3), -15, 8);
    return { kind, line: at.map((outdoor) => [outdoor, draws.between(45, 60) - outdoor] as const) };
  }
  const flow = draws.between(33, 65);
  return {
    kind,
    flow,
    return: flow - draws.between(3, 10),
    room: draws.between(18, 22),
    exponent: draws.between(1, 1.4),
    lowest: draws.between(20, 30),
    highest: flow + draws.between(-3, 8),
  };
}

function inventHotWater(draws: Draws, { hotWater, hours: count }: CaseForms): PlainHotWater {
  const setPoint = draws.between(43, 57);
  const daily = draws.between(2, 15);
  const shares = Array.from({ length: 24 }, () => (draws.chance(0.3) ? draws.between(0, 1) : 0));
  const sum = shares.reduce((total, share) => total + share, 0);
  const reheatFrom = draws.whole(0, 20);
  const reheatHours = draws.whole(2, 8);
  const weekly = draws.chance(0.6) ? draws.whole(0, 167) : -1;
  const isAllowed = (i: number) => hotWater === 'always' || (i + 24 - reheatFrom) % 24 < reheatHours;
  const each = <T>(value: (i: number) => T) => Array.from({ length: count }, (_, i) => value(i));
  return {
    volume: draws.between(90, 320),
    setPoint,
    hysteresis: draws.between(1, 9),
    lossCoefficient: draws.between(0.5, 4),
    surroundings: draws.chance(0.1) ? draws.between(30, 50) : draws.between(8, 22),
    draw: each((i) => (sum === 0 ? 0 : (daily * (shares[i % 24] as number)) / sum)),
    coldWater: each((i) => 10 + 4 * Math.cos((2 * Math.PI * (i - 4000)) / count)),
    allowed: each(isAllowed),
    hygieneAsked: each((i) => weekly >= 0 && i % 168 === weekly),
    hygieneTemperature: draws.between(50, 68),
    immersion: draws.chance(0.1) ? 0 : draws.between(0.3, 3),
  };
}

function inventBackup(draws: Draws, forms: CaseForms, designLoad: number, temperature: readonly number[]): PlainBackup {
  const hasBoiler = forms.backup === 'boiler' || forms.mode === 'cheapest';
  const power = draws.chance(0.15) ? 0 : designLoad * draws.between(0.05, 1.3);
  const boiler = { efficiency: draws.between(0.8, 1.05), hotWaterEfficiency: draws.between(0.7, 0.95) };
  return { power, boiler: hasBoiler ? boiler : null, mode: inventMode(draws, forms, temperature) };
}

function inventMode(draws: Draws, { mode }: CaseForms, temperature: readonly number[]): PlainBackup['mode'] {
  if (mode === 'parallel') return { kind: mode };
  if (mode === 'alternative') return { kind: mode, switchTemperature: thresholdOf(draws, temperature, -6, 8) };
  const fuel = draws.chance(0.25) ? 0 : draws.between(0.04, 0.15);
  const usual = draws.between(0.1, 0.5);
  // Free electricity beside free fuel is the one tie that no rounding can break.
  const electricity = temperature.map(() =>
    draws.chance(0.3) ? 0 : usual * draws.between(draws.chance(0.1) ? -0.3 : 0.3, 1.7),
  );
  return { kind: mode, electricity, fuel };
}
