import type { Structure } from '../../chemistry/structure';

/**
 * Root mean square difference of the interatomic distances of two structures, Å, atoms in the order given;
 * blind to turning and moving. Only the first 200 atoms are compared.
 * @returns null when the elements differ in order or number
 */
export function structureDistance(a: Structure, b: Structure): number | null {
  const count = a.elements.length;
  if (count !== b.elements.length || a.elements.some((element, index) => element !== b.elements[index]))
    return null;
  const last = Math.min(count, 200);
  let sum = 0;
  let pairs = 0;
  for (let i = 0; i < last; i++)
    for (let j = 0; j < i; j++) {
      sum += (distance(a, i, j) - distance(b, i, j)) ** 2;
      pairs++;
    }
  return pairs === 0 ? 0 : Math.sqrt(sum / pairs);
}

function distance({ positionsAngstrom }: Structure, i: number, j: number): number {
  const [a, b] = [positionsAngstrom[i], positionsAngstrom[j]];
  return a && b ? Math.hypot(a[0] - b[0], a[1] - b[1], a[2] - b[2]) : NaN;
}
