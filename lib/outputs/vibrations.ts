import type { Step } from './record';

/** Modes below this wavenumber, cm⁻¹, are overall translations and rotations where they are listed. */
const ZERO_MODE_CM1 = 1;

/**
 * The frequencies of a list of all 3N modes. Up to six modes of nearly no wavenumber are translations and
 * rotations and are left out; imaginary modes are negative.
 */
export function vibrationsOf(allModesCm1: readonly number[]): NonNullable<Step['frequencies']> {
  const zero = new Set(
    allModesCm1
      .map((value, mode) => ({ size: Math.abs(value), mode }))
      .filter(({ size }) => size < ZERO_MODE_CM1)
      .sort((a, b) => a.size - b.size)
      .slice(0, 6)
      .map(({ mode }) => mode),
  );
  return frequenciesOf(allModesCm1.filter((_, mode) => !zero.has(mode)));
}

/** The same for a list that holds vibrations only. */
export function frequenciesOf(valuesCm1: number[]): NonNullable<Step['frequencies']> {
  return {
    count: valuesCm1.length,
    lowestCm1: valuesCm1.length === 0 ? null : valuesCm1.reduce((low, value) => Math.min(low, value)),
    imaginaryCount: valuesCm1.filter((value) => value < 0).length,
    valuesCm1,
  };
}
