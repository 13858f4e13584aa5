import { describe, expect, it } from 'vitest';
import type { Structure, Vector3 } from '@/lib/chemistry/structure';
import type { CentreDescription } from '@/lib/geometry/centre-description';
import { centreDescriptionSchema } from '@/lib/geometry/centre-description';
import { describeCentres } from '@/lib/geometry/describe-centres';
import {
  moved,
  randomDonors,
  randomRotation,
  seededRandom,
  shuffled,
  sphereStructure,
} from './random-structures';

const scalars = [
  'meanDistanceAngstrom',
  'baurDistortion',
  'meanSquareDistortion',
  'tau4',
  'tau4Prime',
  'tau5',
  'sigmaDegrees',
  'thetaDegrees',
  'angleVarianceDegrees2',
  'quadraticElongation',
] as const;

function centre(structure: Structure): CentreDescription {
  const [first] = describeCentres(structure);
  if (!first) throw new Error('no centre');
  return first;
}

/** Every number of the two descriptions within the tolerance, relative above 1. */
function expectSame(a: CentreDescription, b: CentreDescription, tolerance: number) {
  expect(b.coordinationNumber).toBe(a.coordinationNumber);
  const close = (x: number | null | undefined, y: number | null | undefined, name: string) => {
    if (x === null || x === undefined) expect(y ?? null, name).toBeNull();
    else expect(Math.abs((y ?? NaN) - x), name).toBeLessThanOrEqual(tolerance * Math.max(1, Math.abs(x)));
  };
  for (const key of scalars) close(a[key], b[key], key);
  for (const shape of a.shapes ?? []) {
    close(shape.measure, b.shapes?.find((other) => other.id === shape.id)?.measure, shape.id);
  }
  close(a.path?.coordinatePercent, b.path?.coordinatePercent, 'coordinate');
  close(a.axial?.tetragonality, b.axial?.tetragonality, 'tetragonality');
  close(a.planeDisplacement?.distanceAngstrom, b.planeDisplacement?.distanceAngstrom, 'displacement');
}

const numbers = [2, 3, 4, 5, 6, 7, 8, 9];

describe.each(numbers)('a random sphere of %i donors', (n) => {
  const random = seededRandom(1000 + n);
  const spheres = Array.from({ length: n > 7 ? 4 : 12 }, () =>
    sphereStructure('Fe', 'O', randomDonors(n, random)),
  );

  it('is described alike after rotation and translation', () => {
    for (const sphere of spheres) {
      const other = moved(sphere, randomRotation(random), [random() * 50, -random() * 50, 7]);
      expectSame(centre(sphere), centre(other), 1e-8);
    }
  });

  it('is described alike with its atoms in another order', () => {
    for (const sphere of spheres) {
      const order = shuffled(
        sphere.elements.map((_, i) => i),
        random,
      );
      const other: Structure = {
        elements: order.map((i) => sphere.elements[i] ?? ''),
        positionsAngstrom: order.map((i): Vector3 => sphere.positionsAngstrom[i] ?? [0, 0, 0]),
      };
      expectSame(centre(sphere), centre(other), 1e-8);
    }
  });

  it('keeps every index without unit when all distances grow by one factor', () => {
    for (const sphere of spheres) {
      const factor = 1.04;
      const other: Structure = {
        elements: sphere.elements,
        positionsAngstrom: sphere.positionsAngstrom.map(
          ([x, y, z]): Vector3 => [x * factor, y * factor, z * factor],
        ),
      };
      const [a, b] = [centre(sphere), centre(other)];
      const unscaled = {
        ...b,
        meanDistanceAngstrom: (b.meanDistanceAngstrom ?? NaN) / factor,
        planeDisplacement: b.planeDisplacement && a.planeDisplacement,
      };
      expectSame(a, unscaled, 1e-8);
    }
  });

  it('changes no index by more than its bound when every atom moves by up to 1e-6 Å', () => {
    const step = 1e-6;
    // Bounds for distances above 1.9 Å and gaps above 35°: an angle changes by at most 2 · step/1.9 Å per end,
    // 1.3e-4 degrees; sums of 12 and 24 angles by that many times (Θ also by the tilt of the axis and the
    // nearness of a donor to it: a factor of ten); S, D, Δ and ⟨λ⟩ by a few hundred times step.
    const bounds: Record<(typeof scalars)[number], number> = {
      meanDistanceAngstrom: 2 * step,
      baurDistortion: 4 * step,
      meanSquareDistortion: 4 * step,
      tau4: 4e-6,
      tau4Prime: 5e-6,
      tau5: 1e-5,
      sigmaDegrees: 2e-3,
      thetaDegrees: 4e-2,
      angleVarianceDegrees2: 4e-2,
      quadraticElongation: 1e-3,
    };
    for (const sphere of spheres) {
      const other: Structure = {
        elements: sphere.elements,
        positionsAngstrom: sphere.positionsAngstrom.map((position) => {
          const shake = () => (2 * random() - 1) * (step / Math.sqrt(3));
          return [position[0] + shake(), position[1] + shake(), position[2] + shake()] as const;
        }),
      };
      const [a, b] = [centre(sphere), centre(other)];
      for (const key of scalars) {
        if (a[key] === null) expect(b[key]).toBeNull();
        else expect(Math.abs((b[key] ?? NaN) - a[key]), key).toBeLessThanOrEqual(bounds[key]);
      }
      for (const shape of a.shapes ?? []) {
        const after = b.shapes?.find((candidate) => candidate.id === shape.id)?.measure ?? NaN;
        expect(Math.abs(after - shape.measure), shape.id).toBeLessThanOrEqual(4e-4);
      }
    }
  });

  it('has a description that fits its schema and survives JSON', () => {
    const description = centre(spheres[0] ?? sphereStructure('Fe', 'O', []));
    expect(centreDescriptionSchema.parse(JSON.parse(JSON.stringify(description)))).toEqual(description);
  });
});
