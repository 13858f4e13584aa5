/**
 * Room-temperature ranges of μ_eff (μ_B, per metal ion) of magnetically dilute 3d compounds near 295 K after the
 * diamagnetic correction, as handbooks print them. Books differ by about 0.1 between each other: the ranges are
 * soft, for warnings and for argument, never a hard pass or fail. All were recalled from the named books; `seen`
 * says where an agreeing table was read.
 */
export interface MomentBand {
  element: string;
  oxidationState: number;
  /** IUPAC polyhedral symbols that the row covers; 'any' when the geometry does not matter */
  geometries: readonly string[];
  unpaired: number;
  low: number;
  high: number;
  /** The widest range met in print, when it differs */
  wider: { low: number; high: number } | null;
  confidence: 'high' | 'medium' | 'low';
  source: string;
  /** An agreeing table that was read, with its value */
  seen: string | null;
  note: string | null;
}

const CLASSIC =
  'Figgis & Lewis in Modern Coordination Chemistry (1960) p. 406; also in Cotton & Wilkinson and Huheey (recalled)';
const ELEMENT =
  'Greenwood & Earnshaw, Chemistry of the Elements; Cotton & Wilkinson, Advanced Inorganic Chemistry (recalled)';
const COBALT = `Cotton, Goodgame & Goodgame 1961; ${ELEMENT}`;
const NCERT = 'NCERT Chemistry XII (reproduction read)';
const ASHCROFT = 'Ashcroft & Mermin (reproduction read)';

type Confidence = MomentBand['confidence'];
interface Extra {
  wider?: [number, number];
  seen?: string;
  note?: string;
}

function band(
  ion: string,
  geometries: string,
  unpaired: number,
  [low, high]: [number, number],
  source: string,
  confidence: Confidence,
  { wider, seen, note }: Extra = {},
): MomentBand {
  const [element = '', state = ''] = ion.split(' ');
  return {
    element,
    oxidationState: Number(state),
    geometries: geometries.split(' '),
    unpaired,
    low,
    high,
    wider: wider ? { low: wider[0], high: wider[1] } : null,
    confidence,
    source,
    seen: seen ?? null,
    note: note ?? null,
  };
}

export const momentBands: readonly MomentBand[] = [
  band('Ti 3', 'OC-6', 1, [1.6, 1.8], CLASSIC, 'medium', {
    seen: `1.75, ${NCERT}`,
    note: 'T ground term: falls on cooling',
  }),
  band('V 4', 'SPY-5 OC-6', 1, [1.68, 1.78], CLASSIC, 'medium', { note: 'vanadyl, VO²⁺' }),
  band('V 3', 'OC-6', 2, [2.75, 2.85], CLASSIC, 'medium', { wider: [2.6, 2.9], seen: `2.8, ${ASHCROFT}` }),
  band('V 2', 'OC-6', 3, [3.8, 3.9], CLASSIC, 'high', { seen: `3.86, ${NCERT}; 3.8, ${ASHCROFT}` }),
  band('Cr 3', 'OC-6', 3, [3.7, 3.9], CLASSIC, 'high', { seen: `3.7, ${ASHCROFT}` }),
  band('Mn 4', 'OC-6', 3, [3.8, 4.0], CLASSIC, 'medium', { seen: `4.0, ${ASHCROFT}` }),
  band('Cr 2', 'OC-6', 4, [4.75, 4.9], CLASSIC, 'high', {
    seen: `4.80, ${NCERT}; 4.8, ${ASHCROFT}`,
    note: 'usually elongated',
  }),
  band('Cr 2', 'OC-6', 2, [3.2, 3.3], CLASSIC, 'medium', {
    wider: [2.7, 3.3],
    note: 'quadruply bonded carboxylate dimers are diamagnetic',
  }),
  band('Mn 3', 'OC-6', 4, [4.9, 5.0], CLASSIC, 'high', {
    wider: [4.7, 5.1],
    seen: `5.0, ${ASHCROFT}`,
    note: 'usually elongated',
  }),
  band('Mn 3', 'OC-6', 2, [3.1, 3.3], CLASSIC, 'medium', {
    note: 'one value in the classic table: 3.18 for [Mn(CN)6]³⁻',
  }),
  band('Mn 2', 'OC-6', 5, [5.65, 6.1], CLASSIC, 'high', { seen: `5.96, ${NCERT}; 5.9, ${ASHCROFT}` }),
  band('Mn 2', 'T-4', 5, [5.8, 6.0], ELEMENT, 'medium', { wider: [5.65, 6.1] }),
  band('Mn 2', 'OC-6', 1, [1.8, 2.1], CLASSIC, 'medium', {
    wider: [1.7, 2.2],
    seen: '2.2 for [Mn(CN)6]⁴⁻ in a textbook exercise (read)',
  }),
  band('Fe 3', 'OC-6', 5, [5.7, 6.0], CLASSIC, 'high', { seen: `5.9, ${ASHCROFT}` }),
  band('Fe 3', 'T-4', 5, [5.8, 6.0], ELEMENT, 'medium'),
  band('Fe 3', 'OC-6', 1, [2.0, 2.5], CLASSIC, 'high', { note: 'T ground term: falls on cooling' }),
  band(
    'Fe 3',
    'SPY-5',
    3,
    [3.9, 4.1],
    'Cotton & Wilkinson, Advanced Inorganic Chemistry (recalled)',
    'medium',
    {
      wider: [3.9, 4.6],
      note: 'halogenobis(dithiocarbamato)iron(III)',
    },
  ),
  band('Fe 2', 'OC-6', 4, [5.1, 5.7], CLASSIC, 'high', {
    wider: [4.9, 5.7],
    seen: `5.3–5.5, ${NCERT}; 5.4, ${ASHCROFT}`,
  }),
  band('Fe 2', 'T-4', 4, [5.0, 5.4], ELEMENT, 'medium'),
  band('Fe 2', 'OC-6', 0, [0, 0.5], CLASSIC, 'high', {
    note: 'diamagnetic but for temperature-independent paramagnetism; read as zero',
  }),
  band('Fe 2', 'SP-4', 2, [3.8, 4.7], 'Cotton & Wilkinson, Advanced Inorganic Chemistry (recalled)', 'low', {
    note: 'porphyrins and phthalocyanine; large orbital part',
  }),
  band('Co 3', 'OC-6', 0, [0, 0.5], ELEMENT, 'high', {
    note: 'temperature-independent paramagnetism near 1·10⁻⁴ cm³/mol; read as zero',
  }),
  band('Co 3', 'OC-6', 4, [5.2, 5.5], ELEMENT, 'low', { note: '[CoF6]³⁻ only' }),
  band('Co 2', 'OC-6', 3, [4.3, 5.2], CLASSIC, 'high', {
    wider: [4.3, 5.5],
    seen: `4.4–5.2, ${NCERT}; 4.8, ${ASHCROFT}`,
    note: 'T ground term: large orbital part, falls on cooling',
  }),
  band('Co 2', 'T-4', 3, [4.2, 4.8], COBALT, 'high', {
    note: 'A₂ ground term, raised by second-order mixing, more so in a weak field',
  }),
  band('Co 2', 'TBPY-5 SPY-5', 3, [4.2, 5.0], ELEMENT, 'low'),
  band('Co 2', 'OC-6', 1, [1.8, 2.0], CLASSIC, 'medium', { wider: [1.7, 2.1] }),
  band('Co 2', 'SP-4', 1, [2.1, 2.9], ELEMENT, 'medium', { wider: [2.0, 2.9] }),
  band('Ni 3', 'OC-6', 1, [1.8, 2.0], CLASSIC, 'low'),
  band('Ni 2', 'OC-6', 2, [2.8, 3.5], CLASSIC, 'high', {
    seen: `2.9–3.4, ${NCERT}; 3.2, ${ASHCROFT}`,
    note: '2.9–3.3 for regular octahedra',
  }),
  band('Ni 2', 'T-4', 2, [3.2, 4.1], ELEMENT, 'medium', {
    wider: [3.2, 4.2],
    note: '3.5–4.2 for nearly regular tetrahedra, less as the tetrahedron distorts',
  }),
  band('Ni 2', 'SP-4', 0, [0, 0.5], ELEMENT, 'high', { note: 'diamagnetic; read as zero' }),
  band('Ni 2', 'TBPY-5 SPY-5', 2, [3.0, 3.4], ELEMENT, 'low'),
  band('Cu 2', 'OC-6 SPY-5 SP-4', 1, [1.7, 2.2], CLASSIC, 'high', {
    seen: `1.8–2.2, ${NCERT}; 1.9, ${ASHCROFT}`,
    note: 'typically 1.8–2.0 for monomers; paddle-wheel carboxylates about 1.4 per copper at 300 K',
  }),
  band('Cu 2', 'T-4', 1, [1.9, 2.2], ELEMENT, 'medium', { note: 'usually flattened' }),
  band('Zn 2', 'any', 0, [0, 0.5], 'closed shell', 'high', {
    note: 'diamagnetic; readings up to 0.5 are read as zero, as for the other diamagnetic ions',
  }),
];
