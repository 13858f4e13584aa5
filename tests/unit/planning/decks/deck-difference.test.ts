import { describe, expect, it } from 'vitest';
import { deckDifference } from '@/lib/planning/decks/deck-difference';
import { deckLines, request } from './deck-cases';

const apply = (lines: ReturnType<typeof deckDifference>, without: 'removed' | 'added') =>
  lines
    .filter((line) => line.kind !== without)
    .map((line) => line.text)
    .join('\n');

describe('the difference of two decks', () => {
  it('shows the changed lines alone, old before new', () => {
    const before = deckLines(request({ program: 'NWChem' })).join('\n');
    const after = deckLines(request({ program: 'NWChem', functional: 'PBE0' })).join('\n');
    expect(deckDifference(before, after).filter((line) => line.kind !== 'same')).toEqual([
      { kind: 'removed', text: '  xc b3lyp' },
      { kind: 'added', text: '  xc pbe0' },
    ]);
  });

  it.each([
    ['a\nb\nc', 'a\nc'],
    ['a\nc', 'a\nb\nc'],
    ['', 'x\ny'],
    ['a\nb\na\nb', 'b\na\nb\na'],
    ['same\nsame', 'same\nsame\nsame'],
  ])('holds both texts: %j and %j', (before, after) => {
    const lines = deckDifference(before, after);
    expect(apply(lines, 'added')).toBe(before);
    expect(apply(lines, 'removed')).toBe(after);
  });

  it('of equal decks is all the same', () => {
    expect(deckDifference('a\nb', 'a\nb').every((line) => line.kind === 'same')).toBe(true);
  });
});
