import {
  cylinderCapacity,
  drawAndLose,
  fullCylinder,
  heatHotWater,
  reheatBelow,
  reheatWhereDue,
  storedHeat,
  waterHeaterPower,
} from '../hotWater.ts';
import type { HotWaterPlan } from '../hotWaterPlan.ts';
import { CYLINDER } from '../hourScratch.ts';
import { frostFigures } from './explainLevels.ts';
import { mapStage } from './explainMap.ts';
import type { Figures } from './figures.ts';
import type { HourAgain } from './hourAgain.ts';
import { type ExplainedStage, explainedStage, type Finding, idleStage } from './stage.ts';

/** Draw and loss of the cylinder, then its reheat, with the map where the heat pump does it (MODEL section 8). */
export function hotWaterStages(again: HourAgain): ExplainedStage[] {
  const { plan, c, i } = again;
  const { hotWater } = plan;
  if (hotWater === null) return [idleStage('hotWater', 'noHotWater')];
  const state = fullCylinder(hotWater);
  heatHotWater(plan, hotWater, c, 0, i, state);
  const before = state[CYLINDER.temperature];
  drawAndLose(hotWater, c, i, state);
  const draw = drawStage(again, hotWater, before, state[CYLINDER.temperature]);
  const why = reasonToReheat(hotWater, i, state);
  const drawn = state[CYLINDER.temperature];
  reheatWhereDue(plan, hotWater, c, i, state);
  if (why === 'reheatNotDue' || why === 'reheatNotAllowed') return [draw, unheated(again, why)];
  return [draw, ...waterMap(again, state), reheatStage(again, hotWater, { state, drawn, why })];
}

function drawStage({ c, i }: HourAgain, hotWater: HotWaterPlan, before: number, after: number): ExplainedStage {
  return explainedStage('hotWater', {
    figures: {
      cylinderTemperatureBefore: before,
      coldWaterTemperature: hotWater.coldWater[i],
      cylinderCapacity: cylinderCapacity(hotWater),
      storedHeat: storedHeat(hotWater, i, before),
      hotWaterAsked: hotWater.draw[i],
      hotWaterServed: c.hotWaterServed[i],
      hotWaterShort: c.hotWaterShort[i],
      lossCoefficient: hotWater.lossCoefficient,
      surroundingTemperature: hotWater.surroundingTemperature,
      cylinderLoss: c.cylinderLoss[i],
      cylinderTemperatureAfterDraw: after,
      reheatBelow: reheatBelow(hotWater),
    },
    findings: [c.hotWaterShort[i] > 0 && 'hotWaterShort'],
    formulas: ['draw', 'cylinderLoss'],
  });
}

/** Why the cylinder is reheated in the hour, or why not. */
function reasonToReheat(hotWater: HotWaterPlan, i: number, state: Float64Array): Finding {
  const hygiene = state[CYLINDER.hygienePending] === 1 || hotWater.hygieneAsked[i] === 1;
  const underWay = state[CYLINDER.reheating] === 1;
  const cool = state[CYLINDER.temperature] < reheatBelow(hotWater);
  if (!hygiene && !underWay && !cool) return 'reheatNotDue';
  if (hotWater.allowed[i] === 0) return 'reheatNotAllowed';
  if (hygiene) return 'hygienePending';
  return underWay ? 'reheatUnderWay' : 'cylinderCool';
}

function unheated({ c, i }: HourAgain, why: Finding): ExplainedStage {
  return explainedStage('reheat', {
    figures: { hotWaterShare: c.hotWaterShare[i], cylinderTemperature: c.cylinderTemperature[i] },
    findings: [why],
  });
}

/** The map at the flow that the reheat needs; nothing where the heat pump does not heat the cylinder. */
function waterMap({ plan, c, i }: HourAgain, state: Float64Array): ExplainedStage[] {
  if (c.heatPumpWaterHeat[i] === 0) return [];
  const point = { i, outdoor: plan.weather.temperature[i], flow: state[CYLINDER.flow] };
  const before = {
    highestFlow: plan.unitOnWeather.highestFlow[i],
    reheatTarget: state[CYLINDER.target],
    cylinderReach: state[CYLINDER.reach],
    mapFlow: point.flow,
  };
  return [mapStage('hotWaterMap', plan.unitOnWeather.full, point, before)];
}

interface Reheat {
  readonly state: Float64Array;
  /** Cylinder temperature after draw and loss, °C. */
  readonly drawn: number;
  readonly why: Finding;
}

function reheatStage(again: HourAgain, hotWater: HotWaterPlan, { state, drawn, why }: Reheat): ExplainedStage {
  const { plan, c, i } = again;
  const byHeatPump = c.heatPumpWaterHeat[i] > 0;
  const rests = plan.resting[i] === 1;
  const heater = { waterHeaterPower: waterHeaterPower(plan.backup, hotWater), backupWaterHeat: c.backupWaterHeat[i] };
  return explainedStage('reheat', {
    figures: {
      cylinderTemperatureAfterDraw: drawn,
      reheatTarget: state[CYLINDER.target],
      highestFlow: plan.unitOnWeather.highestFlow[i],
      cylinderReach: state[CYLINDER.reach],
      ...(byHeatPump ? heatPumpFigures(again, state) : {}),
      hotWaterShare: c.hotWaterShare[i],
      ...heater,
      cylinderTemperature: c.cylinderTemperature[i],
    },
    findings: [
      why,
      rests && 'restsForWater',
      !rests && !byHeatPump && 'cylinderAboveReach',
      state[CYLINDER.reheating] === 1 && 'reheatGoesOn',
    ],
    formulas: ['reheatPoint', byHeatPump && 'reheatByHeatPump', 'reheatByHeater'],
  });
}

function heatPumpFigures({ plan, c, i }: HourAgain, state: Float64Array): Figures {
  return {
    mapFlow: state[CYLINDER.flow],
    mapCapacity: state[CYLINDER.mapCapacity],
    mapCop: state[CYLINDER.mapCop],
    ...frostFigures(plan, i),
    inUseAllowance: plan.inUseAllowance,
    hotWaterCapacity: state[CYLINDER.capacity],
    hotWaterCop: state[CYLINDER.cop],
    heatPumpWaterHeat: c.heatPumpWaterHeat[i],
    heatPumpWaterElectricity: c.heatPumpWaterElectricity[i],
  };
}
