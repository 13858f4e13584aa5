/** The first letters of a name's first and last word: "Hanne Oduya" → "HO". */
export function initialsOf(name: string): string {
  const words = name.trim().split(/\s+/);
  const letters = words.length > 1 ? [words[0], words.at(-1)] : words;
  return letters.map((word) => [...(word ?? '')][0]?.toUpperCase() ?? '').join('');
}
