import type { Line } from './landmark';
import type { Evidence } from './record';

/** Longest evidence text kept, characters. */
export const EVIDENCE_TEXT_LENGTH = 200;

/**
 * Keeps the line that a value was read from, under the value's path in the record
 * ("energyHartree", "spin.s2", "populations.Mulliken", "geometry"). A later citation of the same path replaces it.
 */
export function cite(holder: { evidence: Evidence }, path: string, line: Line): void {
  holder.evidence[path] = { line: line.number, text: line.text.trim().slice(0, EVIDENCE_TEXT_LENGTH) };
}
