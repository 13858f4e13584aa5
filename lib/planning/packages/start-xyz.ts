import type { Structure } from '../../chemistry/structure';
import { coordinateLines } from '../decks/coordinate-line';

/** Starting structure as an XYZ file; the comment line carries the job key and where the structure is from. */
export function startXyz({ elements, positionsAngstrom }: Structure, jobKey: string, origin: string): string {
  const comment = `${jobKey} ${origin}`.replace(/\s+/g, ' ').trim();
  return `${[String(elements.length), comment, ...coordinateLines(elements, positionsAngstrom)].join('\n')}\n`;
}
