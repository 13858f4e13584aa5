import { elementSymbol } from '../../chemistry/elements';
import type { Vector3 } from '../../chemistry/structure';
import { err, ok, type Result } from '../../result';
import { addAxialWater } from './add-axial-water';
import { donorFrame } from './donor-frame';
import { ligandFragments, type LigandFragment } from './ligand-fragments';
import type { BondedStructure, RecipeProblem, RecipeStep } from './recipe';
import { add, cross, dot, norm, rotate, scale, subtract, unit } from './vector';

type Outcome = Result<BondedStructure, RecipeProblem>;
const problem = (code: RecipeProblem['code'], message: string) => err({ code, message });

/**
 * One step of a recipe applied to a structure. Ligands move as rigid bodies; a ligand that also binds
 * another metal stays where it is. Internal bond lengths of ligands never change.
 * Errors: see `RecipeProblem`.
 */
export function applyRecipeStep(start: BondedStructure, step: RecipeStep): Outcome {
  const centre = start.structure.positionsAngstrom[step.centre];
  if (!centre) return problem('no such atom', `there is no atom ${step.centre + 1}`);
  const fragments = ligandFragments(start, step.centre);
  switch (step.kind) {
    case 'exchange metal':
      return exchangeMetal(start, step, centre, fragments);
    case 'add axial water':
      return addAxialWater(start, step.centre, step.distanceAngstrom, fragments);
    case 'remove ligands':
      return removeLigands(start, step.donors, fragments);
    case 'set elevation':
      return setElevation(start, step.elevationDegrees, centre, fragments);
    case 'twist':
      return twist(start, step, centre, fragments);
    case 'shift donors': {
      let moved = start;
      for (const donor of step.donors) {
        const fragment = fragments.find((item) => item.donors.includes(donor));
        if (!fragment) return problem('not a donor', `atom ${donor + 1} is no donor of the centre`);
        if (fragment.bridging || fragment.donors.length > 1)
          return problem('ligand cannot move alone', `atom ${donor + 1} belongs to a chelate or a bridge`);
        moved = translate(moved, fragment, outward(start, [donor], centre, step.shiftAngstrom));
      }
      return ok(moved);
    }
  }
}

function exchangeMetal(
  start: BondedStructure,
  step: Extract<RecipeStep, { kind: 'exchange metal' }>,
  centre: Vector3,
  fragments: readonly LigandFragment[],
): Outcome {
  const element = elementSymbol(step.element);
  if (element === null) return problem('unknown element', `"${step.element}" is no element`);
  let moved: BondedStructure = {
    ...start,
    structure: {
      ...start.structure,
      elements: start.structure.elements.map((old, index) => (index === step.centre ? element : old)),
    },
  };
  for (const fragment of fragments)
    if (!fragment.bridging)
      moved = translate(
        moved,
        fragment,
        outward(start, fragment.donors, centre, step.radiusDifferenceAngstrom),
      );
  return ok(moved);
}

/**
 * Shift of a ligand that lengthens its metal–donor distances by `by` on average: along the mean m of the
 * unit vectors, by/|m|². A macrocycle around the metal (m near zero) stays where it is.
 */
function outward(start: BondedStructure, donors: readonly number[], centre: Vector3, by: number): Vector3 {
  let sum: Vector3 = [0, 0, 0];
  for (const donor of donors) {
    const direction = unit(subtract(start.structure.positionsAngstrom[donor] ?? centre, centre));
    if (direction) sum = add(sum, direction);
  }
  const mean = scale(sum, 1 / donors.length);
  const square = dot(mean, mean);
  return square < 0.1 ? [0, 0, 0] : scale(mean, by / square);
}

function mapAtoms(
  start: BondedStructure,
  atoms: readonly number[],
  change: (at: Vector3) => Vector3,
): BondedStructure {
  const moving = new Set(atoms);
  return {
    ...start,
    structure: {
      ...start.structure,
      positionsAngstrom: start.structure.positionsAngstrom.map((at, index) =>
        moving.has(index) ? change(at) : at,
      ),
    },
  };
}

const translate = (start: BondedStructure, fragment: LigandFragment, shift: Vector3): BondedStructure =>
  mapAtoms(start, fragment.atoms, (at) => add(at, shift));

function removeLigands(
  start: BondedStructure,
  donors: readonly number[],
  fragments: readonly LigandFragment[],
): Outcome {
  const gone = new Set<number>();
  for (const donor of donors) {
    const fragment = fragments.find((item) => item.donors.includes(donor));
    if (!fragment) return problem('not a donor', `atom ${donor + 1} is no donor of the centre`);
    if (fragment.bridging)
      return problem('ligand cannot move alone', `the ligand of atom ${donor + 1} binds another metal too`);
    for (const atom of fragment.atoms) gone.add(atom);
  }
  const kept = start.structure.elements.flatMap((_, index) => (gone.has(index) ? [] : [index]));
  const newIndex = new Map(kept.map((old, index) => [old, index]));
  return ok({
    structure: {
      elements: start.structure.elements.filter((_, index) => !gone.has(index)),
      positionsAngstrom: start.structure.positionsAngstrom.filter((_, index) => !gone.has(index)),
    },
    bonds: start.bonds.flatMap(([a, b]) => {
      const [first, second] = [newIndex.get(a), newIndex.get(b)];
      return first === undefined || second === undefined ? [] : [[first, second] as const];
    }),
  });
}

function setElevation(
  start: BondedStructure,
  elevationDegrees: number,
  centre: Vector3,
  fragments: readonly LigandFragment[],
): Outcome {
  const donors = fragments.flatMap((fragment) => fragment.donors);
  if (donors.length !== 4) return problem('not four-coordinate', `the centre has ${donors.length} donors`);
  if (fragments.some((fragment) => fragment.donors.length > 1 || fragment.bridging))
    return problem('ligand cannot move alone', 'chelates and bridges are twisted, not flattened');
  const vectors = donors.map((donor) => subtract(start.structure.positionsAngstrom[donor] ?? centre, centre));
  const frame = donorFrame(vectors);
  if (!frame) return problem('not four-coordinate', 'the four donors span no plane');
  let moved = start;
  frame.pairs.forEach((pair, side) => {
    for (const position of pair) {
      const vector = vectors[position] ?? frame.axis;
      const fragment = fragments.find((item) => item.donors[0] === donors[position]);
      const turn = unit(cross(vector, frame.axis));
      if (!fragment || !turn) continue;
      const now = Math.asin(dot(vector, frame.axis) / norm(vector));
      const wanted = ((side === 0 ? 1 : -1) * elevationDegrees * Math.PI) / 180;
      moved = mapAtoms(moved, fragment.atoms, (at) =>
        add(centre, rotate(subtract(at, centre), turn, wanted - now)),
      );
    }
  });
  return ok(moved);
}

function twist(
  start: BondedStructure,
  step: Extract<RecipeStep, { kind: 'twist' }>,
  centre: Vector3,
  fragments: readonly LigandFragment[],
): Outcome {
  const moving = fragments.filter((fragment) => fragment.donors.some((donor) => step.donors.includes(donor)));
  if (step.donors.some((donor) => !moving.some((fragment) => fragment.donors.includes(donor))))
    return problem('not a donor', 'the twist names an atom that is no donor of the centre');
  if (moving.some((item) => item.bridging || item.donors.some((donor) => !step.donors.includes(donor))))
    return problem('ligand cannot move alone', 'a ligand of the twisted pair is bound elsewhere too');
  const [first, second] = step.donors.map((donor) =>
    unit(subtract(start.structure.positionsAngstrom[donor] ?? centre, centre)),
  );
  const axis = first && second ? unit(add(first, second)) : null;
  if (!axis) return problem('not four-coordinate', 'two opposite donors have no axis to twist about');
  const angle = (step.degrees * Math.PI) / 180;
  return ok(
    mapAtoms(
      start,
      moving.flatMap((fragment) => fragment.atoms),
      (at) => add(centre, rotate(subtract(at, centre), axis, angle)),
    ),
  );
}
