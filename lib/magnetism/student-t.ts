/** ln Γ(x) for x > 0 by the Lanczos series (g = 7, nine terms), relative error below 1e-13. */
function logGamma(x: number): number {
  const coefficients = [
    0.99999999999980993, 676.5203681218851, -1259.1392167224028, 771.32342877765313, -176.61502916214059,
    12.507343278686905, -0.13857109526572012, 9.9843695780195716e-6, 1.5056327351493116e-7,
  ];
  const t = x + 6.5;
  const sum = coefficients.reduce((total, c, i) => total + (i === 0 ? c : c / (x - 1 + i)), 0);
  return 0.5 * Math.log(2 * Math.PI) + (x - 0.5) * Math.log(t) - t + Math.log(sum);
}

/** Continued fraction of the incomplete beta function, modified Lentz recursion; converges for x < (a + 1)/(a + b + 2). */
function betaFraction(x: number, a: number, b: number): number {
  const tiny = 1e-300;
  const guard = (value: number) => (Math.abs(value) < tiny ? tiny : value);
  let c = 1;
  let d = 1 / guard(1 - ((a + b) * x) / (a + 1));
  let result = d;
  for (let m = 1; m <= 300; m += 1) {
    for (const term of [
      (m * (b - m) * x) / ((a + 2 * m - 1) * (a + 2 * m)),
      (-(a + m) * (a + b + m) * x) / ((a + 2 * m) * (a + 2 * m + 1)),
    ]) {
      d = 1 / guard(1 + term * d);
      c = guard(1 + term / c);
      result *= c * d;
    }
    if (Math.abs(c * d - 1) < 1e-15) break;
  }
  return result;
}

/** Regularised incomplete beta function I_x(a, b), 0 ≤ x ≤ 1. */
function incompleteBeta(x: number, a: number, b: number): number {
  if (x <= 0) return 0;
  if (x >= 1) return 1;
  const front = Math.exp(logGamma(a + b) - logGamma(a) - logGamma(b) + a * Math.log(x) + b * Math.log1p(-x));
  return x < (a + 1) / (a + b + 2)
    ? (front * betaFraction(x, a, b)) / a
    : 1 - (front * betaFraction(1 - x, b, a)) / b;
}

/**
 * Two-sided quantile of Student's t: the factor k with P(|t| ≤ k) = level.
 * @param level - coverage probability, between 0 and 1 (0.95 for 95 %)
 * @param degreesOfFreedom - > 0; Infinity gives the normal quantile
 * Errors: throws RangeError outside these ranges. Accuracy: about 1e-9 relative.
 * Checked against: GUM (JCGM 100:2008) table G.2, tests/published/magnetism-uncertainty.test.ts.
 */
export function studentT(level: number, degreesOfFreedom: number): number {
  if (!(level > 0 && level < 1)) throw new RangeError(`level must lie between 0 and 1, received ${level}`);
  if (!(degreesOfFreedom > 0))
    throw new RangeError(`degreesOfFreedom must be above 0, received ${degreesOfFreedom}`);
  // Beyond a million degrees of freedom the difference from the normal law is below 1e-6.
  const nu = Math.min(degreesOfFreedom, 1e7);
  const outside = (t: number) => incompleteBeta(nu / (nu + t * t), nu / 2, 0.5);
  let high = 1;
  while (outside(high) > 1 - level) high *= 2;
  let low = 0;
  for (let i = 0; i < 200 && high - low > 1e-12 * high; i += 1) {
    const middle = (low + high) / 2;
    if (outside(middle) > 1 - level) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}
