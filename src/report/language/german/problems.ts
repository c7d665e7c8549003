import type { ProblemLanguage } from '../../../core/problemText.ts';
import { germanField } from './fields.ts';
import { germanPhrase } from './phrases.ts';
import { problemsOfBatch } from './problemsOfBatch.ts';
import { problemsOfFiles } from './problemsOfFiles.ts';
import { problemsOfReadings } from './problemsOfReadings.ts';
import { problemsOfScenarios } from './problemsOfScenarios.ts';
import { problemsOfTariffs } from './problemsOfTariffs.ts';
import { problemsOfLabels, problemsOfMaps } from './problemsOfUnits.ts';
import { problemsOfWeather } from './problemsOfWeather.ts';
import { germanSyntax } from './syntax.ts';
import { germanUnit } from './units.ts';

/** Problems in German. */
export const germanProblems: ProblemLanguage = {
  kinds: {
    ...problemsOfFiles,
    ...problemsOfWeather,
    ...problemsOfTariffs,
    ...problemsOfScenarios,
    ...problemsOfMaps,
    ...problemsOfReadings,
    ...problemsOfLabels,
    ...problemsOfBatch,
  },
  phrase: (text, code) => {
    const phrase = germanPhrase(text, germanField);
    return code === 'yaml.syntax' && phrase === text ? germanSyntax(text) : germanUnit(phrase);
  },
};
