import { WATER_HEAT_CAPACITY } from '../core/constants.ts';
import { powerOf } from '../core/power.ts';
import { UNMET } from './backup.ts';
import { CONDENSING_OFFSET, LEAST_LIFT, LIFT_OFFSET } from './carnot.ts';
import { MARK, type YearColumns } from './columns.ts';
import { LEAST_RETURN_LOAD } from './flowTemperature.ts';
import { LOW_FLOW_GAIN, LOW_FLOW_REACH, readMap } from './heatPumpMap.ts';
import { ON_THE_EDGE } from './mapMarks.ts';
import { CYCLE_SWING, MOST_STARTS } from './partLoad.ts';
import { ROUNDING, WAITING_HOURS } from './spaceHeat.ts';
import type { YearPlan } from './yearPlan.ts';

/**
 * The hours `from` … `to` − 1 of the rooms in one loop: sections 4 (house with mass), 5, 6, 7, 9 and 10 `parallel` and
 * `alternative` of MODEL, the same operations in the same order as the stages in `spaceHeat.ts`, `levels.ts`,
 * `partLoad.ts`, `backup.ts` and `roomWithMass.ts`, so that every column comes out the same to the last bit (tests hold
 * that). The stages stay as the text to read, and run the hours of the mode `cheapest`; this loop is some three times as
 * fast because every column and constant is at hand before it begins.
 *
 * @param plan a plan without source prices
 * @param c the year; need (degree hours) and hot water are there already
 * @param from first hour
 * @param to last hour, excluded
 * @param massTemperature mass of a lumped house at the first hour's beginning, °C; 0 with degree hours
 * @returns mass at the end of the last hour, °C
 */
export function runRooms(plan: YearPlan, c: YearColumns, from: number, to: number, massTemperature: number): number {
  // what the hours read
  const { house, flow: setting, unitOnWeather, resting, quietShare, backup } = plan;
  const { temperature: outdoorOf, trailingMeanTemperature } = plan.weather;
  const { capacityLoss, copLoss, lossFollowsLevel, highestFlow, full, lowest, unit } = unitOnWeather;
  const { mass } = house;
  const airAtRestOf = plan.massOnWeather === null ? c.indoorTemperature : plan.massOnWeather.airAtRest;
  const massAtRestOf = plan.massOnWeather === null ? c.indoorTemperature : plan.massOnWeather.massAtRest;
  const airFromMass = mass === null ? 0 : mass.airFromMass;
  const airPerHeat = mass === null ? 1 : mass.airPerHeat;
  const keep = mass === null ? 0 : mass.keep;
  const massFromAirHeat = mass === null ? 0 : mass.massFromAirHeat;
  const isLumped = mass !== null;
  const { setPoint, designLoad, heatingLimit } = house;
  const mostWaiting = designLoad * WAITING_HOURS;
  const { set, inverseExponent, roomTemperature, overTemperature, spread, lowest: lowestFlow, highest } = setting;
  const axis = full.flow;
  const lastCell = axis.length - 2;
  const { values, perCell, kappaOutdoor, direct } = full;
  const firstColumn = axis[0];
  const lastColumn = full.map.flow[full.map.flow.length - 1];
  const firstRow = full.map.outdoor[0];
  const lastRow = full.map.outdoor[full.map.outdoor.length - 1];
  const ownTable = lowest === null ? full : lowest;
  const hasOwnTable = lowest !== null;
  const lowAxis = ownTable.flow;
  const lastLowCell = lowAxis.length - 2;
  const firstLowColumn = lowAxis[0];
  const { values: lowValues, perCell: perLowCell, kappaOutdoor: lowKappaOutdoor, direct: lowDirect } = ownTable;
  const capacityShare = unit.lowest.given === 'share' ? unit.lowest.capacity : 1;
  const copShare = unit.lowest.given === 'share' ? unit.lowest.cop : 1;
  const degradation = unit.cycling.method === 'degradation' ? unit.cycling.coefficient : 0;
  const offPower = unit.cycling.method === 'offPower' ? unit.cycling.power : 0;
  const inUse = 1 - plan.inUseAllowance;
  const perStart = plan.cycleWater * WATER_HEAT_CAPACITY * CYCLE_SWING;
  const { power: backupPower, isBoiler } = backup;
  const lastHour = c.hours - 1;
  // what they write
  const { spaceHeatNeed, flowTemperature, capacity, heatPumpSpaceHeat, heatPumpSpaceElectricity } = c;
  const { backupSpaceHeat, backupWaterHeat, unmetHeat, waitingHeat, starts, hotWaterShare, marks } = c;
  const { massTemperature: massOf, indoorTemperature } = c;
  const point = new Float64Array(4);
  let waiting = 0;
  let atMass = massTemperature;

  for (let i = from; i < to; i++) {
    // section 4, house with mass: heat that brings the air to the set point at once
    let need = spaceHeatNeed[i];
    let atRest = 0;
    if (isLumped) {
      massOf[i] = atMass;
      atRest = airFromMass * atMass + airAtRestOf[i];
      need = trailingMeanTemperature[i] >= heatingLimit ? 0 : Math.max(0, (setPoint[i] - atRest) / airPerHeat);
      spaceHeatNeed[i] = need;
    }
    if (need === 0 && waiting === 0) {
      flowTemperature[i] = 0;
      capacity[i] = 0;
      heatPumpSpaceHeat[i] = 0;
      heatPumpSpaceElectricity[i] = 0;
      backupSpaceHeat[i] = 0;
      unmetHeat[i] = 0;
      waitingHeat[i] = 0;
      starts[i] = 0;
      if (isLumped) {
        indoorTemperature[i] = atRest;
        atMass = keep * atMass + massAtRestOf[i];
      }
      continue;
    }
    let mark = need > 0 ? marks[i] | MARK.heating : marks[i];

    // section 5: flow temperature
    const taken = hotWaterShare[i];
    const free = 1 - taken;
    const quiet = quietShare === null ? 1 : quietShare[i];
    let load = need / designLoad;
    let flow: number;
    if (set === null) {
      if ((taken > 0 || (waiting > 0 && quiet >= 1)) && taken < 1) {
        load = Math.min(Math.max(1, load), (need + waiting) / (free * designLoad));
      }
      flow = roomTemperature + overTemperature * powerOf(inverseExponent, load) + (load * spread) / 2;
      flow = Math.min(Math.max(flow, lowestFlow), highest);
    } else {
      flow = set[i];
    }
    flowTemperature[i] = flow;

    // sections 6 and 7: both levels at the flow that the unit can reach, after frost loss
    const limit = highestFlow[i];
    const reached = Math.min(flow, limit);
    const outdoor = outdoorOf[i];
    const rests = resting[i] === 1;
    let fullCapacity = 0;
    let fullCop = 1;
    let leastCapacity = 0;
    let leastCop = 1;
    if (!rests) {
      if (direct[i] === 1) {
        readMap(full.map, outdoor, reached, point, 0);
        fullCapacity = point[0];
        fullCop = point[1];
      } else {
        let cell = 0;
        while (cell < lastCell && reached >= axis[cell + 1]) cell++;
        const v = Math.min(Math.max((reached - axis[cell]) * perCell[cell], 0), 1);
        const a = (i * axis.length + cell) * 2;
        const kappaFlow = Math.max(reached, firstColumn);
        const kappa = (kappaFlow + CONDENSING_OFFSET) / Math.max(kappaFlow - kappaOutdoor[i] + LIFT_OFFSET, LEAST_LIFT);
        const gain = 1 + LOW_FLOW_GAIN * Math.min(kappaFlow - reached, LOW_FLOW_REACH);
        fullCapacity = (1 - v) * values[a] + v * values[a + 2];
        fullCop = ((1 - v) * values[a + 1] + v * values[a + 3]) * kappa * gain;
      }
      if (!hasOwnTable) {
        leastCapacity = capacityShare * fullCapacity;
        leastCop = copShare * fullCop;
      } else if (lowDirect[i] === 1) {
        readMap(ownTable.map, outdoor, reached, point, 2);
        leastCapacity = point[2];
        leastCop = point[3];
      } else {
        let cell = 0;
        while (cell < lastLowCell && reached >= lowAxis[cell + 1]) cell++;
        const v = Math.min(Math.max((reached - lowAxis[cell]) * perLowCell[cell], 0), 1);
        const a = (i * lowAxis.length + cell) * 2;
        const kappaFlow = Math.max(reached, firstLowColumn);
        const kappa =
          (kappaFlow + CONDENSING_OFFSET) / Math.max(kappaFlow - lowKappaOutdoor[i] + LIFT_OFFSET, LEAST_LIFT);
        const gain = 1 + LOW_FLOW_GAIN * Math.min(kappaFlow - reached, LOW_FLOW_REACH);
        leastCapacity = (1 - v) * lowValues[a] + v * lowValues[a + 2];
        leastCop = ((1 - v) * lowValues[a + 1] + v * lowValues[a + 3]) * kappa * gain;
      }
      const level = lossFollowsLevel ? leastCapacity / fullCapacity : 1;
      fullCapacity *= 1 - capacityLoss[i];
      fullCop *= 1 - copLoss[i];
      leastCapacity *= 1 - capacityLoss[i] * level;
      leastCop *= 1 - copLoss[i] * level;
    }
    capacity[i] = fullCapacity;

    // section 9: what the heat pump carries, gives, and leaves waiting
    let carried = need;
    if (flow > limit) {
      const back = flow - Math.min(Math.max(load, LEAST_RETURN_LOAD), 1) * spread;
      carried = need * Math.min(Math.max((limit - back) / (flow - back), 0), 1);
      if (need > 0) mark |= MARK.flowAboveLimit;
    }
    const canGive = (quietShare === null ? fullCapacity : fullCapacity * quiet) * free;
    const asked = carried + waiting;
    const given = Math.min(asked, canGive);
    const displaced = waiting + fullCapacity - canGive;
    let left = Math.min(asked - given, displaced);
    if (!isLumped) left = rests || i === lastHour ? 0 : Math.min(left, mostWaiting);
    waitingHeat[i] = left;
    waiting = isLumped ? 0 : left;
    heatPumpSpaceHeat[i] = given;

    // section 9: electricity and starts at the rate
    let electricity = 0;
    let started = 0;
    if (given > 0) {
      const single = leastCapacity >= fullCapacity;
      const least = Math.min(leastCapacity, fullCapacity);
      const cop = single ? fullCop : leastCop;
      const rate = given / free;
      if (rate >= least) {
        const atRate = single ? cop : cop + ((fullCop - cop) * (rate - least)) / (fullCapacity - least);
        electricity = given / (atRate * inUse);
      } else {
        const on = rate / least;
        electricity = given / (cop * (1 - degradation * (1 - on)) * inUse) + offPower * (1 - on) * free;
        started = Math.min(MOST_STARTS, (least * on * (1 - on) * free) / perStart);
        if (rate < least * (1 - ROUNDING)) mark |= MARK.cycling;
      }
      if (outdoor < firstRow - ON_THE_EDGE || outdoor > lastRow + ON_THE_EDGE || reached > lastColumn + ON_THE_EDGE) {
        mark |= MARK.outsideMap;
      }
      if (reached < firstColumn - ON_THE_EDGE) mark |= MARK.belowLowestFlow;
    }
    heatPumpSpaceElectricity[i] = electricity;
    starts[i] = started;

    // section 10: the backup
    const available = isBoiler ? Math.max(0, backupPower - backupWaterHeat[i]) : backupPower;
    const lacking = need - carried + (asked - given - left);
    const helped = Math.min(available, Math.max(0, lacking));
    backupSpaceHeat[i] = helped;
    unmetHeat[i] = Math.max(0, lacking - helped);
    if (helped > 0) mark |= MARK.backupForSpace;
    if (lacking - helped > UNMET) mark |= MARK.unmet;
    marks[i] = mark;

    // section 4, house with mass: the state advances with the heat delivered
    if (isLumped) {
      const heat = given + helped;
      indoorTemperature[i] = atRest + airPerHeat * heat;
      atMass = keep * atMass + massAtRestOf[i] + massFromAirHeat * heat;
    }
  }
  return atMass;
}
