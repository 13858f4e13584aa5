import { readXyz } from '../../lib/structures/read-xyz';
import { writeXyz } from '../../lib/structures/write-xyz';
import type { Structure, Vector3 } from '../../lib/chemistry/structure';
import { describeCentres } from '../../lib/geometry/describe-centres';
import { idealPolyhedraFor } from '../../lib/geometry/ideal-polyhedra';
import { sphereShapes } from '../../lib/geometry/sphere-shapes';

/**
 * Speed of the geometry room on one core: six-coordinate centres per second with every index, the time of
 * one centre per coordination number, and a 10,000-atom cut-out. Random distortions are seeded.
 */
export function run(): void {
  const random = seededRandom(20_240_601);
  sixCoordinate(random);
  largerSpheres(random);
  cutOut();
}

function sixCoordinate(random: () => number): void {
  const structures = Array.from({ length: 4000 }, () => distortedSphere(6, 0.25, random));
  for (const structure of structures.slice(0, 200)) describeCentres(structure);
  const start = performance.now();
  let centres = 0;
  for (const structure of structures) centres += describeCentres(structure).length;
  const seconds = (performance.now() - start) / 1000;
  console.log(`six-coordinate, every index: ${Math.round(centres / seconds)} centres/s (goal 3000)`);
}

function largerSpheres(random: () => number): void {
  for (const [coordinationNumber, noise] of [
    [7, 0.3],
    [8, 0.3],
    [9, 0.3],
    [9, 1.5],
  ] as const) {
    const spheres = Array.from({ length: 60 }, () =>
      distortedSphere(coordinationNumber, noise, random).positionsAngstrom.slice(1),
    );
    sphereShapes(spheres[0] ?? []);
    const times = spheres.map((sphere) => {
      const start = performance.now();
      sphereShapes(sphere);
      return performance.now() - start;
    });
    const mean = times.reduce((sum, time) => sum + time, 0) / times.length;
    console.log(
      `shapes, coordination number ${coordinationNumber}, moved by up to ${noise} Å: ` +
        `${mean.toFixed(2)} ms mean, ${Math.max(...times).toFixed(2)} ms longest (goal 50 for nine)`,
    );
  }
}

/** A piece of rock salt: 5,000 six-coordinate metals and fewer neighbours at the faces. */
function cutOut(): void {
  const elements: string[] = [];
  const positionsAngstrom: Vector3[] = [];
  for (let i = 0; i < 22; i++) {
    for (let j = 0; j < 22; j++) {
      for (let k = 0; k < 22 && elements.length < 10_000; k++) {
        elements.push((i + j + k) % 2 === 0 ? 'Ni' : 'O');
        positionsAngstrom.push([i * 2.09, j * 2.09, k * 2.09]);
      }
    }
  }
  const text = writeXyz({ elements, positionsAngstrom });
  const start = performance.now();
  const frames = readXyz(text);
  if (!frames.ok) throw new Error(frames.error.message);
  const centres = frames.value.flatMap((frame) => describeCentres(frame));
  const seconds = (performance.now() - start) / 1000;
  console.log(`10,000 atoms read and ${centres.length} centres described: ${seconds.toFixed(2)} s (goal 2)`);
}

function distortedSphere(coordinationNumber: number, noiseAngstrom: number, random: () => number): Structure {
  const ideals = idealPolyhedraFor(coordinationNumber);
  const ideal = ideals[Math.floor(random() * ideals.length)] ?? ideals[0];
  const donors = (ideal?.vertices ?? []).map(
    (vertex) => vertex.map((x) => 2.1 * x + noiseAngstrom * (random() - 0.5)) as unknown as Vector3,
  );
  return {
    elements: ['Fe', ...donors.map(() => 'O')],
    positionsAngstrom: [[0, 0, 0], ...donors],
  };
}

/** Lehmer's generator: the same numbers on every machine. */
function seededRandom(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state * 48_271) % 2_147_483_647;
    return state / 2_147_483_647;
  };
}
