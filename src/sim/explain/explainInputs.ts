import { countAuxiliaries } from '../auxiliaries.ts';
import type { HourAgain } from './hourAgain.ts';
import { type ExplainedStage, explainedStage } from './stage.ts';

/** Pump, standby and crankcase heater, and the hour's sums of electricity and fuel (MODEL section 11). */
export function inputStages(again: HourAgain): ExplainedStage[] {
  const { plan, c } = again;
  countAuxiliaries(plan, c);
  return [auxiliaryStage(again), sumStage(again)];
}

function auxiliaryStage({ plan, c, i }: HourAgain): ExplainedStage {
  const { standbyPower, crankcasePower, crankcaseBelow } = plan.unitOnWeather.unit;
  const runs = c.heatPumpSpaceHeat[i] > 0 || c.hotWaterShare[i] > 0;
  return explainedStage('auxiliaries', {
    figures: {
      circulationPower: plan.circulationPower,
      circulationElectricity: c.circulationElectricity[i],
      standbyPower,
      standbyElectricity: c.standbyElectricity[i],
      crankcasePower,
      ...(Number.isFinite(crankcaseBelow) ? { crankcaseBelow } : {}),
      crankcaseElectricity: c.crankcaseElectricity[i],
    },
    findings: [runs ? 'compressorRuns' : 'compressorIdle', c.spaceHeatNeed[i] === 0 && 'roomNeedsNothing'],
    formulas: ['auxiliaries'],
  });
}

function sumStage({ plan, c, i }: HourAgain): ExplainedStage {
  const { backup } = plan;
  const water = { heatPumpWaterElectricity: c.heatPumpWaterElectricity[i] };
  const backupHeat = {
    backupSpaceHeat: c.backupSpaceHeat[i],
    ...(plan.hotWater === null ? {} : { backupWaterHeat: c.backupWaterHeat[i] }),
  };
  const uses = {
    heatPumpSpaceElectricity: c.heatPumpSpaceElectricity[i],
    ...(plan.hotWater === null ? {} : water),
    circulationElectricity: c.circulationElectricity[i],
    standbyElectricity: c.standbyElectricity[i],
    crankcaseElectricity: c.crankcaseElectricity[i],
  };
  const electricity = { electricity: c.electricity[i] };
  const fuel = {
    ...backupHeat,
    backupEfficiency: backup.efficiency,
    ...(plan.hotWater === null ? {} : { backupWaterEfficiency: backup.hotWaterEfficiency }),
    fuel: c.fuel[i],
  };
  return explainedStage('sums', {
    figures: backup.isBoiler ? { ...uses, ...electricity, ...fuel } : { ...uses, ...backupHeat, ...electricity },
    formulas: ['electricity', backup.isBoiler && 'fuel'],
  });
}
