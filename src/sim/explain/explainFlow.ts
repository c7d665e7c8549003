import { returnTemperature } from '../flowTemperature.ts';
import { AT } from '../hourScratch.ts';
import { setFlow } from '../spaceHeat.ts';
import type { Figures } from './figures.ts';
import { asksSpaceHeat, type HourAgain } from './hourAgain.ts';
import { type ExplainedStage, explainedStage, idleStage } from './stage.ts';

/** Flow and return temperature of the hour (MODEL section 5). */
export function flowStage(again: HourAgain): ExplainedStage {
  if (!asksSpaceHeat(again)) return idleStage('flow', 'noHeatAsked');
  const { plan, c, i, waiting, hour } = again;
  const { flow, house } = plan;
  setFlow(plan, c, i, waiting, hour);
  const load = hour[AT.load];
  const found = c.flowTemperature[i];
  const byEmitters = flow.set === null;
  const harder = load !== c.spaceHeatNeed[i] / house.designLoad;
  return explainedStage('flow', {
    figures: {
      spaceHeatNeed: c.spaceHeatNeed[i],
      designLoad: house.designLoad,
      ...(harder ? { waitingBefore: waiting, hotWaterShare: c.hotWaterShare[i] } : {}),
      load,
      ...(byEmitters ? emitterFigures(again) : {}),
      spread: flow.spread,
      flowTemperature: found,
      returnTemperature: returnTemperature(flow, found, load),
    },
    findings: [
      harder && 'emittersHarder',
      byEmitters && found === flow.lowest && 'heldAtLowestFlow',
      byEmitters && found === flow.highest && 'heldAtHighestFlow',
    ],
    formulas: [harder ? 'harderLoad' : 'load', byEmitters ? 'emitterFlow' : 'flowSet', 'returnTemperature'],
  });
}

function emitterFigures({ plan: { flow } }: HourAgain): Figures {
  return {
    roomTemperature: flow.roomTemperature,
    overTemperature: flow.overTemperature,
    inverseExponent: flow.inverseExponent.exponent,
    lowestEmitterFlow: flow.lowest,
    highestEmitterFlow: flow.highest,
  };
}
