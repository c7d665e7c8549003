/**
 * Hours of the whole chain, each worked by hand from MODEL with a calculator: the arithmetic stands above each test and
 * the figures in it are the calculator's, of twelve digits, so that 1e-9 of a figure is the tolerance everywhere.
 *
 * The invented map of round figures (kW and COP; κ = (F + 276.15)/max(F − T + 10, 15), η = COP/κ):
 *
 *   T      F     kW   COP   κ                            η
 *   −10    35    6    2.8   311.15/55 = 5.65727272727    0.494938132733
 *   −10    55    5    2.0   331.15/75 = 4.41533333333    0.452966933414
 *   10     35    10   5.0   311.15/35 = 8.89             0.562429696288
 *   10     55    9    3.2   331.15/55 = 6.02090909091    0.531481201872
 */
import { expect, test } from 'vitest';
import { MARK } from '../../src/sim/columns.ts';
import { simulateYear } from '../../src/sim/year.ts';
import { expectNear as holdNear, planOf } from '../unit/sim/planBuilder.ts';
import { accuracySection } from './accuracyRecord.ts';

const accuracy = accuracySection(import.meta.url, 'Hours of the whole chain');
const figures = accuracy.comparison({
  what: 'need, flow, map, frost, part load, backup in single hours',
  source: 'worked by hand from the model, twelve digits',
  unit: '%',
  allowed: 1e-7,
  why: 'figures of eleven digits or more',
});

/** Holds a figure to a worked one, and records how far off it is. */
function expectNear(actual: number | undefined, worked: number): void {
  holdNear(actual, worked);
  figures.add((100 * ((actual ?? Number.NaN) - worked)) / Math.max(Math.abs(worked), 1e-3));
}

/** Any hour far from the ends of the year: the weather of these plans is the same in every hour. */
const HOUR = 4000;

/*
 * Need: base = 20 − (0.4 + 2·100/1000)/0.2 = 17 °C; Q = 0.2·(17 − 2) = 3 kW.
 * Flow: x = 3/6.4 = 0.46875; x^(1/1.3) = 0.558313215963; ΔT_m = (55 + 47)/2 − 20 = 31 K, s = 8 K;
 *   T_f = 20 + 31·0.558313215963 + 0.46875·8/2 = 39.1827096948 °C.
 * Map: u = (2 + 10)/20 = 0.6; v = (39.1827096948 − 35)/20 = 0.209135484742;
 *   C = 0.4·(6 − v) + 0.6·(10 − v) = 8.4 − v = 8.19086451526 kW;
 *   η at −10: 0.494938132733 − v·0.041971199319 = 0.486160465619; at 10: 0.562429696288 − v·0.030948494416 =
 *   0.555957267906; η = 0.4·0.486160465619 + 0.6·0.555957267906 = 0.528038546991;
 *   κ = (39.1827096948 + 276.15)/(39.1827096948 − 2 + 10) = 315.332709695/47.1827096948 = 6.68322594727;
 *   COP = 3.52900091841.
 * Part load: C_min = 0.3·C = 2.45725935458 kW at COP 1.1·3.52900091841 = 3.88190101025; r = 3 kW lies between:
 *   COP(3) = 3.88190101025 − 0.35290009184·(3 − 2.45725935458)/(8.19086451526 − 2.45725935458) = 3.84849563645;
 *   E = 3/3.84849563645 = 0.779525373912 kWh.
 */
test('a need with gains and sun, radiators, between the points of the map, between lowest level and full load', () => {
  const columns = simulateYear(
    planOf({
      temperature: 2,
      radiation: 100,
      house: { internalGains: 0.4, solarAperture: 2 },
      flow: { flow: 55, return: 47, roomTemperature: 20, exponent: 1.3, lowestFlow: 25, highestFlow: 55 },
      unit: { lowest: { given: 'share', capacity: 0.3, cop: 1.1 } },
    }),
  );
  expectNear(columns.spaceHeatNeed[HOUR], 3);
  expectNear(columns.flowTemperature[HOUR], 39.1827096948);
  expectNear(columns.capacity[HOUR], 8.19086451526);
  expectNear(columns.heatPumpSpaceHeat[HOUR], 3);
  expectNear(columns.electricity[HOUR], 0.779525373912);
  expect(columns.backupSpaceHeat[HOUR]).toBe(0);
});

/*
 * Frost at the reference itself, 2 °C and 84 % at sea level: φ = 1. Flow 45 °C, Q = 0.2·18 = 3.6 kW.
 * Frost-free: u = 0.6, v = 0.5: C = 0.4·5.5 + 0.6·9.5 = 7.9 kW; η = 0.4·0.4739525330735 + 0.6·0.54695544908 =
 *   0.517754282678; κ = 321.15/53 = 6.05943396226; COP = 3.13729788456.
 * Full load: C = 7.9·0.90 = 7.11 kW; COP = 3.13729788456·0.88 = 2.76082213842.
 * Lowest level, m = 0.3, its loss the 0.3th part: C_min = 2.37·(1 − 0.03) = 2.2989 kW;
 *   COP_min = 3.13729788456·(1 − 0.036) = 3.02435516072.
 * Part load: COP(3.6) = 3.02435516072 − 0.2635330223·(3.6 − 2.2989)/(7.11 − 2.2989) = 2.95308605068;
 *   E = 3.6/2.95308605068 = 1.21906369751 kWh.
 */
test('frost at 2 °C and 84 % takes 10 % of the capacity and 12 % of the COP, at the lowest level its share', () => {
  const columns = simulateYear(
    planOf({
      temperature: 2,
      relativeHumidity: 84,
      flow: 45,
      unit: { defrost: { method: 'humidity', capacityLoss: 0.1, copLoss: 0.12 } },
    }),
  );
  expectNear(columns.capacity[HOUR], 7.11);
  expectNear(columns.electricity[HOUR], 1.21906369751);
});

/*
 * At the point of the map 10 °C, 35 °C: C = 10 kW, COP 5, C_min = 3 kW. Q = 0.12·10 = 1.2 kW, CR = 1.2/3 = 0.4.
 * COP = 5·(1 − 0.25·0.6) = 4.25; with an in-use allowance of 10 % 3.825; E = 1.2/3.825 = 0.313725490196 kWh.
 * Starts: 3·0.4·0.6·1/(100·1.163e-3·5) = 0.72/0.5815 = 1.23817712812.
 */
test('below the lowest level the compressor cycles, with loss of COP and a count of starts', () => {
  const columns = simulateYear(planOf({ temperature: 10, house: { heatLoss: 0.12 }, run: { inUseAllowance: 0.1 } }));
  expectNear(columns.electricity[HOUR], 0.313725490196);
  expectNear(columns.starts[HOUR], 1.23817712812);
  expect(columns.marks[HOUR]).toBe(MARK.cycling | MARK.heating);
});

/*
 * The same hour with 30 W in the pauses instead: E = 1.2/5 + 0.03·(1 − 0.4) = 0.24 + 0.018 = 0.258 kWh.
 */
test('below the lowest level the pauses draw the off-power entered', () => {
  const columns = simulateYear(
    planOf({
      temperature: 10,
      house: { heatLoss: 0.12 },
      unit: { cycling: { method: 'offPower', power: 0.03 } },
    }),
  );
  expectNear(columns.electricity[HOUR], 0.258);
});

/*
 * −20 °C at 55 °C flow, 10 K below the coldest row. Slope of the two coldest rows (9 − 5)/20 = 0.2 kW/K, more than
 * 0.01·5: C = 5 − 10·0.2 = 3 kW, above the floor 0.3·5. COP = 0.452966933414·331.15/85 = 2·75/85 = 1.76470588235.
 * Q = 0.25·40 = 10 kW: the heat pump gives 3 kW for 3·85/150 = 1.7 kWh, the backup its 5 kW, 2 kWh are unmet.
 */
test('colder than the coldest row the capacity falls on, and what the backup cannot give is unmet', () => {
  const columns = simulateYear(
    planOf({ temperature: -20, flow: 55, house: { heatLoss: 0.25, designLoad: 8 }, backup: { power: 5 } }),
  );
  expectNear(columns.capacity[HOUR], 3);
  expectNear(columns.heatPumpSpaceElectricity[HOUR], 1.7);
  expectNear(columns.backupSpaceHeat[HOUR], 5);
  expectNear(columns.unmetHeat[HOUR], 2);
  expectNear(columns.electricity[HOUR], 6.7);
  expect(columns.marks[HOUR]).toBe(MARK.outsideMap | MARK.backupForSpace | MARK.unmet | MARK.heating);
});

/*
 * Unit limited to 55 °C. Emitters 65/45 in a room of 20 °C, n = 1.3: ΔT_m = 35 K, s = 20 K. −10 °C: Q = 0.25·30 = 7.5 kW
 * of Q_d = 8 kW, x = 0.9375; x^(1/1.3) = 0.951567155421; T_f = 20 + 35·0.951567155421 + 9.375 = 62.6798504397 °C;
 * T_r = T_f − 0.9375·20 = 43.9298504397 °C; share (55 − 43.9298504397)/18.75 = 0.590407976548;
 * L = 7.5·0.590407976548 = 4.42805982411 kWh at the point −10/55: C = 5 kW, COP 2; E = 2.21402991206 kWh;
 * the backup tops up 7.5 − L = 3.07194017589 kWh.
 */
test('a flow above the limit of the unit is topped up in series by the backup', () => {
  const columns = simulateYear(
    planOf({
      temperature: -10,
      house: { heatLoss: 0.25, designLoad: 8 },
      flow: { flow: 65, return: 45, roomTemperature: 20, exponent: 1.3, lowestFlow: 25, highestFlow: 65 },
    }),
  );
  expectNear(columns.flowTemperature[HOUR], 62.6798504397);
  expectNear(columns.heatPumpSpaceHeat[HOUR], 4.42805982411);
  expectNear(columns.heatPumpSpaceElectricity[HOUR], 2.21402991206);
  expectNear(columns.backupSpaceHeat[HOUR], 3.07194017589);
  expect(columns.marks[HOUR]).toBe(MARK.flowAboveLimit | MARK.backupForSpace | MARK.heating);
});

/*
 * A fixed flow of 60 °C has s = 5 K: −10 °C, x = 7.5/8 = 0.9375, T_r = 60 − 4.6875 = 55.3125 °C, warmer than the limit
 * of 55 °C: share 0, the backup carries all 7.5 kWh.
 */
test('where even the return is hotter than the limit the heat pump gives nothing', () => {
  const columns = simulateYear(planOf({ temperature: -10, flow: 60, house: { heatLoss: 0.25, designLoad: 8 } }));
  expect(columns.heatPumpSpaceHeat[HOUR]).toBe(0);
  expect(columns.heatPumpSpaceElectricity[HOUR]).toBe(0);
  expectNear(columns.backupSpaceHeat[HOUR], 7.5);
});

/*
 * 16 °C, 6 K above the warmest row; flow 30 °C, 5 K below the lowest column. κ sees 15 °C and 35 °C: 311.15/30; COP at
 * F1 = 5·35/30 = 5.83333333333; with 2 % a kelvin 5.83333333333·1.1 = 6.41666666667. Capacity held at 10 kW,
 * C_min = 3 kW. Q = 0.2·4 = 0.8 kW, CR = 0.266666666667, COP = 6.41666666667·(1 − 0.25·0.733333333333) =
 * 5.24027777778; E = 0.8/5.24027777778 = 0.152663662868 kWh.
 */
test('warmer than the warmest row and below the lowest flow column', () => {
  const columns = simulateYear(planOf({ temperature: 16, flow: 30 }));
  expectNear(columns.capacity[HOUR], 10);
  expectNear(columns.electricity[HOUR], 0.152663662868);
  expect(columns.marks[HOUR]).toBe(MARK.outsideMap | MARK.belowLowestFlow | MARK.cycling | MARK.heating);
});

/*
 * Frost by table: 0.8 of the capacity and 0.75 of the COP at 2 °C, halfway between 1 at 10 °C and (0.6, 0.5) at −6 °C,
 * the same at both levels. Flow 35 °C, u = 0.6: frost-free C = 0.4·6 + 0.6·10 = 8.4 kW,
 * η = 0.4·0.494938132733 + 0.6·0.562429696288 = 0.535433070866, κ = 311.15/43 = 7.23604651163, COP = 3.87441860466.
 * C = 6.72 kW, C_min = 2.016 kW, COP 3.87441860466·0.75 = 2.9058139535 at both; Q = 3.6 kW: E = 1.23889555822 kWh.
 */
test('frost by table takes the same share at both levels', () => {
  const columns = simulateYear(
    planOf({
      temperature: 2,
      unit: {
        defrost: {
          method: 'table',
          capacity: { at: [-6, 10], value: [0.6, 1] },
          cop: { at: [-6, 10], value: [0.5, 1] },
        },
      },
    }),
  );
  expectNear(columns.capacity[HOUR], 6.72);
  expectNear(columns.electricity[HOUR], 1.23889555822);
});
