import { atomColour, inkOnAtom } from './atom-colours';
import { atomNames, drawnBonds, sphereAngles, type ViewedStructure } from './viewed-structure';

export interface ViewerLabels {
  distances: boolean;
  angles: boolean;
  names: boolean;
}

const WIDTH = 440;
const HEIGHT = 300;
const TURN = (28 * Math.PI) / 180;
const TILT = (18 * Math.PI) / 180;

/** Still picture of the structure, for browsers without WebGL and for print: same atoms, same labels. */
export function FlatProjection({ structure, labels }: { structure: ViewedStructure; labels: ViewerLabels }) {
  const names = atomNames(structure.elements);
  const turned = structure.positionsAngstrom.map(([x, y, z]) => {
    const across = x * Math.cos(TURN) + y * Math.sin(TURN);
    const near = y * Math.cos(TURN) - x * Math.sin(TURN);
    return {
      x: across,
      y: near * Math.sin(TILT) - z * Math.cos(TILT),
      depth: near * Math.cos(TILT) + z * Math.sin(TILT),
    };
  });
  const [xs, ys] = [turned.map(({ x }) => x), turned.map(({ y }) => y)];
  const [left, right, top, bottom] = [Math.min(...xs), Math.max(...xs), Math.min(...ys), Math.max(...ys)];
  const scale = Math.min(
    (WIDTH - 90) / Math.max(right - left, 1),
    (HEIGHT - 80) / Math.max(bottom - top, 1),
    70,
  );
  const at = (index: number) => ({
    x: ((turned[index]?.x ?? 0) - (left + right) / 2) * scale + WIDTH / 2,
    y: ((turned[index]?.y ?? 0) - (top + bottom) / 2) * scale + HEIGHT / 2,
  });
  const radius = (index: number) =>
    (structure.elements[index] === 'H' ? 0.17 : metals.has(index) ? 0.38 : 0.29) * scale;
  const metals = new Set(structure.centres.map((centre) => centre.index));
  const backToFront = turned
    .map((_, index) => index)
    .sort((a, b) => (turned[a]?.depth ?? 0) - (turned[b]?.depth ?? 0));
  const line = (a: number, b: number) => ({ x1: at(a).x, y1: at(a).y, x2: at(b).x, y2: at(b).y });
  return (
    <svg
      role="img"
      aria-label={`Still projection of ${structure.title}`}
      viewBox={`0 0 ${WIDTH} ${HEIGHT}`}
      className="block h-auto w-full"
    >
      {drawnBonds(structure).map(([a, b]) => (
        <line key={`${a}-${b}`} className="stroke-ink-2" strokeWidth="4" {...line(a, b)} />
      ))}
      {structure.centres.flatMap((centre) =>
        centre.donors.map((donor) => (
          <line
            key={`${centre.index}-${donor.index}`}
            className="stroke-calc"
            strokeWidth="2"
            strokeDasharray="5 4"
            {...line(centre.index, donor.index)}
          />
        )),
      )}
      {backToFront.map((index) => (
        <g key={index}>
          <circle
            cx={at(index).x}
            cy={at(index).y}
            r={radius(index)}
            fill={atomColour(structure.elements[index] ?? '')}
            className="stroke-ink"
            strokeWidth="1.2"
          />
          {labels.names || metals.has(index) ? (
            <text
              x={at(index).x}
              y={at(index).y + 4.5}
              fontSize="13"
              fontWeight="600"
              textAnchor="middle"
              fill={inkOnAtom(structure.elements[index] ?? '')}
            >
              {names[index]}
            </text>
          ) : null}
        </g>
      ))}
      {structure.centres.flatMap((centre) => [
        ...(labels.distances
          ? centre.donors.map((donor) => (
              <text
                key={`d${donor.index}`}
                className="halo fill-calc"
                fontSize="13.5"
                fontWeight="600"
                textAnchor="middle"
                x={at(centre.index).x * 0.42 + at(donor.index).x * 0.58}
                y={at(centre.index).y * 0.42 + at(donor.index).y * 0.58 + 4}
              >
                {donor.distanceAngstrom.toFixed(3)}
              </text>
            ))
          : []),
        ...(labels.angles
          ? sphereAngles(structure, centre).map(({ first, second, degrees }) => (
              <text
                key={`a${first}-${second}`}
                className="halo fill-ink-2"
                fontSize="12"
                textAnchor="middle"
                x={at(centre.index).x * 0.3 + (at(first).x + at(second).x) * 0.35}
                y={at(centre.index).y * 0.3 + (at(first).y + at(second).y) * 0.35 + 4}
              >
                {`${degrees.toFixed(1)}°`}
              </text>
            ))
          : []),
      ])}
    </svg>
  );
}
