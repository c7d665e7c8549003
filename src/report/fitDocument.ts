import { problemCure, problemSentence } from '../core/problemText.ts';
import type { FitAnswer } from '../scenario/fit/fitAnswer.ts';
import { GUIDELINE_CV_RMSE, LEAST_R_SQUARED, MOST_CV_RMSE } from '../scenario/fit/fitDoubts.ts';
import type { LoadedReadings } from '../scenario/readings/loadReadings.ts';
import { dayText } from '../scenario/readings/readingDates.ts';
import { coveredText } from '../scenario/readings/weatherDays.ts';
import type { FitDocument } from './fitResultSchema.ts';

/**
 * A heat loss by readings as plain data, keys in a fixed order, full precision.
 *
 * @param answer of `fitAnswer`
 * @param version of the program
 */
export function fitDocument(answer: FitAnswer, version: string): FitDocument {
  const { scenario, readings, heatLoss, signature, believed, doubts } = answer;
  const { baseTemperature, baseUse, slope, slopeErrorWithBase, slopeError } = signature;
  const { degreesOfFreedom, rSquared, cvRmse } = signature;
  const { value, standardError, standardErrorWithBase, low, high } = heatLoss;
  return {
    version,
    scenario: scenario.scenario.name,
    heatLoss: { value, standardError, standardErrorWithBase, low, high, entered: answer.enteredHeatLoss },
    signature: {
      ...{ baseTemperature, baseUse, slope, slopeErrorWithBase, slopeError },
      ...{ degreesOfFreedom, rSquared, cvRmse },
    },
    believed,
    asked: { rSquared: LEAST_R_SQUARED, cvRmse: MOST_CV_RMSE, guidelineCvRmse: GUIDELINE_CV_RMSE },
    scenarioLines: [...answer.lines],
    doubts: doubts.map((doubt) => ({
      code: doubt.code,
      text: problemSentence(doubt),
      remedy: problemCure(doubt),
    })),
    readings: readingsPart(readings),
    periods: periodsPart(answer),
    weather: {
      files: readings.weather.files.map(({ file, lines }) => ({ file, recognised: [...lines] })),
      covers: coveredText(readings.weather.days),
      filledHours: readings.weather.days.filledHours,
    },
    inputs: readings.inputs.map(({ file, role, sha256 }) => ({ file, role, sha256 })),
  };
}

function readingsPart({ file, meter, energy, made }: LoadedReadings): FitDocument['readings'] {
  const { kWhPerUnit, efficiency, efficiencyFrom } = energy;
  return {
    ...{ file, kind: meter.kind, unit: meter.unit ?? 'unit', kWhPerUnit, efficiency, efficiencyFrom },
    ...{ rows: meter.rows.length, estimated: made.estimated },
    unused: made.unused.map(({ fromDay, toDay }) => ({ from: dayText(fromDay), to: dayText(toDay) })),
  };
}

function periodsPart({ readings, signature }: FitAnswer): FitDocument['periods'] {
  return readings.made.periods.map(({ fromDay, toDay }, i) => {
    const { days, dailyUse, degreeDays, onLine, residual } = signature.periods[i];
    const { use } = readings.metered[i];
    return { from: dayText(fromDay), to: dayText(toDay), days, use, dailyUse, degreeDays, onLine, residual };
  });
}
