import { classNames } from '@/components/ui/class-names';
import { dField, dFilling } from './d-filling';
import { spinWord } from './spin-word';

const BOX = 9;
/** Box height and gap by number of levels. */
const rowSizes: Record<number, [height: number, gap: number]> = {
  1: [9, 0],
  2: [9, 6],
  3: [8, 2.5],
  4: [7.5, 1.5],
};

const upArrow = (x: number, y: number, height: number) =>
  `M${x.toFixed(1)} ${y + height - 1.7}V${y + 1.7}l-1.9 2.4`;
const downArrow = (x: number, y: number, height: number) =>
  `M${x.toFixed(1)} ${y + 1.7}V${y + height - 1.7}l1.9 -2.4`;

function arrows(x: number, y: number, height: number, electrons: number): string[] {
  if (electrons === 1) return [upArrow(x + 4.6, y, height)];
  if (electrons === 2) return [upArrow(x + 3.4, y, height), downArrow(x + 5.7, y, height)];
  return [];
}

export interface DOrbitalGlyphProps {
  /** IUPAC polyhedral symbol. */
  geometry: string;
  dCount: number;
  /** Spin multiplicity 2S + 1 of the metal. */
  multiplicity: number;
  /** T-4 pressed along its twofold axis, as a d⁹ or d⁸ centre often is. */
  flattened?: boolean;
  /** px drawn for one unit of the drawing; 1.18 in the ledger. */
  scale?: number;
  decorative?: boolean;
  className?: string;
}

/** The icon of a candidate: its d electrons in the levels of its field, lowest level at the bottom. */
export function DOrbitalGlyph({
  geometry,
  dCount,
  multiplicity,
  flattened = false,
  scale = 1.18,
  decorative = false,
  className,
}: DOrbitalGlyphProps) {
  const field = dField(geometry, flattened);
  const filling = dFilling(dCount, multiplicity);
  const [height, gap] = rowSizes[field.levels.length] ?? [7, 1];
  const drawnHeight = 2 + field.levels.length * height + (field.levels.length - 1) * gap;
  const widest = Math.max(3, ...field.levels.map((level) => level.orbitals));
  const drawnWidth = widest * BOX + 3;
  const label =
    filling === null
      ? `d${dCount}, ${field.name}, ${spinWord(multiplicity)}: no such filling of the d orbitals alone`
      : `d${dCount}, ${field.name}, ${multiplicity - 1} unpaired`;
  const starts = field.levels.map((_, index) =>
    field.levels.slice(0, index).reduce((sum, level) => sum + level.orbitals, 0),
  );
  return (
    <svg
      viewBox={`0 0 ${drawnWidth} ${drawnHeight}`}
      width={drawnWidth * scale}
      height={drawnHeight * scale}
      fill="none"
      stroke="currentColor"
      className={classNames('block shrink-0 text-calc', className)}
      {...(decorative ? { 'aria-hidden': true } : { role: 'img', 'aria-label': label })}
    >
      {decorative ? null : <title>{label}</title>}
      {field.levels.map((level, index) => {
        const y = drawnHeight - 1 - height - index * (height + gap);
        const left = (drawnWidth - level.orbitals * BOX) / 2;
        const start = starts[index] ?? 0;
        const boxes = Array.from({ length: level.orbitals }, (_, orbital) => ({
          x: left + orbital * BOX,
          electrons: filling?.[start + orbital] ?? 0,
        }));
        return (
          <g key={level.label}>
            <rect
              x={left}
              y={y}
              width={level.orbitals * BOX}
              height={height}
              strokeDasharray={filling === null ? '2 1.6' : undefined}
            />
            {boxes.slice(1).map(({ x }) => (
              <path key={x} d={`M${x} ${y}v${height}`} />
            ))}
            {boxes.flatMap(({ x, electrons }) =>
              arrows(x, y, height, electrons).map((d) => <path key={d} strokeWidth="1.25" d={d} />),
            )}
          </g>
        );
      })}
    </svg>
  );
}
