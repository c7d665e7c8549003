import type { FigureName } from '../../../../src/sim/explain/figures.ts';
import type { Finding, FormulaName } from '../../../../src/sim/explain/stage.ts';

/** Figures of an hour by name: those of the stage itself, else those that an earlier stage has shown. */
export type Shown = (name: FigureName, otherwise?: number) => number;
/** A figure as shown, and as the formula's words make it of other figures shown. */
export type Sums = readonly (readonly [shown: number, reckoned: number])[];

const clamp = (value: number, least: number, most: number) => Math.min(Math.max(value, least), most);
const kappa = (outdoor: number, flow: number) => (flow + 3 + 273.15) / Math.max(flow - outdoor + 10, 15);

/** Between the corners of the map, in words of section 6. */
function atCorners(f: Shown, what: 'capacity' | 'quality' | 'cop'): number {
  const u = f('outdoorShare');
  const v = f('flowShare');
  const low = (1 - u) * f(`${what}ColdLow`) + u * f(`${what}WarmLow`);
  const high = (1 - u) * f(`${what}ColdHigh`, f(`${what}ColdLow`)) + u * f(`${what}WarmHigh`, f(`${what}WarmLow`));
  return (1 - v) * low + v * high;
}

const frostOf = (f: Shown, what: 'capacityLoss' | 'copLoss') => f(what, 0);
const vapour = (f: Shown, pressure: number) => (0.621945 * pressure) / (f('airPressure') - pressure);
/** What the heat pump gives, or would give where a boiler is cheaper. */
const given = (f: Shown) => (f('offeredHeat', -1) < 0 ? f('heatPumpSpaceHeat') : f('offeredHeat'));
const electricity = (f: Shown) =>
  f('offeredElectricity', -1) < 0 ? f('heatPumpSpaceElectricity') : f('offeredElectricity');
const free = (f: Shown) => 1 - f('hotWaterShare');

/** Every formula as its words have it, worked on the figures shown, as with a pocket calculator. */
export const worked: Record<Exclude<FormulaName, NotWorked>, (f: Shown, findings: readonly Finding[]) => Sums> = {
  humidityFromRelative: (f) => [
    [f('humidityRatio'), vapour(f, (f('relativeHumidity') / 100) * f('saturationPressure'))],
  ],
  frostIndex: (f) => [
    [f('coilTemperature'), f('outdoorTemperature') - 8],
    [f('settlingWater'), Math.max(0, f('humidityRatio') - f('coilHumidityRatio'))],
    [f('stayingShare'), Math.min(1, -f('coilTemperature') / 6)],
    [f('frostIndex'), Math.min(1.5, (f('stayingShare') * f('settlingWater')) / f('referenceWater'))],
  ],
  baseFromGains: (f) => [
    [f('gains'), f('internalGains') + (f('solarAperture') / 1000) * f('trailingMeanRadiation')],
    [f('baseTemperature'), f('setPoint') - f('gains') / (f('heatLoss') / 1000)],
  ],
  baseEntered: (f) => [[f('baseTemperature'), f('enteredBase') + f('setPoint') - f('nominalSetPoint')]],
  degreeHours: (f) =>
    f('trailingMeanTemperature') >= f('heatingLimit', Number.POSITIVE_INFINITY)
      ? []
      : [[f('spaceHeatNeed'), (f('heatLoss') / 1000) * Math.max(0, f('baseTemperature') - f('outdoorTemperature'))]],
  heatingLimit: (f) => (f('trailingMeanTemperature') >= f('heatingLimit') ? [[f('spaceHeatNeed'), 0]] : []),
  airAtRest: (f) => [[f('airAtRest'), f('airFromMass') * f('massTemperature') + f('airFromWeather')]],
  needWithMass: (f) =>
    f('trailingMeanTemperature') >= f('heatingLimit', Number.POSITIVE_INFINITY)
      ? []
      : [[f('spaceHeatNeed'), Math.max(0, (f('setPoint') - f('airAtRest')) / f('airPerHeat'))]],
  draw: (f) => [
    [
      f('storedHeat'),
      Math.max(0, f('cylinderCapacity') * (f('cylinderTemperatureBefore') - f('coldWaterTemperature'))),
    ],
    [f('hotWaterServed'), Math.min(f('hotWaterAsked'), f('storedHeat'))],
    [f('hotWaterShort'), f('hotWaterAsked') - f('hotWaterServed')],
  ],
  cylinderLoss: (f) => [
    [f('cylinderLoss'), f('lossCoefficient') * (f('cylinderTemperatureBefore') - f('surroundingTemperature'))],
    [
      f('cylinderTemperatureAfterDraw'),
      f('cylinderTemperatureBefore') - (f('hotWaterServed') + f('cylinderLoss')) / f('cylinderCapacity'),
    ],
  ],
  reheatPoint: (f) => [
    [f('cylinderReach'), Math.min(f('reheatTarget'), f('highestFlow') - 5)],
    ...(f('hotWaterCop', 0) === 0
      ? []
      : [[f('mapFlow'), (f('cylinderTemperatureAfterDraw') + f('cylinderReach')) / 2 + 5] as const]),
  ],
  reheatByHeatPump: (f) => {
    const wanted = f('cylinderCapacity') * (f('cylinderReach') - f('cylinderTemperatureAfterDraw'));
    return [
      [f('hotWaterCapacity'), f('mapCapacity') * (1 - frostOf(f, 'capacityLoss'))],
      [f('hotWaterCop'), f('mapCop') * (1 - frostOf(f, 'copLoss')) * (1 - f('inUseAllowance'))],
      [f('hotWaterShare'), Math.min(1, wanted / f('hotWaterCapacity'))],
      [f('heatPumpWaterHeat'), f('hotWaterShare') * f('hotWaterCapacity')],
      [f('heatPumpWaterElectricity'), f('heatPumpWaterHeat') / f('hotWaterCop')],
    ];
  },
  reheatByHeater: (f) => {
    const byHeatPump = f('heatPumpWaterHeat', 0);
    const lacking = f('cylinderCapacity') * (f('reheatTarget') - f('cylinderTemperatureAfterDraw')) - byHeatPump;
    const heater = Math.min(lacking, f('waterHeaterPower') * free(f));
    return [
      [f('backupWaterHeat'), f('hotWaterShare') === 1 ? 0 : Math.max(0, heater)],
      [
        f('cylinderTemperature'),
        f('cylinderTemperatureAfterDraw') + (byHeatPump + f('backupWaterHeat')) / f('cylinderCapacity'),
      ],
    ];
  },
  load: (f) => [[f('load'), f('spaceHeatNeed') / f('designLoad')]],
  harderLoad: (f) => {
    const load = f('spaceHeatNeed') / f('designLoad');
    const harder = (f('spaceHeatNeed') + f('waitingBefore')) / (free(f) * f('designLoad'));
    return [[f('load'), Math.min(Math.max(1, load), harder)]];
  },
  emitterFlow: (f) => {
    const lift = f('overTemperature') * f('load') ** f('inverseExponent') + (f('load') * f('spread')) / 2;
    const flow = clamp(f('roomTemperature') + lift, f('lowestEmitterFlow'), f('highestEmitterFlow'));
    return [[f('flowTemperature'), flow]];
  },
  returnTemperature: (f) => [[f('returnTemperature'), f('flowTemperature') - clamp(f('load'), 0.2, 1) * f('spread')]],
  mapInside: (f) => [
    [f('outdoorShare'), wayIn(f, 'outdoorTemperature', 'outdoorBelow', 'outdoorAbove')],
    [f('flowShare'), f('flowAbove', 0) === 0 ? 0 : wayIn(f, 'mapFlow', 'flowBelow', 'flowAbove')],
    ...(f('coldSlope', 0) === 0 ? [[f('mapCapacity'), atCorners(f, 'capacity')] as const] : []),
    [f('mapQuality'), atCorners(f, 'quality')],
    [f('mapCop'), f('mapQuality') * f('kappa') * f('lowFlowGain', 1)],
  ],
  mapLinear: (f) => [
    ...(f('coldSlope', 0) === 0 ? [[f('mapCapacity'), atCorners(f, 'capacity')] as const] : []),
    [f('heldCop'), atCorners(f, 'cop')],
    [f('mapCop'), ((f('heldCop') * f('kappa')) / f('heldKappa')) * f('lowFlowGain', 1)],
  ],
  kappa: (f) => [[f('kappa'), kappa(f('kappaOutdoor'), f('kappaFlow'))]],
  coldCapacity: (f) => {
    const below = f('outdoorBelow') - f('outdoorTemperature');
    const least = 0.3 * f('coldestCapacity');
    return [[f('mapCapacity'), Math.max(least, f('coldestCapacity') - f('coldSlope') * below)]];
  },
  lowFlow: (f) => [[f('lowFlowGain'), 1 + 0.02 * Math.min(10, f('flowBelow') - f('mapFlow'))]],
  frostByHumidity: (f) => [
    [f('capacityLoss'), Math.min(0.5, f('capacityLossRate') * f('frostIndex'))],
    [f('copLoss'), Math.min(0.5, f('copLossRate') * f('frostIndex'))],
  ],
  afterFrost: (f) => [
    [f('lowestCapacity'), f('lowestMapCapacity') * (1 - frostOf(f, 'capacityLoss') * f('frostShareOfLowest', 1))],
    [f('lowestCop'), f('lowestMapCop') * (1 - frostOf(f, 'copLoss') * f('frostShareOfLowest', 1))],
  ],
  lowestByShare: (f) => [
    [f('capacity'), f('mapCapacity') * (1 - frostOf(f, 'capacityLoss'))],
    [f('cop'), f('mapCop') * (1 - frostOf(f, 'copLoss'))],
    [f('lowestMapCapacity'), f('lowestCapacityShare') * f('mapCapacity')],
    [f('lowestMapCop'), f('lowestCopShare') * f('mapCop')],
  ],
  shareThroughLimit: (f) => [
    [
      f('shareThroughLimit'),
      clamp((f('highestFlow') - f('returnTemperature')) / (f('flowTemperature') - f('returnTemperature')), 0, 1),
    ],
    [f('topUp'), f('spaceHeatNeed') * (1 - f('shareThroughLimit'))],
  ],
  givenByHeatPump: (f) => [
    [f('askedOfHeatPump'), f('heatPumpPart') + f('waitingBefore')],
    [f('couldGive'), f('capacity') * f('quietShare', 1) * free(f)],
    [given(f), Math.min(f('askedOfHeatPump'), f('couldGive'))],
  ],
  waiting: (f, findings) => {
    const isOver = (['tooCold', 'restsByBackup', 'lastHour'] as const).some((each) => findings.includes(each));
    const lacking = f('askedOfHeatPump') - f('heatPumpSpaceHeat');
    return [
      [f('displacedHeat'), f('waitingBefore') + f('capacity') - f('couldGive')],
      [f('waitingHeat'), isOver ? 0 : Math.min(lacking, f('mostWaiting'), f('displacedHeat'))],
    ];
  },
  waitingInRoom: (f) => [
    [f('waitingHeat'), Math.min(f('askedOfHeatPump') - f('heatPumpSpaceHeat'), f('capacity') - f('couldGive'))],
  ],
  copBetween: (f) => {
    const way = (f('runningRate') - f('lowestCapacity')) / (f('capacity') - f('lowestCapacity'));
    return [
      [f('runningRate'), given(f) / free(f)],
      [f('copAtRate'), (1 - way) * f('lowestCop') + way * f('cop')],
    ];
  },
  copSingleSpeed: (f) => [[f('copAtRate'), f('cop')]],
  copCycling: (f) => {
    const cop = f('lowestCapacity') >= f('capacity') ? f('cop') : f('lowestCop');
    return [
      [f('runningRate'), given(f) / free(f)],
      [f('cyclingRatio'), f('runningRate') / f('leastRate')],
      [f('copAtRate'), cop * (1 - f('degradationCoefficient') * (1 - f('cyclingRatio')))],
    ];
  },
  copOffPower: (f) => [
    [f('cyclingRatio'), f('runningRate') / f('leastRate')],
    [f('copAtRate'), f('lowestCop')],
  ],
  electricityOfRate: (f) => [[electricity(f), given(f) / (f('copAtRate') * (1 - f('inUseAllowance')))]],
  electricityWithOffPower: (f) => {
    const running = given(f) / (f('copAtRate') * (1 - f('inUseAllowance')));
    return [[electricity(f), running + f('offPower') * (1 - f('cyclingRatio')) * free(f)]];
  },
  starts: (f) => {
    const ratio = f('cyclingRatio');
    const cycles = (f('leastRate') * ratio * (1 - ratio) * free(f)) / (f('cycleWater') * 0.001163 * 5);
    return [[f('starts'), Math.min(6, cycles)]];
  },
  backupParallel: (f) => {
    const asked = f('topUp') + f('askedOfHeatPump') - f('heatPumpSpaceHeat') - f('waitingHeat');
    return [
      [f('backupAsked'), Math.max(0, asked)],
      [f('backupSpaceHeat'), Math.min(f('backupAsked'), f('backupAvailable'))],
      [f('unmetHeat'), f('backupAsked') - f('backupSpaceHeat')],
    ];
  },
  cheapest: (f) => [
    [f('costByHeatPump'), electricity(f) * f('electricityPrice')],
    [f('costByBoiler'), (given(f) / f('backupEfficiency')) * f('fuelPrice')],
  ],
  boilerCarries: (f) => {
    const wanted = f('topUp') + f('askedOfHeatPump');
    const left = Math.min(f('askedOfHeatPump'), wanted - f('backupSpaceHeat'));
    return [
      [f('backupSpaceHeat'), Math.min(f('backupAvailable'), wanted)],
      [f('heatPumpSpaceHeat'), Math.min(left, f('couldGive'))],
      [f('waitingHeat'), 0],
      [f('unmetHeat'), Math.max(0, wanted - f('backupSpaceHeat') - f('heatPumpSpaceHeat'))],
    ];
  },
  roomAfter: (f) => [
    [f('deliveredHeat'), f('heatPumpSpaceHeat', 0) + f('backupSpaceHeat', 0)],
    [f('indoorTemperature'), f('airAtRest') + f('airPerHeat') * f('deliveredHeat')],
    [
      f('massTemperatureAfter'),
      f('massKept') * f('massTemperature') + f('massFromWeather') + f('massPerHeat') * f('deliveredHeat'),
    ],
  ],
  auxiliaries: (f) => [
    [f('circulationElectricity'), f('circulationPower') * (f('spaceHeatNeed') > 0 ? 1 : f('hotWaterShare', 0))],
  ],
  electricity: (f) => {
    const uses = f('heatPumpSpaceElectricity') + f('heatPumpWaterElectricity', 0) + f('circulationElectricity');
    const heaters = f('backupEfficiency', 0) === 0 ? f('backupSpaceHeat') + f('backupWaterHeat', 0) : 0;
    return [[f('electricity'), uses + f('standbyElectricity') + f('crankcaseElectricity') + heaters]];
  },
  fuel: (f) => [
    [f('fuel'), f('backupSpaceHeat') / f('backupEfficiency') + f('backupWaterHeat', 0) / f('backupWaterEfficiency', 1)],
  ],
};

/** Formulas without figures to work on, and those that the report adds. */
type NotWorked =
  | 'humidityFromDewPoint'
  | 'humidityFromWetBulb'
  | 'trailingMeans'
  | 'fiveResistances'
  | 'flowSet'
  | 'frostByTable'
  | 'cost'
  | 'carbon';

function wayIn(f: Shown, at: FigureName, below: FigureName, above: FigureName): number {
  return clamp((f(at) - f(below)) / (f(above) - f(below)), 0, 1);
}
