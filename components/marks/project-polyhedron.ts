import type { Polyhedron } from './polyhedra';

type Point = readonly [x: number, y: number];
type Corner = readonly [number, number, number];

export interface ProjectedPolyhedron {
  metal: Point;
  corners: readonly Point[];
  /** Edges by corner numbers; hidden ones lie behind the body. */
  edges: readonly { from: number; to: number; hidden: boolean }[];
}

const SIZE = 40;
const RADIUS = 17;
const CLOSE = 1e-6;

const subtract = (a: Corner, b: Corner): Corner => [a[0] - b[0], a[1] - b[1], a[2] - b[2]];
const dot = (a: Corner, b: Corner) => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
const cross = (a: Corner, b: Corner): Corner => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];

/** Faces of the convex hull: outward unit normals, each with the corners that lie on it. */
function hullFaces(corners: readonly Corner[]): { normal: Corner; members: Set<number> }[] {
  const faces: { normal: Corner; members: Set<number> }[] = [];
  for (const [i, a] of corners.entries()) {
    for (const [j, b] of corners.entries()) {
      for (const [k, c] of corners.entries()) {
        if (i === j || j === k || i === k) continue;
        const normal = cross(subtract(b, a), subtract(c, a));
        const length = Math.sqrt(dot(normal, normal));
        if (length < CLOSE) continue;
        const unit: Corner = [normal[0] / length, normal[1] / length, normal[2] / length];
        const heights = corners.map((corner) => dot(subtract(corner, a), unit));
        if (heights.some((height) => height > CLOSE)) continue;
        if (faces.some((face) => dot(face.normal, unit) > 1 - CLOSE)) continue;
        const members = new Set(heights.flatMap((height, index) => (height > -CLOSE ? [index] : [])));
        faces.push({ normal: unit, members });
      }
    }
  }
  return faces;
}

/**
 * A polyhedron as lines on a 40 × 40 square: turned by its azimuth, tilted by its elevation, scaled until the
 * corner furthest from the metal in x or y stands 17 off, and centred.
 * An edge is where two faces of the hull meet; it is hidden when both look away from the reader.
 */
export function projectPolyhedron({ corners, azimuth, elevation }: Polyhedron): ProjectedPolyhedron {
  const [turn, tilt] = [(azimuth * Math.PI) / 180, (elevation * Math.PI) / 180];
  const turned = corners.map(([x, y, z]): Corner => {
    const across = x * Math.cos(turn) + y * Math.sin(turn);
    const near = y * Math.cos(turn) - x * Math.sin(turn);
    return [across, near * Math.sin(tilt) - z * Math.cos(tilt), near * Math.cos(tilt) + z * Math.sin(tilt)];
  });
  const reach = Math.max(...turned.flatMap(([x, y]) => [Math.abs(x), Math.abs(y)]));
  const scale = RADIUS / reach;
  const middle = (axis: 0 | 1) => {
    const values = [0, ...turned.map((corner) => corner[axis] * scale)];
    return SIZE / 2 - (Math.min(...values) + Math.max(...values)) / 2;
  };
  const [shiftX, shiftY] = [middle(0), middle(1)];
  const faces = hullFaces(turned);
  const edges: { from: number; to: number; hidden: boolean }[] = [];
  for (let from = 0; from < corners.length; from += 1) {
    for (let to = from + 1; to < corners.length; to += 1) {
      const meeting = faces.filter(({ members }) => members.has(from) && members.has(to));
      // A flat shape has two faces, front and back, on the same corners: only the outline counts.
      const flat = faces.length === 2;
      if (meeting.length < 2 || (flat && !isOutline(turned, from, to))) continue;
      edges.push({ from, to, hidden: !meeting.some(({ normal }) => normal[2] > CLOSE) });
    }
  }
  return {
    metal: [shiftX, shiftY],
    corners: turned.map(([x, y]) => [x * scale + shiftX, y * scale + shiftY]),
    edges,
  };
}

/** Whether all other corners of a flat shape lie on one side of the line between two. */
function isOutline(corners: readonly Corner[], from: number, to: number): boolean {
  const [a, b] = [corners[from], corners[to]];
  if (a === undefined || b === undefined) return false;
  const sides = corners
    .map((corner) => (b[0] - a[0]) * (corner[1] - a[1]) - (b[1] - a[1]) * (corner[0] - a[0]))
    .filter((side) => Math.abs(side) > CLOSE);
  return sides.every((side) => side > 0) || sides.every((side) => side < 0);
}
