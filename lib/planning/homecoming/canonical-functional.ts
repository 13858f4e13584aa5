import type { Program } from '../../outputs/record';
import { functionalNames } from '../decks/functional-names';

const squeeze = (text: string): string => text.toLowerCase().replace(/[^a-z0-9/*ω]/g, '');

/**
 * The functional's usual name from what a program prints or its input says: "UPBE1PBE" → "PBE0", "RB-P86"
 * → "BP86". Plain B3LYP of ORCA takes VWN5 and is another functional.
 * @returns null when the text is none of the known spellings
 */
export function canonicalFunctional(program: Program, printed: string): string | null {
  const text = squeeze(printed);
  const candidates = [text, text.replace(/^(ro|r|u)/, '')];
  if (program === 'ORCA' && candidates.includes('b3lyp')) return 'B3LYP with VWN5';
  for (const [name, spellings] of Object.entries(functionalNames)) {
    const spelling = spellings[program];
    const known = [squeeze(name), ...('keyword' in spelling ? [squeeze(spelling.keyword)] : [])];
    if (candidates.some((candidate) => known.includes(candidate))) return name;
  }
  return null;
}
