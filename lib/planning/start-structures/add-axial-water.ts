import type { Vector3 } from '../../chemistry/structure';
import { err, ok, type Result } from '../../result';
import { donorFrame } from './donor-frame';
import type { LigandFragment } from './ligand-fragments';
import type { BondedStructure, RecipeProblem } from './recipe';
import { add, scale, subtract, unit } from './vector';

// Gas-phase water: O–H 0.9572 Å, H–O–H 104.52° (Benedict, Gailar and Plyler, J. Chem. Phys. 1956, 24, 1139).
const bondAngstrom = 0.9572;
const halfAngle = (104.52 / 2) * (Math.PI / 180);

/**
 * Two water molecules on the axis of a four-coordinate centre, hydrogens turned away from it and between
 * the in-plane donors. New atoms come last: O H H, O H H.
 */
export function addAxialWater(
  start: BondedStructure,
  centreIndex: number,
  distanceAngstrom: number,
  fragments: readonly LigandFragment[],
): Result<BondedStructure, RecipeProblem> {
  const { elements, positionsAngstrom } = start.structure;
  const centre = positionsAngstrom[centreIndex];
  const donors = fragments.flatMap((fragment) => fragment.donors);
  if (!centre || donors.length !== 4)
    return err({ code: 'not four-coordinate', message: `the centre has ${donors.length} donors` });
  const vectors = donors.map((donor) => subtract(positionsAngstrom[donor] ?? centre, centre));
  const frame = donorFrame(vectors);
  const first =
    frame && unit(subtract(vectors[frame.pairs[0][0]] ?? [0, 0, 0], vectors[frame.pairs[0][1]] ?? [0, 0, 0]));
  const second =
    frame && unit(subtract(vectors[frame.pairs[1][0]] ?? [0, 0, 0], vectors[frame.pairs[1][1]] ?? [0, 0, 0]));
  const between = first && second && unit(add(first, second));
  if (!frame || !between)
    return err({ code: 'not four-coordinate', message: 'the four donors span no plane' });
  const added: Vector3[] = [];
  const bonds = [...start.bonds];
  for (const side of [1, -1]) {
    const along = scale(frame.axis, side);
    const oxygen = add(centre, scale(along, distanceAngstrom));
    const oxygenIndex = elements.length + added.length;
    added.push(oxygen);
    for (const hand of [1, -1])
      added.push(
        add(
          oxygen,
          add(
            scale(along, bondAngstrom * Math.cos(halfAngle)),
            scale(between, hand * bondAngstrom * Math.sin(halfAngle)),
          ),
        ),
      );
    bonds.push([centreIndex, oxygenIndex], [oxygenIndex, oxygenIndex + 1], [oxygenIndex, oxygenIndex + 2]);
  }
  return ok({
    structure: {
      elements: [...elements, 'O', 'H', 'H', 'O', 'H', 'H'],
      positionsAngstrom: [...positionsAngstrom, ...added],
    },
    bonds,
  });
}
