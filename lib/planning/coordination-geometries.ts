/** A coordination polyhedron that the planner proposes. `usual` is false for the seldom ones. */
export interface CoordinationGeometry {
  symbol: string;
  name: string;
  coordinationNumber: number;
  usual: boolean;
}

const polyhedron = (symbol: string, name: string, coordinationNumber: number, usual = true) => ({
  symbol,
  name,
  coordinationNumber,
  usual,
});

/** Polyhedra with their IUPAC symbols (Red Book 2005, table IR-9.3), by coordination number. */
export const coordinationGeometries: readonly CoordinationGeometry[] = [
  polyhedron('L-2', 'linear', 2),
  polyhedron('TP-3', 'trigonal plane', 3),
  polyhedron('T-4', 'tetrahedron', 4),
  polyhedron('SP-4', 'square plane', 4),
  polyhedron('TBPY-5', 'trigonal bipyramid', 5),
  polyhedron('SPY-5', 'square pyramid', 5),
  polyhedron('OC-6', 'octahedron', 6),
  polyhedron('TPR-6', 'trigonal prism', 6, false),
  polyhedron('PBPY-7', 'pentagonal bipyramid', 7),
  polyhedron('SAPR-8', 'square antiprism', 8),
];

export const findGeometry = (symbol: string): CoordinationGeometry | undefined =>
  coordinationGeometries.find((item) => item.symbol === symbol);

export const geometriesFor = (coordinationNumber: number): readonly CoordinationGeometry[] =>
  coordinationGeometries.filter((item) => item.coordinationNumber === coordinationNumber);
