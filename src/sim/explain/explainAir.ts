import { coilTemperature, ratioOverIce, referenceSettling, stayingShare } from '../../weather/frostIndex.ts';
import { saturationPressureOverWater } from '../../weather/humidAir/saturationPressure.ts';
import type { HumidityKind } from '../../weather/series.ts';
import type { Figures } from './figures.ts';
import type { HourAgain } from './hourAgain.ts';
import { type ExplainedStage, explainedStage, type FormulaName } from './stage.ts';

/** The air of an hour as the weather file has it. */
export interface AirAsRead {
  readonly kind: HumidityKind;
  /** Relative humidity in %, dew point or wet bulb in °C. */
  readonly humidity: number;
  /** Whether the file has humidity and pressure of its own. */
  readonly humidityMeasured: boolean;
  readonly pressureMeasured: boolean;
}

/** Outdoor air, its means and its frost index (MODEL sections 3, 4 and 7). */
export function airStage({ plan, i }: HourAgain, air: AirAsRead): ExplainedStage {
  const { weather } = plan;
  const outdoor = weather.temperature[i];
  const coil = coilTemperature(outdoor);
  const sun = {
    globalRadiation: weather.globalRadiation[i],
    trailingMeanRadiation: weather.trailingMeanRadiation[i],
  };
  return explainedStage('air', {
    figures: {
      outdoorTemperature: outdoor,
      ...humidityFigures(air, outdoor),
      airPressure: weather.pressure[i],
      humidityRatio: weather.humidityRatio[i],
      trailingMeanTemperature: weather.trailingMeanTemperature[i],
      ...(weather.hasRadiation ? sun : {}),
      coilTemperature: coil,
      ...(coil < 0 ? frostFigures(coil, weather.humidityRatio[i], weather.pressure[i]) : {}),
      frostIndex: weather.frostIndex[i],
    },
    findings: [
      !air.humidityMeasured && 'humidityAssumed',
      !air.pressureMeasured && 'pressureAssumed',
      weather.frostIndex[i] === 0 && 'noFrost',
    ],
    formulas: [HUMIDITY_FORMULA[air.kind], 'trailingMeans', coil < 0 && 'frostIndex'],
  });
}

const HUMIDITY_FORMULA: Record<HumidityKind, FormulaName> = {
  relative: 'humidityFromRelative',
  dewPoint: 'humidityFromDewPoint',
  wetBulb: 'humidityFromWetBulb',
};

function humidityFigures({ kind, humidity }: AirAsRead, outdoor: number): Figures {
  if (kind === 'wetBulb') return { wetBulb: humidity };
  if (kind === 'relative') {
    return { relativeHumidity: humidity, saturationPressure: saturationPressureOverWater(outdoor) };
  }
  return { dewPoint: humidity, saturationPressure: saturationPressureOverWater(Math.min(humidity, outdoor)) };
}

function frostFigures(coil: number, ratio: number, pressure: number): Figures {
  const overIce = ratioOverIce(coil, pressure);
  return {
    coilHumidityRatio: overIce,
    settlingWater: Math.max(0, ratio - overIce),
    referenceWater: referenceSettling(pressure),
    stayingShare: stayingShare(coil),
  };
}
