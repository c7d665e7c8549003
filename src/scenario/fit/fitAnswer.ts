import type { Problem } from '../../core/problem.ts';
import {
  type HeatingSignature,
  HIGHEST_BASE,
  heatingSignature,
  heatLossOfSignature,
  LEAST_PERIODS,
  type MeteredHeatLoss,
  type SignatureResult,
} from '../../sim/heatingSignature.ts';
import type { LoadedScenario } from '../loadScenario.ts';
import { heatLossOf } from '../prepare/prepareHouse.ts';
import type { LoadedReadings } from '../readings/loadReadings.ts';
import { fitDoubts, isBelieved } from './fitDoubts.ts';

/** The heat loss that meter readings show, with all that it rests on. */
export interface FitAnswer {
  readonly scenario: LoadedScenario;
  readonly readings: LoadedReadings;
  readonly signature: HeatingSignature;
  /** W/K */
  readonly heatLoss: MeteredHeatLoss;
  /** Heat loss that the scenario has now, W/K. */
  readonly enteredHeatLoss: number;
  /** Whether the line may be used; else the doubts say why not. */
  readonly believed: boolean;
  /** Warnings, the weightiest first. */
  readonly doubts: readonly Problem[];
  /** Lines to put into the scenario; none where the line is not believed. */
  readonly lines: readonly string[];
}

/** Digits of a heat loss in a scenario: more than the readings can tell, and few enough to be read. */
const DIGITS = 4;

/**
 * The heat loss that meter readings show.
 *
 * @param scenario of the house
 * @param readings with the weather of their time
 * @returns the answer; or the problem that keeps a line from being drawn
 *
 * Reference: MODEL section 13.
 */
export function fitAnswer(
  scenario: LoadedScenario,
  readings: LoadedReadings,
): { answer?: FitAnswer; problems: Problem[] } {
  const result = heatingSignature(readings.metered);
  if ('refused' in result) return { problems: [refusal(result, readings)] };
  const { signature } = result;
  const heatLoss = heatLossOfSignature(signature, readings.energy.efficiency);
  const { house } = scenario.scenario;
  const { file } = readings;
  const doubts = fitDoubts({ signature, heatLoss: heatLoss.value, floorArea: house.floorArea, file });
  const believed = isBelieved(doubts);
  const lines = believed ? scenarioLines(heatLoss.value) : [];
  const enteredHeatLoss = heatLossOf(house).total;
  return {
    answer: { scenario, readings, signature, heatLoss, enteredHeatLoss, believed, doubts, lines },
    problems: [],
  };
}

function scenarioLines(heatLoss: number): string[] {
  const value = Number(heatLoss.toPrecision(DIGITS));
  return ['house:', `  heatLoss: { given: coefficient, value: ${value} }`];
}

function refusal(result: Exclude<SignatureResult, { signature: unknown }>, { file, metered }: LoadedReadings): Problem {
  const base = { severity: 'error', file } as const;
  switch (result.refused) {
    case 'fewPeriods': {
      const found = metered.length === 1 ? '1 period' : `${metered.length} periods`;
      return { ...base, code: 'readings.too-few-periods', found, allowed: String(LEAST_PERIODS) };
    }
    case 'noColdDays':
      return { ...base, code: 'readings.no-cold-days', allowed: `${HIGHEST_BASE} °C` };
    case 'alike':
      return { ...base, code: 'readings.alike' };
    case 'noSlope': {
      const found = String(Number(result.slope.toPrecision(2))).replace('-', '−');
      return { ...base, code: 'readings.no-slope', found, unit: 'kWh' };
    }
  }
}
