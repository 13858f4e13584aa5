/** One polyhedral symbol of IUPAC (Red Book 2005, table IR-9.2) with the corners to draw it from. */
export interface Polyhedron {
  name: string;
  /** Corners around the metal at the origin; z is up. */
  corners: readonly (readonly [x: number, y: number, z: number])[];
  /** Turn about z, then tilt towards the reader, degrees. */
  azimuth: number;
  elevation: number;
  /** Flat shapes and those that are seen by their bonds show the bonds as well. */
  bonds?: 'thin' | 'strong';
}

const degrees = Math.PI / 180;

/** Corners on a ring: angles in degrees, height z, radius filling the unit sphere unless given. */
function ring(angles: readonly number[], z = 0, radius = Math.sqrt(1 - z * z)) {
  return angles.map(
    (angle) => [radius * Math.cos(angle * degrees), radius * Math.sin(angle * degrees), z] as const,
  );
}

const up = [0, 0, 1] as const;
const down = [0, 0, -1] as const;

export const polyhedra = {
  'L-2': { name: 'line', corners: ring([0, 180]), azimuth: 28, elevation: 26, bonds: 'strong' },
  'A-2': { name: 'bent', corners: ring([30, 150]), azimuth: 0, elevation: 60, bonds: 'strong' },
  'TP-3': { name: 'triangle', corners: ring([90, 210, 330]), azimuth: 18, elevation: 34, bonds: 'thin' },
  'T-4': { name: 'tetrahedron', corners: [up, ...ring([90, 210, 330], -1 / 3)], azimuth: 18, elevation: 14 },
  'SP-4': {
    name: 'square plane',
    corners: ring([0, 90, 180, 270]),
    azimuth: 28,
    elevation: 26,
    bonds: 'thin',
  },
  'SS-4': {
    name: 'see-saw',
    corners: [up, down, ...ring([210, 330])],
    azimuth: 163,
    elevation: 20,
    bonds: 'strong',
  },
  'TBPY-5': {
    name: 'trigonal bipyramid',
    corners: [up, down, ...ring([90, 210, 330])],
    azimuth: -14,
    elevation: 16,
  },
  'SPY-5': {
    name: 'square pyramid',
    corners: [up, ...ring([45, 135, 225, 315], -0.25)],
    azimuth: -17,
    elevation: 16,
  },
  'OC-6': {
    name: 'octahedron',
    corners: [up, down, ...ring([0, 90, 180, 270])],
    azimuth: -20,
    elevation: 18,
  },
  'TPR-6': {
    name: 'trigonal prism',
    corners: [...ring([-90, 30, 150], 0.6547), ...ring([-90, 30, 150], -0.6547)],
    azimuth: -18,
    elevation: 20,
  },
  'PBPY-7': {
    name: 'pentagonal bipyramid',
    corners: [up, down, ...ring([0, 72, 144, 216, 288])],
    azimuth: -14,
    elevation: 18,
  },
  'CU-8': {
    name: 'cube',
    corners: [...ring([0, 90, 180, 270], 0.5774), ...ring([0, 90, 180, 270], -0.5774)],
    azimuth: -22,
    elevation: 20,
  },
  'SAPR-8': {
    name: 'square antiprism',
    corners: [...ring([0, 90, 180, 270], 0.5103), ...ring([45, 135, 225, 315], -0.5103)],
    azimuth: -20,
    elevation: 20,
  },
} as const satisfies Record<string, Polyhedron>;

/** T-4 pressed along a twofold axis: corners of a cube, taken alternately, with z × 0.55. */
export const flattenedTetrahedron: Polyhedron = {
  name: 'flattened tetrahedron',
  corners: [
    [1, 1, 0.55],
    [-1, -1, 0.55],
    [1, -1, -0.55],
    [-1, 1, -0.55],
  ],
  azimuth: 18,
  elevation: 14,
};

/** The polyhedron of a symbol, or null for one that has no drawing here. */
export function findPolyhedron(symbol: string, flattened = false): Polyhedron | null {
  if (symbol === 'T-4' && flattened) return flattenedTetrahedron;
  return symbol in polyhedra ? polyhedra[symbol as keyof typeof polyhedra] : null;
}
