import { spinWord } from '@/components/marks/spin-word';

/** "T-4 quartet". */
export function candidateWords({
  geometry,
  multiplicity,
}: {
  geometry: string;
  multiplicity: number;
}): string {
  return `${geometry} ${spinWord(multiplicity)}`;
}
