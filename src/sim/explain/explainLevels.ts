import { AT } from '../hourScratch.ts';
import { frostShareOfLowest, readFrostFree } from '../levels.ts';
import { findCapacity } from '../spaceHeat.ts';
import type { YearPlan } from '../yearPlan.ts';
import { mapStage } from './explainMap.ts';
import type { Figures } from './figures.ts';
import { asksSpaceHeat, type HourAgain } from './hourAgain.ts';
import { type ExplainedStage, explainedStage, type Finding, idleStage } from './stage.ts';

/** Map, frost loss and both levels of the unit for space heat (MODEL sections 6, 7 and 9). */
export function levelStages(again: HourAgain): ExplainedStage[] {
  const idle = whyIdle(again);
  const { plan, c, i, hour } = again;
  if (asksSpaceHeat(again)) findCapacity(plan, c, i, hour);
  if (idle !== undefined) return [idleStage('map', idle), idleStage('frost', idle), idleStage('levels', idle)];
  const { unitOnWeather: laid } = plan;
  const highestFlow = laid.highestFlow[i];
  const point = { i, outdoor: plan.weather.temperature[i], flow: Math.min(c.flowTemperature[i], highestFlow) };
  const found = { outdoorTemperature: point.outdoor, highestFlow, mapFlow: point.flow };
  const frostFree = new Float64Array(AT.size);
  readFrostFree(laid, i, point.outdoor, point.flow, frostFree);
  return [
    mapStage('map', laid.full, point, found),
    ...(laid.lowest === null ? [] : [mapStage('lowestMap', laid.lowest, point, found)]),
    frostStage(again, frostShareOfLowest(laid, frostFree)),
    levelStage(again, frostFree),
  ];
}

function whyIdle(again: HourAgain): Finding | undefined {
  const { plan, i } = again;
  if (!asksSpaceHeat(again)) return 'noHeatAsked';
  if (plan.unitOnWeather.tooCold[i] === 1) return 'tooCold';
  return plan.resting[i] === 1 ? 'restsByBackup' : undefined;
}

function frostStage({ plan, i }: HourAgain, shareOfLowest: number): ExplainedStage {
  const { method } = plan.unitOnWeather.unit.defrost;
  if (method === 'included') return idleStage('frost', 'frostIncluded');
  const { capacityLoss, copLoss } = plan.unitOnWeather;
  return explainedStage('frost', {
    figures: { ...frostFigures(plan, i), frostShareOfLowest: shareOfLowest },
    findings: [capacityLoss[i] === 0 && copLoss[i] === 0 && 'noFrostLoss'],
    formulas: [method === 'humidity' ? 'frostByHumidity' : 'frostByTable'],
  });
}

/** Shares of capacity and COP that frost takes at full load, and what they follow from. */
export function frostFigures(plan: YearPlan, i: number): Figures {
  const { defrost } = plan.unitOnWeather.unit;
  const losses = { capacityLoss: plan.unitOnWeather.capacityLoss[i], copLoss: plan.unitOnWeather.copLoss[i] };
  if (defrost.method !== 'humidity') return losses;
  return {
    capacityLossRate: defrost.capacityLoss,
    copLossRate: defrost.copLoss,
    frostIndex: plan.weather.frostIndex[i],
    ...losses,
  };
}

function levelStage({ plan, hour }: HourAgain, frostFree: Float64Array): ExplainedStage {
  const { lowest } = plan.unitOnWeather.unit;
  const byShare = lowest.given === 'share';
  return explainedStage('levels', {
    figures: {
      capacity: hour[AT.capacity],
      cop: hour[AT.cop],
      ...(byShare ? { lowestCapacityShare: lowest.capacity, lowestCopShare: lowest.cop } : {}),
      lowestMapCapacity: frostFree[AT.lowestCapacity],
      lowestMapCop: frostFree[AT.lowestCop],
      lowestCapacity: hour[AT.lowestCapacity],
      lowestCop: hour[AT.lowestCop],
    },
    findings: [hour[AT.lowestCapacity] >= hour[AT.capacity] && 'singleSpeed'],
    formulas: [byShare && 'lowestByShare', 'afterFrost'],
  });
}
