import { boilerIsCheaper } from '../backup.ts';
import { returnTemperature } from '../flowTemperature.ts';
import { AT } from '../hourScratch.ts';
import { copAtRate, leastCapacity } from '../partLoad.ts';
import { displacedHeat, giveSpaceHeat, shareThroughLimit, WAITING_HOURS } from '../spaceHeat.ts';
import type { Figures } from './figures.ts';
import { asksSpaceHeat, type HourAgain } from './hourAgain.ts';
import { type ExplainedStage, explainedStage, type FormulaName, idleStage, type StageName } from './stage.ts';

/** Space heat of the heat pump, at which rate and with which electricity (MODEL section 9). */
export function runningStages(again: HourAgain): ExplainedStage[] {
  if (!asksSpaceHeat(again)) return [idleStage('running', 'noHeatAsked'), idleStage('rate', 'noHeatAsked')];
  const { plan, c, i, waiting, hour } = again;
  giveSpaceHeat(plan, c, i, waiting, hour);
  return [runningStage(again), rateStage(again, 'rate')];
}

/** Whether a cheaper boiler takes over what the heat pump could give; asked before the backup has run. */
export function isOnlyOffer({ plan, c, i }: HourAgain): boolean {
  return plan.sourcePrices !== null && boilerIsCheaper(plan.backup, plan.sourcePrices, c, i);
}

function runningStage(again: HourAgain): ExplainedStage {
  const { plan, c, i, waiting, hour } = again;
  const { house } = plan;
  const given = c.heatPumpSpaceHeat[i];
  const offer = isOnlyOffer(again);
  const overLimit = c.flowTemperature[i] > plan.unitOnWeather.highestFlow[i];
  const rests = plan.resting[i] === 1;
  const displaced = displacedHeat(waiting, hour[AT.capacity], hour[AT.canGive]);
  const mostWaiting = house.mass === null ? { mostWaiting: house.designLoad * WAITING_HOURS } : {};
  return explainedStage('running', {
    figures: {
      spaceHeatNeed: c.spaceHeatNeed[i],
      ...limitFigures(again),
      heatPumpPart: partOfHeatPump(again),
      topUp: hour[AT.topUp],
      waitingBefore: waiting,
      askedOfHeatPump: hour[AT.asked],
      capacity: hour[AT.capacity],
      ...(plan.quietShare === null ? {} : { quietShare: plan.quietShare[i] }),
      hotWaterShare: c.hotWaterShare[i],
      couldGive: hour[AT.canGive],
      ...(offer ? { offeredHeat: given } : { heatPumpSpaceHeat: given }),
      displacedHeat: displaced,
      ...mostWaiting,
      ...(offer ? {} : { waitingHeat: c.waitingHeat[i] }),
    },
    findings: [
      plan.unitOnWeather.tooCold[i] === 1 && 'tooCold',
      rests && plan.unitOnWeather.tooCold[i] === 0 && 'restsByBackup',
      overLimit && 'flowAboveLimit',
      plan.quietShare !== null && plan.quietShare[i] < 1 && 'quietHour',
      house.mass === null && i === c.hours - 1 && 'lastHour',
    ],
    formulas: [
      overLimit && 'shareThroughLimit',
      'givenByHeatPump',
      !offer && (house.mass === null ? 'waiting' : 'waitingInRoom'),
    ],
  });
}

/** L: the need, or the share of it that the unit's highest flow carries. */
function partOfHeatPump(again: HourAgain): number {
  const need = again.c.spaceHeatNeed[again.i];
  return need * (limitFigures(again).shareThroughLimit ?? 1);
}

function limitFigures({ plan, c, i, hour }: HourAgain): Figures {
  const highest = plan.unitOnWeather.highestFlow[i];
  const flow = c.flowTemperature[i];
  if (flow <= highest) return {};
  const back = returnTemperature(plan.flow, flow, hour[AT.load]);
  return {
    highestFlow: highest,
    flowTemperature: flow,
    returnTemperature: back,
    shareThroughLimit: shareThroughLimit(highest, flow, back),
  };
}

/**
 * Rate, COP, electricity and starts of the heat that the heat pump gives.
 *
 * @param stage `rate`, or `rateLeft` for what a cheaper boiler has left
 */
export function rateStage(again: HourAgain, stage: StageName): ExplainedStage {
  const { plan, c, i, hour } = again;
  const given = c.heatPumpSpaceHeat[i];
  if (given <= 0) return idleStage(stage, 'heatPumpGivesNothing');
  const { cycling } = plan.unitOnWeather.unit;
  const offer = stage === 'rate' && isOnlyOffer(again);
  const rate = given / (1 - c.hotWaterShare[i]);
  const least = leastCapacity(hour);
  const cycles = rate < least;
  const loss =
    cycling.method === 'degradation' ? { degradationCoefficient: cycling.coefficient } : { offPower: cycling.power };
  const electricity = c.heatPumpSpaceElectricity[i];
  return explainedStage(stage, {
    figures: {
      ...(offer ? { offeredHeat: given } : { heatPumpSpaceHeat: given }),
      hotWaterShare: c.hotWaterShare[i],
      runningRate: rate,
      leastRate: least,
      ...(cycles ? { cyclingRatio: rate / least, ...loss } : {}),
      copAtRate: copAtRate(cycling, rate, hour),
      inUseAllowance: plan.inUseAllowance,
      ...(offer ? { offeredElectricity: electricity } : { heatPumpSpaceElectricity: electricity }),
      ...(cycles ? { cycleWater: plan.cycleWater } : {}),
      ...(offer ? {} : { starts: c.starts[i] }),
    },
    findings: [cycles && 'cycling'],
    formulas: [copFormula(again, cycles), electricityFormula(again, cycles), cycles && !offer && 'starts'],
  });
}

function copFormula({ plan, hour }: HourAgain, cycles: boolean): FormulaName {
  if (cycles) return plan.unitOnWeather.unit.cycling.method === 'degradation' ? 'copCycling' : 'copOffPower';
  return hour[AT.lowestCapacity] >= hour[AT.capacity] ? 'copSingleSpeed' : 'copBetween';
}

function electricityFormula({ plan }: HourAgain, cycles: boolean): FormulaName {
  const offPower = cycles && plan.unitOnWeather.unit.cycling.method === 'offPower';
  return offPower ? 'electricityWithOffPower' : 'electricityOfRate';
}
