import { elementSymbol } from '../chemistry/elements';
import type { Structure, Vector3 } from '../chemistry/structure';
import { err, ok, type Result } from '../result';

/** First frame of an XYZ text (Å), strictly: count, comment, one atom a line. Errors: a sentence with the line. */
export function parseStartStructure(text: string): Result<Structure, string> {
  const lines = text.split(/\r?\n/);
  const count = Number(lines[0]?.trim());
  if (!Number.isInteger(count) || count < 1 || !/^\s*\d+\s*$/.test(lines[0] ?? ''))
    return err('line 1 must hold the number of atoms');
  if (count > 100_000) return err(`line 1 names ${count} atoms`);
  const elements: string[] = [];
  const positionsAngstrom: Vector3[] = [];
  for (let index = 0; index < count; index++) {
    // "Fe  0.000  1.250  -0.731", further columns are ignored
    const words = (lines[index + 2] ?? '').trim().split(/\s+/);
    const element = elementSymbol(words[0] ?? '');
    const [x, y, z] = words.slice(1, 4).map((word) => (word === '' ? NaN : Number(word)));
    if (element === null) return err(`line ${index + 3}: "${words[0] ?? ''}" is no element symbol`);
    if (x === undefined || y === undefined || z === undefined || ![x, y, z].every(Number.isFinite))
      return err(`line ${index + 3} has no three coordinates`);
    elements.push(element);
    positionsAngstrom.push([x, y, z]);
  }
  return ok({ elements, positionsAngstrom });
}
