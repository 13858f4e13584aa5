import type { Structure } from '../chemistry/structure';

/**
 * Some atoms of a structure as a structure of their own, in the order given: a metal with its donors, say.
 * Errors: throws RangeError for an index that is not there.
 */
export function substructure(structure: Structure, atoms: readonly number[]): Structure {
  const elements: string[] = [];
  const positionsAngstrom: Structure['positionsAngstrom'][number][] = [];
  for (const atom of atoms) {
    const [element, position] = [structure.elements[atom], structure.positionsAngstrom[atom]];
    if (element === undefined || !position) {
      throw new RangeError(`atom ${atom}: indices run from 0 to ${structure.elements.length - 1}`);
    }
    elements.push(element);
    positionsAngstrom.push(position);
  }
  return { elements, positionsAngstrom };
}
