/** One line of a comparison: in both decks, only in the old one, or only in the new one. */
export interface DeckDifferenceLine {
  kind: 'same' | 'removed' | 'added';
  text: string;
}

/**
 * Line-by-line difference of two decks by their longest common subsequence; removed lines stand before
 * added ones. Equal beginnings and ends are skipped first, so the table stays small for real edits; decks
 * have up to some thousand lines.
 */
export function deckDifference(oldText: string, newText: string): DeckDifferenceLine[] {
  const before = oldText.split('\n');
  const after = newText.split('\n');
  let start = 0;
  while (start < before.length && start < after.length && before[start] === after[start]) start++;
  let end = 0;
  while (
    end < before.length - start &&
    end < after.length - start &&
    before[before.length - 1 - end] === after[after.length - 1 - end]
  )
    end++;
  const same = (lines: readonly string[]) => lines.map((text) => ({ kind: 'same' as const, text }));
  return [
    ...same(before.slice(0, start)),
    ...middle(before.slice(start, before.length - end), after.slice(start, after.length - end)),
    ...same(before.slice(before.length - end)),
  ];
}

function middle(before: readonly string[], after: readonly string[]): DeckDifferenceLine[] {
  const width = after.length + 1;
  // common[i·width + j]: length of the longest common subsequence of before[i…] and after[j…]
  const common = new Uint32Array((before.length + 1) * width);
  const at = (i: number, j: number) => common[i * width + j] ?? 0;
  for (let i = before.length - 1; i >= 0; i--)
    for (let j = after.length - 1; j >= 0; j--)
      common[i * width + j] =
        before[i] === after[j] ? at(i + 1, j + 1) + 1 : Math.max(at(i + 1, j), at(i, j + 1));
  const lines: DeckDifferenceLine[] = [];
  let i = 0;
  let j = 0;
  while (i < before.length || j < after.length) {
    const old = before[i];
    const fresh = after[j];
    if (old !== undefined && old === fresh) {
      lines.push({ kind: 'same', text: old });
      i++;
      j++;
    } else if (old !== undefined && (fresh === undefined || at(i + 1, j) >= at(i, j + 1))) {
      lines.push({ kind: 'removed', text: old });
      i++;
    } else if (fresh !== undefined) {
      lines.push({ kind: 'added', text: fresh });
      j++;
    }
  }
  return lines;
}
