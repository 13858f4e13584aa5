import type { Vector3 } from '../chemistry/structure';

/**
 * Ideal coordination polyhedra with the metal at the origin and every metal–vertex distance 1.
 * Symbols: IUPAC Red Book 2005, Table IR-9.3 (CSAPR-9 is formed by the same rule and stands in later
 * tables). One symbol may cover several shapes; then `variant` says which angle was taken and `id`
 * carries it. Coordinates are elementary geometry unless `source` names a paper.
 */
export interface IdealPolyhedron {
  /** Unique: the symbol, with the angle where one symbol covers several shapes. */
  id: string;
  symbol: string;
  name: string;
  /** The choice behind a symbol that fixes no single shape, or null. */
  variant: string | null;
  source: string;
  vertices: readonly Vector3[];
}

const RED_BOOK = 'IUPAC Red Book 2005, Table IR-9.3; coordinates: elementary geometry';
const DREW = 'M. G. B. Drew, Prog. Inorg. Chem. 1977, 23, 67 (angles from memory)';
const HOARD = 'J. L. Hoard & J. V. Silverton, Inorg. Chem. 1963, 2, 235 (angles from memory)';

const radians = (degrees: number) => (degrees * Math.PI) / 180;
const degrees = (angle: number) => (angle * 180) / Math.PI;

/** Polar angle from z and azimuth from x, degrees. */
function vertex(polar: number, azimuth: number): Vector3 {
  const [p, a] = [radians(polar), radians(azimuth)];
  return [Math.sin(p) * Math.cos(a), Math.sin(p) * Math.sin(a), Math.cos(p)];
}

/** `count` vertices evenly spaced round z. */
function ring(count: number, polar: number, firstAzimuth = 0): Vector3[] {
  return Array.from({ length: count }, (_, i) => vertex(polar, firstAzimuth + (360 / count) * i));
}

const zenith: Vector3 = [0, 0, 1];
const nadir: Vector3 = [0, 0, -1];
const t = 1 / Math.sqrt(3);
const tetrahedron: readonly [Vector3, Vector3, Vector3, Vector3] = [
  [t, t, t],
  [t, -t, -t],
  [-t, t, -t],
  [-t, -t, t],
];
const octahedron: readonly [Vector3, Vector3, Vector3, Vector3, Vector3, Vector3] = [
  [1, 0, 0],
  [-1, 0, 0],
  [0, 1, 0],
  [0, -1, 0],
  zenith,
  nadir,
];
const bipyramid: readonly [Vector3, Vector3, Vector3, Vector3, Vector3] = [
  zenith,
  nadir,
  [1, 0, 0],
  vertex(90, 120),
  vertex(90, 240),
];

/** Equal edges: the height of the prism is the side of its triangles. */
const prismPolar = degrees(Math.atan(2 / Math.sqrt(3)));
/** Equal edges: 2 sin²θ = 4 cos²θ + 2 sin²θ (1 − cos 45°). */
const antiprismPolar = degrees(Math.atan(2 ** 0.75));
/** Eighteen equal edges: 3 sin²θ = 2 − sin θ, so sin θ = 2/3. */
const tricappedPolar = degrees(Math.asin(2 / 3));
/** Centroid of the five vertices on the metal: 1 + 4 cos θ = 0. */
const balancedPyramidPolar = degrees(Math.acos(-1 / 4));
/**
 * Sixteen equal edges (cap–upper, upper–lower, lower–lower): with c the cosine of the lower polar angle,
 * the upper one has cosine c², and c²(1 − c) = √((1 − c⁴)(1 − c²)/2). Root by bisection.
 */
const cappedAntiprismLower = (() => {
  const excess = (c: number) => c * c * (1 - c) - Math.sqrt(((1 - c ** 4) * (1 - c * c)) / 2);
  let [low, high] = [-0.7, -0.5];
  for (let i = 0; i < 60; i++) {
    const middle = (low + high) / 2;
    if (excess(middle) > 0) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
})();

function polyhedron(
  id: string,
  name: string,
  vertices: readonly Vector3[],
  variant: string | null = null,
  source = RED_BOOK,
): IdealPolyhedron {
  return { id, symbol: id.split('/')[0] ?? id, name, variant, source, vertices };
}

export const idealPolyhedra: readonly IdealPolyhedron[] = [
  polyhedron('L-2', 'linear', [zenith, nadir]),
  polyhedron('A-2/109.47', 'angular', tetrahedron.slice(0, 2), '109.47°: tetrahedron less two vertices'),
  polyhedron('A-2/120', 'angular', bipyramid.slice(2, 4), '120°: trigonal plane less one vertex'),
  polyhedron('TP-3', 'trigonal plane', bipyramid.slice(2)),
  polyhedron('TPY-3', 'trigonal pyramid', tetrahedron.slice(0, 3), '109.47°: tetrahedron less one vertex'),
  polyhedron('TS-3', 'T-shape', octahedron.slice(0, 3)),
  polyhedron('T-4', 'tetrahedron', tetrahedron),
  polyhedron('SP-4', 'square plane', octahedron.slice(0, 4)),
  polyhedron(
    'SS-4/90',
    'see-saw',
    [octahedron[0], octahedron[1], octahedron[2], zenith],
    '180° and 90°: octahedron less two cis vertices',
  ),
  polyhedron(
    'SS-4/120',
    'see-saw',
    bipyramid.slice(0, 4),
    '180° and 120°: trigonal bipyramid less one equatorial vertex',
  ),
  polyhedron('TBPY-5', 'trigonal bipyramid', bipyramid),
  polyhedron(
    'SPY-5/90',
    'square pyramid',
    [zenith, ...octahedron.slice(0, 4)],
    'apex–metal–base 90°: octahedron less one vertex',
  ),
  polyhedron(
    'SPY-5/104.48',
    'square pyramid',
    [zenith, ...ring(4, balancedPyramidPolar)],
    'apex–metal–base 104.48°: centroid of the vertices on the metal',
  ),
  polyhedron('OC-6', 'octahedron', octahedron),
  polyhedron(
    'TPR-6',
    'trigonal prism',
    [...ring(3, prismPolar), ...ring(3, 180 - prismPolar)],
    'nine equal edges',
  ),
  polyhedron('PBPY-7', 'pentagonal bipyramid', [zenith, nadir, ...ring(5, 90)]),
  polyhedron(
    'OCF-7',
    'octahedron, face monocapped',
    [zenith, ...ring(3, 74.6), ...ring(3, 130.3, 60)],
    'polar angles 74.6° and 130.3°',
    DREW,
  ),
  polyhedron(
    'TPRS-7',
    'trigonal prism, square-face monocapped',
    [
      zenith,
      vertex(79.5, 49.5),
      vertex(79.5, -49.5),
      vertex(79.5, 229.5),
      vertex(79.5, 130.5),
      vertex(144.2, 90),
      vertex(144.2, -90),
    ],
    'polar angles 79.5° and 144.2°, azimuth 49.5°',
    DREW,
  ),
  polyhedron('CU-8', 'cube', [
    ...ring(4, degrees(Math.acos(t)), 45),
    ...ring(4, 180 - degrees(Math.acos(t)), 45),
  ]),
  polyhedron(
    'SAPR-8',
    'square antiprism',
    [...ring(4, antiprismPolar), ...ring(4, 180 - antiprismPolar, 45)],
    'sixteen equal edges',
  ),
  polyhedron(
    'DD-8',
    'triangular dodecahedron',
    [...ring(2, 36.85), ...ring(2, 180 - 36.85, 90), ...ring(2, 69.46, 90), ...ring(2, 180 - 69.46)],
    'equal bonds, polar angles 36.85° and 69.46°',
    HOARD,
  ),
  polyhedron('HBPY-8', 'hexagonal bipyramid', [zenith, nadir, ...ring(6, 90)]),
  polyhedron(
    'TPRS-9',
    'trigonal prism, square-face tricapped',
    [...ring(3, tricappedPolar), ...ring(3, 180 - tricappedPolar), ...ring(3, 90, 60)],
    'eighteen equal edges (sine of the polar angle 2/3)',
  ),
  polyhedron(
    'CSAPR-9',
    'square antiprism, square-face monocapped',
    [
      zenith,
      ...ring(4, degrees(Math.acos(cappedAntiprismLower ** 2))),
      ...ring(4, degrees(Math.acos(cappedAntiprismLower)), 45),
    ],
    'sixteen equal edges (polar angles 70.1° and 125.7°)',
    'no entry in IUPAC Red Book 2005, Table IR-9.3; symbol by the same rule; coordinates: elementary geometry',
  ),
];

const byCoordinationNumber = new Map<number, IdealPolyhedron[]>();
for (const ideal of idealPolyhedra) {
  const list = byCoordinationNumber.get(ideal.vertices.length);
  if (list) list.push(ideal);
  else byCoordinationNumber.set(ideal.vertices.length, [ideal]);
}

/** The ideal polyhedra with this number of vertices; [] outside 2 to 9. */
export function idealPolyhedraFor(coordinationNumber: number): readonly IdealPolyhedron[] {
  return byCoordinationNumber.get(coordinationNumber) ?? [];
}

/** Errors: throws RangeError for an id that is not in the table. */
export function requireIdealPolyhedron(id: string): IdealPolyhedron {
  const ideal = idealPolyhedra.find((candidate) => candidate.id === id);
  if (!ideal)
    throw new RangeError(`no ideal polyhedron "${id}"; known: ${idealPolyhedra.map((p) => p.id).join(', ')}`);
  return ideal;
}
