import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { describeCentres } from '@/lib/geometry/describe-centres';
import { readXyz } from '@/lib/structures/read-xyz';

/** Fifty distorted spheres with indices calculated independently by brute force, read in place. */
const folder = path.resolve(process.cwd(), '../shared/spheres');
const present = existsSync(path.join(folder, 'truth.json'));

const truthSchema = z.array(
  z.object({
    file: z.string(),
    element: z.string(),
    coordinationNumber: z.number(),
    meanDistanceAngstrom: z.number(),
    baurDistortion: z.number(),
    meanSquareDistortion: z.number(),
    tau4: z.number().optional(),
    tau4Prime: z.number().optional(),
    tau5: z.number().optional(),
    sigmaDegrees: z.number().optional(),
    angleVarianceDegrees2: z.number().optional(),
    shapes: z.record(z.string(), z.number()),
  }),
);
const truth = present
  ? truthSchema.parse(JSON.parse(readFileSync(path.join(folder, 'truth.json'), 'utf8')))
  : [];

/** The table's τ₄ has the exact divisor 360° − 2 arccos(−1/3), the program's the published 141°. */
const exactDivisor = 360 - (2 * Math.acos(-1 / 3) * 180) / Math.PI;

const tolerances = {
  meanDistanceAngstrom: 1e-5,
  baurDistortion: 1e-6,
  meanSquareDistortion: 1e-6,
  tau4Prime: 1e-5,
  tau5: 1e-5,
  sigmaDegrees: 1e-3,
  angleVarianceDegrees2: 1e-3,
} as const;

describe.skipIf(!present)('distorted spheres calculated by brute force', () => {
  it.each(truth.map((entry) => [entry.file, entry] as const))('%s', (file, entry) => {
    const frames = readXyz(readFileSync(path.join(folder, file), 'utf8'));
    if (!frames.ok) throw new Error(frames.error.message);
    const centre = describeCentres(frames.value[0] ?? { elements: [], positionsAngstrom: [] })[0];
    expect(centre?.element).toBe(entry.element);
    expect(centre?.coordinationNumber).toBe(entry.coordinationNumber);
    for (const [key, tolerance] of Object.entries(tolerances) as [keyof typeof tolerances, number][]) {
      const expected = entry[key];
      if (expected === undefined) continue;
      expect(Math.abs((centre?.[key] ?? NaN) - expected), key).toBeLessThanOrEqual(tolerance);
    }
    if (entry.tau4 !== undefined) {
      expect(Math.abs(((centre?.tau4 ?? NaN) * 141) / exactDivisor - entry.tau4)).toBeLessThanOrEqual(1e-5);
    }
    for (const [id, measure] of Object.entries(entry.shapes)) {
      const own = centre?.shapes?.find((shape) => shape.id === id)?.measure ?? NaN;
      expect(Math.abs(own - measure), id).toBeLessThanOrEqual(1e-5);
    }
  });
});
