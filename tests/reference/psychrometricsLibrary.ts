import library from 'psychrolib';

library.SetUnitSystem(library.SI);

/** The published library psychrolib in SI units: °C, Pa, kg/kg, relative humidity as a share of 1. */
export const psychrometricsLibrary = library;
