import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import type { Vector3 } from '@/lib/chemistry/structure';
import { elementSymbol } from '@/lib/chemistry/elements';
import { describeCentres } from '@/lib/geometry/describe-centres';

/**
 * Last geometries of the project's own NWChem runs against indices calculated independently by brute force
 * (geometry.json beside the outputs), and against what a chemist would say of each.
 */
const folder = path.resolve(process.cwd(), '../shared/demo');
const truthFile = path.join(folder, 'geometry.json');
const present = existsSync(truthFile);

const truthSchema = z.array(
  z.object({
    file: z.string(),
    element: z.string(),
    coordinationNumber: z.number(),
    distancesAngstrom: z.array(z.number()),
    meanDistanceAngstrom: z.number(),
    baurDistortion: z.number(),
    meanSquareDistortion: z.number(),
    tau4: z.number().optional(),
    tau4Prime: z.number().optional(),
    sigmaDegrees: z.number().optional(),
    angleVarianceDegrees2: z.number().optional(),
    shapes: z.record(z.string(), z.number()),
  }),
);
const truth = present ? truthSchema.parse(JSON.parse(readFileSync(truthFile, 'utf8'))) : [];

/** The last "Output coordinates in angstroms" block, e.g. `    1 Cl   17.0000   0.00000000  1.2  -1.3`. */
function lastGeometry(file: string): { elements: string[]; positionsAngstrom: Vector3[] } {
  const text = readFileSync(path.join(folder, file), 'utf8');
  const block = text.slice(text.lastIndexOf('Output coordinates in angstroms'));
  const elements: string[] = [];
  const positionsAngstrom: Vector3[] = [];
  for (const line of block.split('\n').slice(1)) {
    const row = /^\s+\d+\s+([A-Za-z]+)\s+[\d.]+\s+(-?[\d.]+)\s+(-?[\d.]+)\s+(-?[\d.]+)\s*$/.exec(line);
    if (!row && elements.length > 0) break;
    if (!row) continue;
    elements.push(elementSymbol(row[1] ?? '') ?? '');
    positionsAngstrom.push([Number(row[2]), Number(row[3]), Number(row[4])]);
  }
  return { elements, positionsAngstrom };
}

const centreOf = (file: string) => describeCentres(lastGeometry(file))[0];

describe.skipIf(!present)('calculated structures of the demo', () => {
  it('come from at least ten outputs', () => {
    expect(truth.length).toBeGreaterThan(10);
  });

  for (const entry of truth) {
    it(`${entry.file} agrees with the independent calculation`, () => {
      const centre = centreOf(entry.file);
      expect(centre?.element).toBe(entry.element);
      expect(centre?.coordinationNumber).toBe(entry.coordinationNumber);
      entry.distancesAngstrom.forEach((d, i) =>
        expect(centre?.donors[i]?.distanceAngstrom).toBeCloseTo(d, 5),
      );
      expect(centre?.meanDistanceAngstrom).toBeCloseTo(entry.meanDistanceAngstrom, 6);
      expect(centre?.baurDistortion).toBeCloseTo(entry.baurDistortion, 6);
      expect(centre?.meanSquareDistortion).toBeCloseTo(entry.meanSquareDistortion, 7);
      // The table uses the exact divisor of τ₄.
      if (entry.tau4 !== undefined) {
        expect(((centre?.tau4 ?? NaN) * 141) / 141.0575588).toBeCloseTo(entry.tau4, 5);
      }
      if (entry.tau4Prime !== undefined) expect(centre?.tau4Prime).toBeCloseTo(entry.tau4Prime, 5);
      if (entry.sigmaDegrees !== undefined) expect(centre?.sigmaDegrees).toBeCloseTo(entry.sigmaDegrees, 3);
      if (entry.angleVarianceDegrees2 !== undefined) {
        expect(centre?.angleVarianceDegrees2).toBeCloseTo(entry.angleVarianceDegrees2, 3);
      }
      for (const [id, measure] of Object.entries(entry.shapes)) {
        const own = centre?.shapes?.find((shape) => shape.id === id)?.measure;
        expect(own, id).toBeCloseTo(measure, 4);
      }
    });
  }

  it('calls tetrachlorocuprate(II) a flattened tetrahedron on the way to the square plane', () => {
    const centre = centreOf('nwchem/cucl4_m2.out');
    expect(centre?.tau4).toBeGreaterThan(0.6);
    expect(centre?.tau4).toBeLessThan(0.8);
    expect(centre?.path?.from).toBe('SP-4');
    expect(Math.abs(centre?.path?.deviationPercent ?? NaN)).toBeLessThan(5);
  });

  it('calls the singlet tetrachloronickelate(II) square planar and the triplet tetrahedral', () => {
    expect(centreOf('nwchem/nicl4_sp_m1.out')?.nearest).toBe('SP-4');
    expect(centreOf('nwchem/nicl4_m3.out')?.nearest).toBe('T-4');
  });

  it('finds the low-spin hexaaqua cobalt(II) strongly elongated and the high-spin one nearly regular', () => {
    const [doublet, quartet] = [centreOf('nwchem/co_h2o_6_m2.out'), centreOf('nwchem/co_h2o_6_m4.out')];
    expect(doublet?.axial?.kind).toBe('elongated');
    expect(doublet?.axial?.tetragonality).toBeLessThan(0.9);
    expect(quartet?.baurDistortion).toBeLessThan(0.02);
    expect(doublet?.nearest).toBe('OC-6');
  });

  it('finds both hexaaqua copper(II) runs compressed: two short and four long distances', () => {
    for (const file of ['nwchem/cu_h2o_6_m2.out', 'nwchem/cu_h2o_6_m2_compressed.out']) {
      expect(centreOf(file)?.axial?.kind, file).toBe('compressed');
    }
  });

  it('shortens Fe–O by more than 0.1 Å from the quintet to the singlet of hexaaqua iron(II)', () => {
    const [high, low] = [centreOf('nwchem/fe_h2o_6_m5.out'), centreOf('nwchem/fe_h2o_6_m1.out')];
    expect((high?.meanDistanceAngstrom ?? NaN) - (low?.meanDistanceAngstrom ?? NaN)).toBeGreaterThan(0.1);
  });
});
