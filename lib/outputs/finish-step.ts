import { atomicNumber } from '../chemistry/elements';
import { hillFormula } from '../chemistry/formula';
import type { Step } from './record';
import { warn } from './warnings';

/** Largest difference between the sum of spin populations and 2S that rounding explains, per atom. */
const SPIN_SUM_PER_ATOM = 0.006;

/**
 * Completes a step by what follows from its values and warns of those that contradict one another.
 * Doing it twice changes nothing.
 */
export function finishStep(step: Step): Step {
  if (step.warnings.some(({ code }) => code === 'steps-abridged')) return step;
  const { geometry } = step;
  if (geometry) {
    step.formula = hillFormula(geometry.elements);
    if (step.atomCount === null) step.atomCount = geometry.elements.length;
    else if (step.atomCount !== geometry.elements.length) {
      warn(
        step,
        'atom-count',
        step.evidence.atomCount?.line ?? null,
        `${step.atomCount} atoms are announced, ${geometry.elements.length} are in the geometry.`,
      );
      step.atomCount = geometry.elements.length;
    }
  } else if (step.energyHartree !== null)
    warn(step, 'energy-without-geometry', lineOf(step, 'energyHartree'));
  checkPopulations(step);
  checkFrequencies(step);
  checkElectrons(step);
  checkSpinSum(step);
  if (step.scf.converged === false) warn(step, 'scf-not-converged', lineOf(step, 'scf.converged'));
  if (step.optimisation?.converged === false)
    warn(step, 'optimisation-not-converged', lineOf(step, 'optimisation.converged'));
  if (step.frequencies && step.frequencies.imaginaryCount > 0)
    warn(
      step,
      'imaginary-modes',
      lineOf(step, 'frequencies'),
      `The geometry has ${step.frequencies.imaginaryCount} imaginary mode(s): it is no minimum.`,
    );
  return step;
}

function lineOf(step: Step, path: string): number | null {
  return step.evidence[path]?.line ?? null;
}

/** Parity of electrons and multiplicity; printed electrons against counted ones (fewer with core potentials). */
function checkElectrons(step: Step): void {
  const { geometry, charge, multiplicity, electronCount } = step;
  const counted =
    geometry && charge !== null
      ? geometry.elements.reduce((sum, element) => sum + (atomicNumber(element) ?? 0), 0) - charge
      : null;
  const electrons = electronCount ?? counted;
  if (electrons !== null && multiplicity !== null && (electrons + multiplicity) % 2 === 0)
    warn(
      step,
      'spin-multiplicity-parity',
      lineOf(step, 'multiplicity'),
      `${electrons} electrons cannot have the multiplicity ${multiplicity}.`,
    );
  if (electronCount === null || counted === null || electronCount === counted) return;
  // Core potentials replace electrons in pairs; anything else is a contradiction.
  if (electronCount > counted || (counted - electronCount) % 2 !== 0)
    warn(
      step,
      'electron-count',
      lineOf(step, 'electronCount'),
      `${electronCount} electrons are printed, ${counted} are counted from atoms and charge.`,
    );
}

/** A table of populations that is not of the atoms of the geometry is left out. */
function checkPopulations(step: Step): void {
  const elements = step.geometry?.elements;
  if (!elements) return;
  const fits = ({ atoms }: Step['populations'][number]) =>
    atoms.length === elements.length && atoms.every((atom, i) => atom.element === elements[i]);
  for (const population of step.populations) {
    if (fits(population)) continue;
    const path = `populations.${population.scheme}`;
    warn(
      step,
      'table-damaged',
      lineOf(step, path),
      `The ${population.scheme} table does not list the atoms.`,
    );
    for (const name of Object.keys(step.evidence))
      if (name === path || name.startsWith(`${path}.`)) delete step.evidence[name];
  }
  step.populations = step.populations.filter(fits);
}

/** A molecule of N atoms has 3N − 6 vibrations, 3N − 5 if it is linear; a list of another length is damaged. */
function checkFrequencies(step: Step): void {
  const atoms = step.geometry?.elements.length;
  if (!step.frequencies || atoms === undefined) return;
  const { count } = step.frequencies;
  if (count === 3 * atoms - 6 || count === 3 * atoms - 5 || (atoms === 1 && count === 0)) return;
  warn(
    step,
    'table-damaged',
    lineOf(step, 'frequencies'),
    `${count} frequencies cannot be all of ${atoms} atoms.`,
  );
  step.frequencies = null;
  delete step.evidence.frequencies;
}

function checkSpinSum(step: Step): void {
  if (step.multiplicity === null) return;
  const unpaired = step.multiplicity - 1;
  for (const { scheme, atoms } of step.populations) {
    if (atoms.some((atom) => atom.spin === null)) continue;
    const sum = atoms.reduce((total, atom) => total + (atom.spin ?? 0), 0);
    if (Math.abs(Math.abs(sum) - unpaired) > Math.max(0.02, SPIN_SUM_PER_ATOM * atoms.length))
      warn(
        step,
        'spin-sum',
        lineOf(step, `populations.${scheme}`),
        `The ${scheme} spin populations add up to ${sum.toFixed(3)}, not to ${unpaired}.`,
      );
  }
}
