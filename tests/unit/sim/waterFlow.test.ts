import { describe, expect, it } from 'vitest';
import { waterFlowTemperatures } from '../../../src/sim/waterFlow.ts';
import { simulateYear } from '../../../src/sim/year.ts';
import { demoReport } from '../report/html/reportsOf.ts';

const { plan, columns } = demoReport().answer;
const flow = waterFlowTemperatures(plan);
const cup = { ...plan, hotWater: { ...plan.hotWater!, volume: 40 } };

describe('the flow into the cylinder', () => {
  it('is known in the hours in which the heat pump heats it, and in no others', () => {
    let small = 0;
    for (const { plan: each, columns: c } of [
      { plan, columns },
      { plan: cup, columns: simulateYear(cup) },
    ]) {
      const found = waterFlowTemperatures(each);
      for (let i = 0; i < c.hours; i++) {
        expect(Number.isFinite(found[i])).toBe(c.heatPumpWaterHeat[i]! > 0);
        if (c.heatPumpWaterHeat[i]! > 0 && c.heatPumpWaterHeat[i]! < 1) small++;
      }
    }
    // hours with less than a kilowatt-hour count like the others
    expect(small).toBeGreaterThan(0);
  });

  it('lies 5 K above the middle of first temperature and end, where the heat pump finishes alone', () => {
    const { volume, setPoint } = plan.hotWater!;
    const kelvin = volume * 1.163e-3;
    let looked = 0;
    for (let i = 1; i < columns.hours; i++) {
      const heat = columns.heatPumpWaterHeat[i]!;
      const end = columns.cylinderTemperature[i]!;
      if (heat === 0 || Math.abs(end - setPoint) > 1e-9 || columns.backupWaterHeat[i]! > 0) continue;
      looked++;
      // the heat that it gave lifted it from where it was
      expect(flow[i]).toBeCloseTo((end - heat / kelvin + end) / 2 + 5, 9);
    }
    expect(looked).toBeGreaterThan(100);
  });

  it('is unknown throughout without hot water', () => {
    const without = waterFlowTemperatures({ ...plan, hotWater: null });
    expect(without.every((value) => Number.isNaN(value))).toBe(true);
  });
});
