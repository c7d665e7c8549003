const HALVINGS = 60;

/**
 * Student's t that a share of all cases stays within, on both sides of zero.
 *
 * @param share of the cases, above 0 and below 1, such as 0.95
 * @param degreesOfFreedom whole number, at least 1
 * @returns t, above 0; for less than one degree of freedom or a share outside its range, 0
 * @example studentT(0.95, 9) // 2.262
 *
 * Reference: M. Abramowitz, I. Stegun, Handbook of Mathematical Functions (1964), eq. 26.7.3 and 26.7.4, solved for t.
 */
export function studentT(share: number, degreesOfFreedom: number): number {
  if (!(degreesOfFreedom >= 1) || !(share > 0 && share < 1)) return 0;
  let low = 0;
  let high = Math.PI / 2;
  for (let i = 0; i < HALVINGS; i++) {
    const middle = (low + high) / 2;
    if (shareWithin(middle, degreesOfFreedom) < share) low = middle;
    else high = middle;
  }
  return Math.sqrt(degreesOfFreedom) * Math.tan((low + high) / 2);
}

/** A(t|ν) with θ = atan(t/√ν): a finite sum of powers of the cosine, odd ones where ν is odd. */
function shareWithin(angle: number, degreesOfFreedom: number): number {
  const cosine = Math.cos(angle);
  const odd = degreesOfFreedom % 2 === 1;
  let term = odd ? cosine : 1;
  let sum = degreesOfFreedom === 1 ? 0 : term;
  for (let power = odd ? 3 : 2; power <= degreesOfFreedom - 2; power += 2) {
    term *= (cosine * cosine * (power - 1)) / power;
    sum += term;
  }
  return odd ? (2 / Math.PI) * (angle + Math.sin(angle) * sum) : Math.sin(angle) * sum;
}
