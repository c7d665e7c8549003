/** Coefficients 1/n! of the series, the highest power first: cosine up to x¹⁸, sine up to x¹⁷. */
const COSINE = [18, 16, 14, 12, 10, 8, 6, 4, 2, 0].map(signedInverseFactorial);
const SINE = [17, 15, 13, 11, 9, 7, 5, 3, 1].map(signedInverseFactorial);

function signedInverseFactorial(n: number): number {
  let factorial = 1;
  for (let k = 2; k <= n; k++) factorial *= k;
  return ((n >> 1) % 2 === 0 ? 1 : -1) / factorial;
}

/**
 * Cosine of an angle in whole turns. The cosine of the language differs between engines in its last digit; this one is made
 * of sums and products, which do not, so that a year is the same year in each of them.
 *
 * The first terms left out are below (π/4)²⁰/20! < 4e-21, so the error is rounding only.
 *
 * @param turns any finite number; 1 is a whole turn
 * @example cosineOfTurns(0.5) // -1
 *
 * Reference: M. Abramowitz, I. Stegun, Handbook of Mathematical Functions, 1964, 4.3.65 and 4.3.66.
 */
export function cosineOfTurns(turns: number): number {
  const fraction = Math.abs(turns - Math.round(turns));
  const isFar = fraction > 0.25;
  const near = isFar ? 0.5 - fraction : fraction;
  const value = near > 0.125 ? sine(2 * Math.PI * (0.25 - near)) : cosine(2 * Math.PI * near);
  return isFar ? -value : value;
}

/** For |x| up to π/4. */
function cosine(x: number): number {
  const square = x * x;
  return COSINE.reduce((sum, coefficient) => sum * square + coefficient, 0);
}

/** For |x| up to π/4. */
function sine(x: number): number {
  const square = x * x;
  return x * SINE.reduce((sum, coefficient) => sum * square + coefficient, 0);
}
