import { describe, expect, test } from 'vitest';
import { seasonalFactors } from '../../../src/sim/seasonalFactors.ts';
import type { EnergyTotals } from '../../../src/sim/totals.ts';
import { expectNear } from './planBuilder.ts';

const nothing: EnergyTotals = {
  spaceHeatNeed: 0,
  heatPumpSpaceHeat: 0,
  heatPumpWaterHeat: 0,
  backupSpaceHeat: 0,
  backupWaterHeat: 0,
  unmetHeat: 0,
  hotWaterAsked: 0,
  hotWaterShort: 0,
  cylinderLoss: 0,
  heatPumpSpaceElectricity: 0,
  heatPumpWaterElectricity: 0,
  backupElectricity: 0,
  circulationElectricity: 0,
  standbyElectricity: 0,
  crankcaseElectricity: 0,
  electricity: 0,
  fuel: 0,
};

describe('seasonal factors', () => {
  const year: EnergyTotals = {
    ...nothing,
    heatPumpSpaceHeat: 9000,
    heatPumpWaterHeat: 2000,
    backupSpaceHeat: 300,
    backupWaterHeat: 100,
    heatPumpSpaceElectricity: 2700,
    heatPumpWaterElectricity: 800,
    backupElectricity: 400,
    circulationElectricity: 150,
    standbyElectricity: 60,
    crankcaseElectricity: 40,
  };

  test('widen from the unit over the backup to the pump', () => {
    const { h2, h3, h4 } = seasonalFactors(year);
    expectNear(h2 as number, 11_000 / 3600);
    expectNear(h3 as number, 11_400 / 4000);
    expectNear(h4 as number, 11_400 / 4150);
  });

  test('count a boiler’s fuel as input beside electricity', () => {
    const { h2, h3, h4 } = seasonalFactors({ ...year, backupElectricity: 0, fuel: 460 });
    expectNear(h2 as number, 11_000 / 3600);
    expectNear(h3 as number, 11_400 / 4060);
    expectNear(h4 as number, 11_400 / 4210);
  });

  test('say that there was no heat rather than a number', () => {
    expect(seasonalFactors(nothing)).toEqual({ h2: 'no heat', h3: 'no heat', h4: 'no heat' });
    const idle = { ...nothing, standbyElectricity: 5 };
    expect(seasonalFactors(idle).h2).toBe('no heat');
    const backupAlone = seasonalFactors({ ...idle, backupSpaceHeat: 10, backupElectricity: 10 });
    expect(backupAlone.h2).toBe('no heat');
    expectNear(backupAlone.h3 as number, 10 / 15);
  });

  test('are no number either where nothing was put in', () => {
    expect(seasonalFactors({ ...nothing, heatPumpSpaceHeat: 10 })).toEqual({
      h2: 'no heat',
      h3: 'no heat',
      h4: 'no heat',
    });
  });
});
