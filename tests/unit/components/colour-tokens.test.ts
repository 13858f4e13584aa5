import { describe, expect, it } from 'vitest';
import { colourTokens, type ColourToken } from '@/tailwind.config';

/** Contrast ratio of two colours. Source: WCAG 2.2, definitions of relative luminance and contrast ratio. */
function contrast(first: string, second: string): number {
  const luminance = (hex: string) => {
    const [red = 0, green = 0, blue = 0] = [1, 3, 5].map((at) => {
      const share = Number.parseInt(hex.slice(at, at + 2), 16) / 255;
      return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4;
    });
    return 0.2126 * red + 0.7152 * green + 0.0722 * blue;
  };
  const [low = 0, high = 0] = [luminance(first), luminance(second)].sort((a, b) => a - b);
  return (high + 0.05) / (low + 0.05);
}

const text: [ColourToken, ColourToken[]][] = [
  ['ink', ['page', 'desk', 'page-sunk', 'gutter', 'calc-tint']],
  ['ink-2', ['page', 'desk', 'page-sunk', 'gutter']],
  ['ink-3', ['page', 'desk', 'page-sunk']],
  ['calc', ['page', 'desk', 'page-sunk', 'calc-tint']],
  ['meas', ['page', 'desk', 'page-sunk', 'meas-tint']],
  ['dissent', ['page', 'desk', 'page-sunk', 'gutter', 'dissent-tint']],
];

describe.each(['light', 'dark'] as const)('the %s theme', (theme) => {
  const of = (token: ColourToken) => colourTokens[token][theme === 'light' ? 0 : 1];

  it('gives every token a colour', () => {
    for (const token of Object.keys(colourTokens) as ColourToken[])
      expect(of(token)).toMatch(/^#[0-9a-f]{6}$/);
  });

  it.each(text.flatMap(([ink, grounds]) => grounds.map((ground) => [ink, ground] as const)))(
    'lets %s be read on %s: 4.5 to 1',
    (ink, ground) => expect(contrast(of(ink), of(ground))).toBeGreaterThanOrEqual(4.5),
  );

  it.each([
    ['rule-strong', 'page'],
    ['rule-strong', 'desk'],
    ['focus', 'page'],
    ['focus', 'desk'],
    ['focus', 'gutter'],
  ] as const)('lets %s be seen on %s: 3 to 1', (line, ground) =>
    expect(contrast(of(line), of(ground))).toBeGreaterThanOrEqual(3),
  );

  it('lets the words of a main button be read, also under the pointer', () => {
    expect(contrast(of('page'), of('ink'))).toBeGreaterThanOrEqual(4.5);
    expect(contrast(of('page'), of('ink-2'))).toBeGreaterThanOrEqual(4.5);
  });
});

it('computes the contrast of black on white as 21, the standard’s own example', () => {
  expect(contrast('#000000', '#ffffff')).toBeCloseTo(21, 6);
});
