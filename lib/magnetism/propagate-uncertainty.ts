/** A value with its standard uncertainty (both in one unit). */
export interface UncertainInput {
  value: number;
  u: number;
}

export interface Propagated {
  values: number[];
  /** Combined standard uncertainty of each result */
  u: number[];
  /** sensitivities[result][input] = ∂f/∂x */
  sensitivities: number[][];
}

/**
 * First-order propagation of independent standard uncertainties, u²(f) = Σ (∂f/∂x)² u²(x), with derivatives by
 * central differences. The step is 10⁻⁴ of u, so that rounding and curvature both stay below about 10⁻⁷ relative.
 * @param f - from input values to result values
 * @returns NaN uncertainties where f has no real value
 * Source: JCGM 100:2008 (GUM) 5.1.2. Checked against: monte-carlo.ts and the worked examples in
 * tests/published/magnetism-uncertainty.test.ts.
 */
export function propagateUncertainty(
  f: (values: readonly number[]) => number[],
  inputs: readonly UncertainInput[],
): Propagated {
  const centre = inputs.map((input) => input.value);
  const values = f(centre);
  const columns = inputs.map((input, i) => {
    if (input.u === 0) return values.map(() => 0);
    const step = Math.max(input.u * 1e-4, Math.abs(input.value) * 1e-9);
    const shifted = (sign: number) => f(centre.map((value, k) => (k === i ? value + sign * step : value)));
    const up = shifted(1);
    const down = shifted(-1);
    return values.map((_, r) => ((up[r] ?? Number.NaN) - (down[r] ?? Number.NaN)) / (2 * step));
  });
  const sensitivities = values.map((_, r) => columns.map((column) => column[r] ?? Number.NaN));
  const u = sensitivities.map((row) => Math.hypot(...row.map((c, i) => c * (inputs[i]?.u ?? 0))));
  return { values, u, sensitivities };
}
