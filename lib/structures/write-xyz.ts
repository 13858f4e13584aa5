import type { Structure } from '../chemistry/structure';

/**
 * A structure as an XYZ frame: count, comment, one line per atom (Å, eight decimals), newline at the end.
 * Line breaks in the comment become spaces. `readXyz` reads it back to within 5e-9 Å.
 */
export function writeXyz(structure: Structure, comment = ''): string {
  const atoms = structure.elements.map((element, i) => {
    const position = structure.positionsAngstrom[i] ?? [0, 0, 0];
    return `${element.padEnd(2)} ${position.map((x) => x.toFixed(8).padStart(14)).join(' ')}`;
  });
  return [String(structure.elements.length), comment.replace(/[\r\n]+/g, ' '), ...atoms, ''].join('\n');
}
