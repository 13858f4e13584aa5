import type { Config } from 'tailwindcss';
import plugin from 'tailwindcss/plugin';

/**
 * Colours by meaning: [light, dark]. Ink blue (`calc`) and copper (`meas`) mean calculated and measured and
 * nothing else; plum (`dissent`) means disagreement. tests/unit/components/colour-tokens.test.ts holds the contrasts.
 */
export const colourTokens = {
  desk: ['#ece6da', '#0d1117'], // ground under the book
  page: ['#faf7f0', '#151a22'], // the two pages
  'page-sunk': ['#f2ede2', '#1c222d'], // hovered row, inset, excerpt
  gutter: ['#e6dfd1', '#0f141b'], // strip between the pages
  rule: ['#ddd5c5', '#2a323f'], // hairlines, decorative
  'rule-strong': ['#857c6c', '#77818f'], // borders that carry meaning: inputs, axes
  ink: ['#211e19', '#ece8df'], // text
  'ink-2': ['#514b41', '#bdbbb5'], // secondary text
  'ink-3': ['#6a6356', '#9a9da3'], // column heads and notes; never on the gutter
  calc: ['#21409a', '#a3bcf8'],
  'calc-tint': ['#dfe4f1', '#212d4c'],
  meas: ['#93460f', '#eba877'],
  'meas-tint': ['#f3e0cf', '#3c2a1d'],
  dissent: ['#98145f', '#f58fc6'],
  'dissent-tint': ['#f5dfea', '#411b34'],
  focus: ['#211e19', '#ece8df'],
} as const satisfies Record<string, readonly [light: string, dark: string]>;

export type ColourToken = keyof typeof colourTokens;

const tokenNames = Object.keys(colourTokens) as ColourToken[];

const config: Config = {
  content: ['./app/**/*.{ts,tsx}', './components/**/*.{ts,tsx}'],
  darkMode: 'class',
  theme: {
    colors: {
      ...Object.fromEntries(tokenNames.map((name) => [name, `var(--${name})`])),
      current: 'currentColor',
      transparent: 'transparent',
      inherit: 'inherit',
    },
    // Below 721 px the facing pages stack and ledger rows become grids: write `max-book:`.
    screens: { book: '721px', wide: '1181px' },
    fontFamily: { serif: 'var(--serif)', sans: 'var(--sans)', mono: 'var(--mono)' },
    fontSize: {
      note: ['0.78125rem', '1.4'],
      small: ['0.875rem', '1.42'],
      body: ['0.96875rem', '1.42'],
      lead: ['1.125rem', '1.42'],
      complex: ['1.1875rem', '1.2'],
      part: ['1.25rem', '1.15'],
      group: ['1.3125rem', '1.1'],
      head: ['var(--size-head)', '1.15'],
      running: ['var(--size-running)', '1'],
      section: ['var(--size-section)', '1.12'],
      title: ['var(--size-title)', '1.12'],
      formula: ['var(--size-formula)', '1'],
    },
    extend: {
      spacing: { edge: 'var(--edge)', gutter: 'var(--gutter-width)', leaf: '28px' },
      borderRadius: { DEFAULT: '2px' },
    },
  },
  plugins: [
    plugin(({ addBase }) => {
      addBase({
        ':root': Object.fromEntries(
          tokenNames.map((name) => [`--${name}`, `light-dark(${colourTokens[name].join(', ')})`]),
        ),
      });
    }),
  ],
};
export default config;
