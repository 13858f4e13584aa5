import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import type { Vector3 } from '@/lib/chemistry/structure';
import { norm } from '@/lib/chemistry/linear-algebra';
import { angleVarianceDegrees2 } from '@/lib/geometry/angle-variance';
import { baurDistortion } from '@/lib/geometry/baur-distortion';
import { cisAngles } from '@/lib/geometry/cis-angles';
import { continuousShapeMeasure } from '@/lib/geometry/continuous-shape-measure';
import { idealPolyhedra, requireIdealPolyhedron } from '@/lib/geometry/ideal-polyhedra';
import { interconversionPath } from '@/lib/geometry/interconversion-path';
import { meanSquareDistortion } from '@/lib/geometry/mean-square-distortion';
import { quadraticElongation } from '@/lib/geometry/quadratic-elongation';
import { sigmaDegrees } from '@/lib/geometry/sigma';
import { sphereAngles } from '@/lib/geometry/sphere-angles';
import { sphereShapes } from '@/lib/geometry/sphere-shapes';
import { tau4, tau4FromAngles } from '@/lib/geometry/tau4';
import { tau4Prime, tau4PrimeFromAngles } from '@/lib/geometry/tau4-prime';
import { tau5, tau5FromAngles } from '@/lib/geometry/tau5';
import { thetaDegrees } from '@/lib/geometry/theta';

/**
 * Reference values kept beside the project; each entry names its own source, which stands in the test's name.
 * Without the folder only the values written out below are checked.
 */
const file = path.resolve(process.cwd(), '../shared/reference/geometry.json');
const present = existsSync(file);

const points = z.array(z.array(z.number()));
const loose = z.record(z.string(), z.unknown());
const referenceSchema = z.object({
  ideal_polyhedra: z.array(
    z.object({ id: z.string(), source: z.string(), vertices_unit_bond_length: points }),
  ),
  cshm_pairs: z.array(
    z.object({
      a: z.string(),
      b: z.string(),
      expected_with_centre: z.number(),
      tolerance: z.number(),
      source: z.string(),
      published_value: z.number().optional(),
      published_source: z.string().optional(),
    }),
  ),
  cshm_path_structures: z.array(
    z.object({
      path: z.string(),
      a: z.string(),
      b: z.string(),
      vertices: points,
      expected_S_a_vertices_only: z.number(),
      expected_S_b_vertices_only: z.number(),
      angle_theta_ab_degree: z.number(),
      expected_path_deviation_percent: z.number(),
      tolerance: z.number(),
      source: z.string(),
    }),
  ),
  tau4_cases: z.array(
    z.object({
      case: z.string(),
      alpha_degree: z.number(),
      beta_degree: z.number(),
      expected_tau4_with_141: z.number(),
      expected_tau4_prime: z.number(),
      tolerance: z.number(),
      source: z.string(),
      published: z.object({ tau4: z.number().optional(), source: z.string() }).optional(),
    }),
  ),
  tau5_cases: z.array(
    z.object({
      case: z.string(),
      alpha_degree: z.number(),
      beta_degree: z.number(),
      expected_tau5: z.number(),
      tolerance: z.number(),
      source: z.string(),
    }),
  ),
  bond_length_cases: z.array(
    z.object({
      case: z.string(),
      bond_lengths_angstrom: z.array(z.number()),
      expected_mean_angstrom: z.number(),
      expected_baur_D: z.number(),
      expected_delta: z.number(),
      tolerance_relative: z.number(),
      source: z.string(),
    }),
  ),
  octahedron_cases: z.array(loose),
  tetrahedron_cases: z.array(loose),
  five_coordinate_cases: z.array(loose),
  real_structures: z.array(loose),
});

const reference = present ? referenceSchema.parse(JSON.parse(readFileSync(file, 'utf8'))) : null;

function toVectors(rows: readonly (readonly number[])[]): Vector3[] {
  return rows.map(([x = NaN, y = NaN, z3 = NaN]) => [x, y, z3]);
}

const sphereSchema = z.object({
  case: z.string(),
  ligand_positions_angstrom: points,
  tolerance_relative: z.number(),
  source: z.string(),
  coordinates_source: z.string().optional(),
});

/** Values that a paper itself prints for the same site, recalled from it. */
const publishedSchema = z.object({
  published_compare: z
    .object({
      quadratic_elongation: z.number().optional(),
      bond_angle_variance_degree2: z.number().optional(),
      source: z.string(),
    })
    .nullish(),
});

/** Relative tolerance with a floor for values near zero: the coordinates are printed to 1e-6 Å. */
function expectClose(actual: number | null | undefined, expected: number, relative: number, floor: number) {
  expect(actual).not.toBeNull();
  expect(Math.abs((actual ?? NaN) - expected)).toBeLessThanOrEqual(
    Math.max(floor, relative * Math.abs(expected)),
  );
}

/** How each printed value is calculated here, and the floor below which printed digits carry nothing. */
const calculations: Record<string, { value: (donors: Vector3[]) => number | null; floor: number }> = {
  expected_mean_bond_length_angstrom: {
    value: (d) => d.reduce((s, v) => s + norm(v), 0) / d.length,
    floor: 1e-5,
  },
  expected_baur_D: { value: (d) => baurDistortion(d.map(norm)), floor: 1e-6 },
  expected_delta: { value: (d) => meanSquareDistortion(d.map(norm)), floor: 2e-8 },
  expected_tau5: { value: tau5, floor: 1e-4 },
  expected_tau4_prime: { value: tau4Prime, floor: 1e-4 },
  // The file prints τ₄ with the exact divisor, the program uses the published one.
  expected_tau4: { value: (d) => ((tau4(d) ?? NaN) * 141) / 141.0575588, floor: 1e-4 },
  expected_sigma_degree: { value: sigmaDegrees, floor: 2e-3 },
  // Azimuths stop carrying digits when the twist is near zero.
  expected_theta_degree: { value: thetaDegrees, floor: 5e-3 },
  expected_bond_angle_variance_degree2: { value: angleVarianceDegrees2, floor: 1e-3 },
  expected_quadratic_elongation: { value: quadraticElongation, floor: 1e-5 },
};

describe.skipIf(!present)('published and independently calculated geometry values', () => {
  describe('ideal polyhedra', () => {
    for (const entry of reference?.ideal_polyhedra ?? []) {
      const ideal = idealPolyhedra.find((candidate) => candidate.id === entry.id);
      if (!ideal) continue;
      it(`${entry.id} has the vertices of: ${entry.source}`, () => {
        const shape = continuousShapeMeasure(toVectors(entry.vertices_unit_bond_length), ideal);
        expect(shape?.measure).toBeLessThan(1e-9);
        for (const vertex of ideal.vertices) expect(norm(vertex)).toBeCloseTo(1, 12);
      });
    }

    it('covers every reference shape that has a symbol', () => {
      const missing = (reference?.ideal_polyhedra ?? [])
        .map((entry) => entry.id)
        .filter((id) => !idealPolyhedra.some((ideal) => ideal.id === id));
      expect(missing).toEqual(['TBPY-5 less one axial']);
    });
  });

  describe('shape measures of pairs of ideal polyhedra, both ways, metal included', () => {
    const verticesOf = (id: string) =>
      toVectors(reference?.ideal_polyhedra.find((entry) => entry.id === id)?.vertices_unit_bond_length ?? []);
    for (const pair of reference?.cshm_pairs ?? []) {
      for (const [from, to] of [
        [pair.a, pair.b],
        [pair.b, pair.a],
      ] as const) {
        const ideal = idealPolyhedra.find((candidate) => candidate.id === to);
        if (!ideal) continue;
        it(`S(${from}, ${to}) = ${pair.expected_with_centre}: ${pair.published_source ?? pair.source}`, () => {
          const measure = continuousShapeMeasure(verticesOf(from), ideal)?.measure;
          expectClose(measure, pair.expected_with_centre, 0, 1e-4);
          if (pair.published_value !== undefined) expectClose(measure, pair.published_value, 0, 6e-3);
        });
      }
    }
  });

  describe('structures on minimal-distortion paths', () => {
    for (const entry of reference?.cshm_path_structures ?? []) {
      it(`${entry.path}: ${entry.source}`, () => {
        const donors = toVectors(entry.vertices);
        const a = continuousShapeMeasure(donors, requireIdealPolyhedron(entry.a))?.measure;
        const b = continuousShapeMeasure(donors, requireIdealPolyhedron(entry.b))?.measure;
        // The centroid of these vertices is the metal, so measures with and without it agree.
        expectClose(a, entry.expected_S_a_vertices_only, 0, entry.tolerance);
        expectClose(b, entry.expected_S_b_vertices_only, 0, entry.tolerance);
        const place = interconversionPath(donors.length, sphereShapes(donors));
        const coordinate = Number(/coordinate (\d+) %/.exec(entry.path)?.[1]);
        expectClose(place?.coordinatePercent, coordinate, 0, 0.01);
        expectClose(place?.deviationPercent, entry.expected_path_deviation_percent, 0, 0.02);
      });
    }
  });

  describe('τ₄ and τ₄′ from angles', () => {
    for (const entry of reference?.tau4_cases ?? []) {
      it(`${entry.case}: ${entry.published?.source ?? entry.source}`, () => {
        const larger = Math.max(entry.alpha_degree, entry.beta_degree);
        const smaller = Math.min(entry.alpha_degree, entry.beta_degree);
        expectClose(tau4FromAngles(larger, smaller), entry.expected_tau4_with_141, 0, entry.tolerance);
        expectClose(tau4PrimeFromAngles(larger, smaller), entry.expected_tau4_prime, 0, entry.tolerance);
        if (entry.published?.tau4 !== undefined) {
          expectClose(tau4FromAngles(larger, smaller), entry.published.tau4, 0, 5e-3);
        }
      });
    }
  });

  describe('τ₅ from angles', () => {
    for (const entry of reference?.tau5_cases ?? []) {
      it(`${entry.case}: ${entry.source}`, () => {
        expectClose(
          tau5FromAngles(entry.beta_degree, entry.alpha_degree),
          entry.expected_tau5,
          0,
          entry.tolerance,
        );
      });
    }
  });

  describe('bond-length distortion', () => {
    for (const entry of reference?.bond_length_cases ?? []) {
      it(`${entry.case}: ${entry.source}`, () => {
        expectClose(
          baurDistortion(entry.bond_lengths_angstrom),
          entry.expected_baur_D,
          entry.tolerance_relative,
          1e-9,
        );
        expectClose(
          meanSquareDistortion(entry.bond_lengths_angstrom),
          entry.expected_delta,
          entry.tolerance_relative,
          1e-12,
        );
      });
    }
  });

  const spheres = [
    ...(reference?.octahedron_cases ?? []),
    ...(reference?.tetrahedron_cases ?? []),
    ...(reference?.five_coordinate_cases ?? []),
    ...(reference?.real_structures ?? []),
  ];
  describe('whole spheres', () => {
    for (const raw of spheres) {
      const sphere = sphereSchema.parse(raw);
      it(`${sphere.case}: ${sphere.coordinates_source ?? sphere.source}`, () => {
        const donors = toVectors(sphere.ligand_positions_angstrom);
        let checked = 0;
        for (const [key, expected] of Object.entries(raw)) {
          if (typeof expected !== 'number') continue;
          const shape = /^expected_cshm_(.+)_with_centre$/.exec(key)?.[1];
          if (shape !== undefined) {
            const measure = continuousShapeMeasure(donors, requireIdealPolyhedron(shape))?.measure;
            expectClose(measure, expected, 0, 2e-4);
            checked += 1;
          }
          const calculation = calculations[key];
          if (calculation) {
            expectClose(calculation.value(donors), expected, sphere.tolerance_relative, calculation.floor);
            checked += 1;
          }
        }
        const printedAngles = raw.expected_cis_angles_degree ?? raw.expected_angles_degree;
        if (Array.isArray(printedAngles)) {
          const own =
            'expected_cis_angles_degree' in raw
              ? cisAngles(donors)
              : sphereAngles(donors).map((a) => a.degrees);
          const sorted = (angles: readonly unknown[]) => angles.map(Number).sort((a, b) => a - b);
          sorted(printedAngles).forEach((angle, i) => expectClose(sorted(own)[i], angle, 0, 2e-3));
          checked += 1;
        }
        const printed = publishedSchema.parse(raw).published_compare;
        if (printed?.quadratic_elongation !== undefined) {
          expectClose(quadraticElongation(donors), printed.quadratic_elongation, 0, 6e-4);
        }
        // The paper's cell differs a little from the one of the coordinates: 2 per cent.
        if (printed?.bond_angle_variance_degree2 !== undefined) {
          expectClose(angleVarianceDegrees2(donors), printed.bond_angle_variance_degree2, 0.02, 0);
        }
        expect(checked).toBeGreaterThan(4);
      });
    }
  });
});

describe('closed forms', () => {
  const measure = (from: string, to: string) =>
    continuousShapeMeasure(requireIdealPolyhedron(from).vertices, requireIdealPolyhedron(to))?.measure;

  it('S(SP-4, T-4) = 100/3 (Keinan & Avnir, Inorg. Chem. 2001, 40, 318; from memory, closed form checked)', () => {
    expect(measure('SP-4', 'T-4')).toBeCloseTo(100 / 3, 9);
    expect(measure('T-4', 'SP-4')).toBeCloseTo(100 / 3, 9);
  });

  it('S(OC-6, TPR-6) = 100(4 − 2√2)/7 (Alvarez et al., New J. Chem. 2002, 26, 996: 16.737)', () => {
    expect(measure('OC-6', 'TPR-6')).toBeCloseTo((100 * (4 - 2 * Math.SQRT2)) / 7, 9);
  });

  it('S(TP-3, TPY-3) = 100/33 with the metal (closed form)', () => {
    expect(measure('TP-3', 'TPY-3')).toBeCloseTo(100 / 33, 9);
  });
});
