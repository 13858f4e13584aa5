import type { BondGraph } from '../chemistry/bonds';

/** Rounds of refinement: each looks one bond farther. */
const ROUNDS = 8;

/**
 * Classes of like atoms in two structures: same element, same neighbours, same neighbours of neighbours and
 * so on. Atoms that a permutation could exchange share a class, and classes carry the same name in both.
 * Source of the refinement: H. L. Morgan, J. Chem. Doc. 1965, 5, 107.
 * @returns one name per atom for each structure
 */
export function atomClasses(
  first: { elements: readonly string[]; graph: BondGraph },
  second: { elements: readonly string[]; graph: BondGraph },
): [string[], string[]] {
  let names: [string[], string[]] = [[...first.elements], [...second.elements]];
  let count = new Set(names.flat()).size;
  for (let round = 0; round < ROUNDS; round++) {
    const described = [first, second].map(({ graph }, side) => {
      const own = names[side] ?? [];
      return own.map((name, i) => {
        const around = (graph.neighbours[i] ?? []).map((j) => own[j] ?? '').sort();
        return `${name}(${around.join()})`;
      });
    });
    const all = [...new Set(described.flat())].sort();
    if (all.length === count) break;
    count = all.length;
    const shortName = new Map(
      all.map((text, i) => [text, `${text.split('(')[0]?.split('#')[0] ?? ''}#${i}`]),
    );
    const renamed = described.map((side) => side.map((text) => shortName.get(text) ?? text));
    names = [renamed[0] ?? [], renamed[1] ?? []];
  }
  return names;
}
