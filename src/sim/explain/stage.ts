import { type Figure, type Figures, listed } from './figures.ts';

/** The stages of an hour in the order of the model. */
export type StageName =
  | 'air'
  | 'need'
  | 'hotWater'
  | 'hotWaterMap'
  | 'reheat'
  | 'flow'
  | 'map'
  | 'lowestMap'
  | 'frost'
  | 'levels'
  | 'running'
  | 'rate'
  | 'backup'
  | 'rateLeft'
  | 'room'
  | 'auxiliaries'
  | 'sums'
  | 'money';

/** Formulas by which the figures of a stage follow from one another. */
export type FormulaName =
  | 'humidityFromRelative'
  | 'humidityFromDewPoint'
  | 'humidityFromWetBulb'
  | 'trailingMeans'
  | 'frostIndex'
  | 'baseFromGains'
  | 'baseEntered'
  | 'degreeHours'
  | 'heatingLimit'
  | 'fiveResistances'
  | 'airAtRest'
  | 'needWithMass'
  | 'draw'
  | 'cylinderLoss'
  | 'reheatPoint'
  | 'reheatByHeatPump'
  | 'reheatByHeater'
  | 'load'
  | 'harderLoad'
  | 'emitterFlow'
  | 'flowSet'
  | 'returnTemperature'
  | 'mapInside'
  | 'mapLinear'
  | 'kappa'
  | 'coldCapacity'
  | 'lowFlow'
  | 'frostByHumidity'
  | 'frostByTable'
  | 'afterFrost'
  | 'lowestByShare'
  | 'shareThroughLimit'
  | 'givenByHeatPump'
  | 'waiting'
  | 'waitingInRoom'
  | 'copBetween'
  | 'copSingleSpeed'
  | 'copCycling'
  | 'copOffPower'
  | 'electricityOfRate'
  | 'electricityWithOffPower'
  | 'starts'
  | 'backupParallel'
  | 'cheapest'
  | 'boilerCarries'
  | 'roomAfter'
  | 'auxiliaries'
  | 'electricity'
  | 'fuel'
  | 'cost'
  | 'carbon';

/** What held in the hour. */
export type Finding =
  | 'humidityAssumed'
  | 'pressureAssumed'
  | 'noFrost'
  | 'heatingLimitHolds'
  | 'noNeed'
  | 'noHotWater'
  | 'hotWaterShort'
  | 'reheatNotDue'
  | 'reheatNotAllowed'
  | 'hygienePending'
  | 'reheatUnderWay'
  | 'cylinderCool'
  | 'restsForWater'
  | 'cylinderAboveReach'
  | 'reheatGoesOn'
  | 'noHeatAsked'
  | 'emittersHarder'
  | 'heldAtLowestFlow'
  | 'heldAtHighestFlow'
  | 'tooCold'
  | 'restsByBackup'
  | 'colderThanMap'
  | 'warmerThanMap'
  | 'belowLowestFlow'
  | 'hotterThanMap'
  | 'oneFlowColumn'
  | 'insideMap'
  | 'frostIncluded'
  | 'noFrostLoss'
  | 'singleSpeed'
  | 'flowAboveLimit'
  | 'quietHour'
  | 'lastHour'
  | 'heatPumpGivesNothing'
  | 'cycling'
  | 'noBackupNeeded'
  | 'boilerCarries'
  | 'heatPumpCheaper'
  | 'unmet'
  | 'roomNeedsNothing'
  | 'compressorRuns'
  | 'compressorIdle'
  | 'noTariff'
  | 'pricedByBlocks'
  | 'blocksNotSeen'
  | 'carbonByHour'
  | 'noCarbonFactor';

/** One stage of an explained hour. Without figures it says, by a finding, why there is nothing to do. */
export interface ExplainedStage {
  readonly stage: StageName;
  readonly formulas: readonly FormulaName[];
  readonly findings: readonly Finding[];
  readonly figures: readonly Figure[];
}

/** What a stage says, before it is put together. */
interface StageParts {
  readonly formulas?: readonly (FormulaName | false)[];
  readonly findings?: readonly (Finding | false)[];
  readonly figures?: Figures;
}

/** A stage from its parts; what is false is left out. */
export function explainedStage(stage: StageName, parts: StageParts): ExplainedStage {
  const { formulas = [], findings = [], figures = {} } = parts;
  return {
    stage,
    formulas: formulas.filter((name) => name !== false),
    findings: findings.filter((name) => name !== false),
    figures: listed(figures),
  };
}

/** A stage that has nothing to do. */
export function idleStage(stage: StageName, why: Finding): ExplainedStage {
  return explainedStage(stage, { findings: [why] });
}
