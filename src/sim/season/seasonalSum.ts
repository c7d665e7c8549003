import { standardSeasons } from '../../weather/seasonBins.ts';
import { partLoadRatio, type SeasonCase } from './seasonCase.ts';

/** What a unit does in one bin: the heat it can give at most, and its COP at the part load. */
export interface BinPerformance {
  /** kW; 0 below its operating limit. */
  readonly capacity: number;
  readonly cop: number;
}

/** One bin of a season, worked. */
export interface SeasonBinResult {
  readonly outdoor: number;
  readonly hours: number;
  /** Part load P_h, kW. */
  readonly load: number;
  readonly capacity: number;
  readonly cop: number;
  /** Supplementary electric heat, kW. */
  readonly supplementary: number;
  /** Electricity of the bin, kWh. */
  readonly electricity: number;
}

/** Result of a season. */
export interface SeasonResult {
  readonly scop: number;
  /** Seasonal COP of the active hours alone. */
  readonly scopOn: number;
  /** Seasonal space heating energy efficiency, %. */
  readonly efficiency: number;
  /** Heat of the season Q_H and annual electricity Q_HE, kWh. */
  readonly heat: number;
  readonly electricity: number;
  readonly idleElectricity: number;
  readonly bins: readonly SeasonBinResult[];
}

/** Conversion coefficient CC and the correction for controls of air-source units, percentage points (813/2013; from memory). */
const CONVERSION = 2.5;
const CONTROL_CORRECTION = 3;

/**
 * Seasonal sum over the bins of a reference season.
 *
 * @param seasonCase climate, design load, idle powers
 * @param performance capacity and COP of the unit in a bin, given its outdoor temperature and part load
 * @returns SCOP, η_s and every bin; supplementary heat counts at COP 1
 *
 * Reference: EN 14825; Regulation (EU) 813/2013; MODEL section 14.
 */
export function seasonalSum(
  seasonCase: SeasonCase,
  performance: (outdoor: number, load: number) => BinPerformance,
): SeasonResult {
  const { designTemperature, bins, equivalentHours, idleHours } = standardSeasons[seasonCase.season];
  const results = bins.map(({ temperature, hours }) => {
    const load = seasonCase.designLoad * partLoadRatio(temperature, designTemperature);
    const found = temperature < seasonCase.operatingLimit ? { capacity: 0, cop: 1 } : performance(temperature, load);
    const supplementary = Math.max(0, load - found.capacity);
    const electricity = hours * ((load - supplementary) / found.cop + supplementary);
    return { outdoor: temperature, hours, load, ...found, supplementary, electricity };
  });
  const active = results.reduce((sum, bin) => sum + bin.electricity, 0);
  const given = results.reduce((sum, bin) => sum + bin.hours * bin.load, 0);
  const scopOn = given / active;
  const heat = seasonCase.designLoad * equivalentHours;
  const idle = idleHours[seasonCase.reversible ? 'reversible' : 'heatingOnly'];
  const powers = seasonCase.idle;
  const idleElectricity =
    idle.thermostatOff * powers.thermostatOff +
    idle.standby * powers.standby +
    idle.crankcase * powers.crankcase +
    idle.off * powers.off;
  const electricity = heat / scopOn + idleElectricity;
  const scop = heat / electricity;
  return {
    scop,
    scopOn,
    efficiency: (100 * scop) / CONVERSION - CONTROL_CORRECTION,
    heat,
    electricity,
    idleElectricity,
    bins: results,
  };
}
