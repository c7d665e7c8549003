import type { YearColumns } from './columns.ts';
import type { YearPlan } from './yearPlan.ts';

/**
 * Electricity of pump, standby and crankcase heater, and the hour's totals of electricity and fuel.
 *
 * The pump runs in hours with a space-heat need, else for the share of hot water; standby and crankcase count in hours in
 * which the compressor does nothing. Reference: MODEL section 11.
 */
export function countAuxiliaries(plan: YearPlan, c: YearColumns): void {
  const { circulationPower, backup } = plan;
  const { standbyPower, crankcasePower, crankcaseBelow } = plan.unitOnWeather.unit;
  const { temperature } = plan.weather;
  for (let i = 0; i < c.hours; i++) {
    const idle = c.heatPumpSpaceHeat[i] === 0 && c.hotWaterShare[i] === 0;
    const pump = circulationPower * (c.spaceHeatNeed[i] > 0 ? 1 : c.hotWaterShare[i]);
    const standby = idle ? standbyPower : 0;
    const crankcase = idle && temperature[i] < crankcaseBelow ? crankcasePower : 0;
    const own = c.heatPumpSpaceElectricity[i] + c.heatPumpWaterElectricity[i] + pump + standby + crankcase;
    c.circulationElectricity[i] = pump;
    c.standbyElectricity[i] = standby;
    c.crankcaseElectricity[i] = crankcase;
    if (backup.isBoiler) {
      c.electricity[i] = own;
      c.fuel[i] = c.backupSpaceHeat[i] / backup.efficiency + c.backupWaterHeat[i] / backup.hotWaterEfficiency;
    } else {
      c.electricity[i] = own + c.backupSpaceHeat[i] + c.backupWaterHeat[i];
      c.fuel[i] = 0;
    }
  }
}
