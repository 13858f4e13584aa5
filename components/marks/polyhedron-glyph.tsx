import { classNames } from '@/components/ui/class-names';
import { findPolyhedron } from './polyhedra';
import { projectPolyhedron } from './project-polyhedron';

export interface PolyhedronGlyphProps {
  /** IUPAC polyhedral symbol: T-4, SP-4, SS-4, TBPY-5, SPY-5, OC-6, TPR-6 … */
  symbol: string;
  /** T-4 pressed along a twofold axis. */
  flattened?: boolean;
  /** Drawn width and height, px. */
  size?: number;
  decorative?: boolean;
  className?: string;
}

const printed = ([x, y]: readonly [number, number]) => `${x.toFixed(1)} ${y.toFixed(1)}`;

/** Line drawing of a coordination polyhedron; a broken circle with the coordination number for one without. */
export function PolyhedronGlyph({
  symbol,
  flattened = false,
  size = 38,
  decorative = false,
  className,
}: PolyhedronGlyphProps) {
  const polyhedron = findPolyhedron(symbol, flattened);
  const label = polyhedron === null ? symbol : `${symbol}, ${polyhedron.name}`;
  const frame = {
    viewBox: '0 0 40 40',
    width: size,
    height: size,
    fill: 'none',
    stroke: 'currentColor',
    className: classNames('block shrink-0 text-calc', className),
    ...(decorative ? { 'aria-hidden': true } : { role: 'img', 'aria-label': label }),
  } as const;
  const title = decorative ? null : <title>{label}</title>;
  if (polyhedron === null) {
    return (
      <svg {...frame}>
        {title}
        <circle cx="20" cy="20" r="15" strokeWidth="1.4" strokeDasharray="3 2.4" />
        <text x="20" y="24.5" textAnchor="middle" fontSize="13" fill="currentColor" stroke="none">
          {/\d+$/.exec(symbol)?.[0] ?? '?'}
        </text>
      </svg>
    );
  }
  const { metal, corners, edges } = projectPolyhedron(polyhedron);
  const line = (from: number, to: number) => {
    const [a, b] = [corners[from], corners[to]];
    return a === undefined || b === undefined ? '' : `M${printed(a)}L${printed(b)}`;
  };
  const strongBonds = polyhedron.bonds === 'strong';
  return (
    <svg {...frame} strokeLinecap="round">
      {title}
      {edges.map(({ from, to, hidden }) =>
        strongBonds ? (
          <path key={`${from}-${to}`} strokeWidth=".9" opacity=".75" d={line(from, to)} />
        ) : hidden ? (
          <path
            key={`${from}-${to}`}
            strokeWidth=".9"
            strokeDasharray="1.6 1.8"
            strokeLinecap="butt"
            d={line(from, to)}
          />
        ) : (
          <path key={`${from}-${to}`} strokeWidth="1.4" d={line(from, to)} />
        ),
      )}
      {polyhedron.bonds === undefined
        ? null
        : corners.map((corner, index) => (
            <path
              key={index}
              strokeWidth={strongBonds ? 1.5 : 0.9}
              opacity={strongBonds ? 1 : 0.75}
              d={`M${printed(metal)}L${printed(corner)}`}
            />
          ))}
      <circle cx={metal[0].toFixed(1)} cy={metal[1].toFixed(1)} r="2" fill="currentColor" stroke="none" />
    </svg>
  );
}
