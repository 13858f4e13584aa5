import { PolyhedronGlyph } from './polyhedron-glyph';

export interface ShapeStripMarker {
  /** 1 at the left end, 0 at the right. */
  value: number;
  /** Printed over the triangle; the value itself when left out. */
  label?: string;
}

export interface ShapeStripProps {
  /** Polyhedral symbol at index 1 (left) and at index 0 (right). */
  from: string;
  to: string;
  /** The index in words, for the text alternative: "τ4". */
  indexName: string;
  markers: readonly ShapeStripMarker[];
}

const tenths = Array.from({ length: 11 }, (_, index) => index / 10);
const place = (value: number) => `${((1 - Math.min(1, Math.max(0, value))) * 100).toFixed(2)}%`;

/** Rows for labels that would run into one another, so that each stays legible. */
function labelRows(markers: readonly ShapeStripMarker[]): number[] {
  const rowEnds: number[] = [];
  const rows = new Map<ShapeStripMarker, number>();
  for (const marker of [...markers].sort((a, b) => b.value - a.value)) {
    const at = 1 - marker.value;
    const free = rowEnds.findIndex((end) => at - end > 0.13);
    const row = free === -1 ? rowEnds.length : free;
    rowEnds[row] = at;
    rows.set(marker, row);
  }
  return markers.map((marker) => rows.get(marker) ?? 0);
}

/** Where a centre stands between two ideal shapes: an axis from 1 to 0 with a polyhedron at each end. */
export function ShapeStrip({ from, to, indexName, markers }: ShapeStripProps) {
  const rows = labelRows(markers);
  const axis = 30 + Math.max(0, ...rows) * 17;
  const said = markers
    .map(({ value, label }) => (label === undefined ? value.toFixed(3) : `${label} ${value.toFixed(3)}`))
    .join('; ');
  const alternative = `Shape strip from ${from}, ${indexName} = 1, to ${to}, ${indexName} = 0. ${said === '' ? 'No value' : said}.`;
  return (
    <div
      role="img"
      aria-label={alternative}
      className="grid grid-cols-[36px_minmax(0,1fr)_36px] items-center gap-2"
    >
      <PolyhedronGlyph symbol={from} size={34} decorative />
      <div className="px-8">
        <svg aria-hidden="true" width="100%" height={axis + 26} className="block overflow-visible">
          <line className="stroke-rule-strong" strokeWidth="1.2" x1="0" x2="100%" y1={axis} y2={axis} />
          {tenths.map((tenth) => {
            const long = tenth % 0.5 === 0;
            return (
              <svg key={tenth} x={place(tenth)} y={axis} className="overflow-visible">
                <path className="stroke-rule-strong" d={long ? 'M0 0v8' : 'M0 0v4'} />
                {long ? (
                  <text className="fill-ink-3" y="21" fontSize="12.5" textAnchor="middle">
                    {tenth.toFixed(1)}
                  </text>
                ) : null}
              </svg>
            );
          })}
          {markers.map((marker, index) => {
            const lift = (rows[index] ?? 0) * 17;
            return (
              <svg key={index} x={place(marker.value)} y={axis} className="overflow-visible">
                {lift === 0 ? null : <path className="stroke-calc" d={`M0 -10V${-12 - lift}`} />}
                <path className="fill-calc" d="M0 0l-6 -10h12z" />
                <text
                  className="halo fill-calc"
                  y={-16 - lift}
                  fontSize="14.5"
                  fontWeight="600"
                  textAnchor="middle"
                >
                  {marker.label ?? marker.value.toFixed(3)}
                </text>
              </svg>
            );
          })}
        </svg>
      </div>
      <PolyhedronGlyph symbol={to} size={34} decorative />
    </div>
  );
}
