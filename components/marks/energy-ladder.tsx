import { DOrbitalGlyph } from './d-orbital-glyph';
import { ladderTicks, spreadLabels } from './ladder-scale';
import { PolyhedronGlyph } from './polyhedron-glyph';
import { spinWord } from './spin-word';

export interface LadderRung {
  label: string;
  /** Relative energy, kJ mol⁻¹, ≥ 0; the lowest stands at 0. */
  kJ: number;
  favoured: boolean;
  multiplicity: number;
  /** IUPAC polyhedral symbol. */
  geometry: string;
  flattened?: boolean;
  note?: string;
}

export interface EnergyLadderProps {
  rungs: readonly LadderRung[];
  /** d electrons of the metal, for the fillings; null leaves them out. */
  dCount: number | null;
}

const TOP = 32;
const ROOM = 52;

/** Candidates by energy: the lowest rung strong, higher ones dashed, the gap written on an arrow. */
export function EnergyLadder({ rungs, dCount }: EnergyLadderProps) {
  const sorted = [...rungs].sort((a, b) => b.kJ - a.kJ);
  const ticks = ladderTicks(Math.max(0, ...rungs.map((rung) => rung.kJ)));
  const top = ticks.at(-1) ?? 0;
  const span = Math.max(132, (rungs.length - 1) * (ROOM + 6));
  const floor = TOP + span;
  const at = (kJ: number) => floor - (top === 0 ? 0 : (kJ / top) * span);
  const lowest = sorted.at(-1);
  const next = sorted.at(-2);
  const places = spreadLabels(
    sorted.map((rung) => at(rung.kJ)),
    ROOM,
    floor,
  );
  return (
    <div className="relative" style={{ height: floor + 26 }}>
      <svg
        aria-hidden="true"
        className="absolute inset-y-0 left-0 h-full w-[238px] overflow-visible max-book:w-[124px]"
        fill="none"
      >
        <svg x="46" className="overflow-visible max-book:hidden">
          <Axis ticks={ticks} at={at} floor={floor} />
        </svg>
        <svg x="32" className="hidden overflow-visible max-book:block">
          <Axis ticks={ticks} at={at} floor={floor} />
        </svg>
        {sorted.map((rung, index) => (
          <g key={rung.label} className="stroke-calc">
            <line
              x1="32%"
              x2="92%"
              y1={at(rung.kJ)}
              y2={at(rung.kJ)}
              strokeWidth={rung.kJ === 0 ? 4 : 2}
              strokeDasharray={rung.kJ === 0 ? undefined : '5 3'}
            />
            {Math.abs((places[index] ?? 0) - at(rung.kJ)) > 2 ? (
              <line x1="92%" x2="101%" y1={at(rung.kJ)} y2={places[index]} className="stroke-rule-strong" />
            ) : null}
          </g>
        ))}
        {lowest !== undefined && next !== undefined && at(lowest.kJ) - at(next.kJ) > 16 ? (
          <svg x="62%" className="overflow-visible stroke-calc">
            <path
              strokeWidth="1.2"
              d={`M0 ${at(lowest.kJ) - 6}V${at(next.kJ) + 6}m-3.5 7l3.5 -7l3.5 7M-3.5 ${at(lowest.kJ) - 13}l3.5 7l3.5 -7`}
            />
            <text
              className="halo fill-calc"
              y={(at(lowest.kJ) + at(next.kJ)) / 2 + 5}
              fontSize="16"
              fontWeight="600"
              textAnchor="middle"
            >
              {(next.kJ - lowest.kJ).toFixed(1)}
            </text>
          </svg>
        ) : null}
      </svg>
      <span className="absolute top-0 left-[58px] text-note text-ink-3 max-book:left-[38px]">
        Δ<i>E</i>, kJ mol<sup>−1</sup>
      </span>
      <ol aria-label="Candidates by energy, highest first">
        {sorted.map((rung, index) => (
          <li
            key={rung.label}
            className="absolute right-0 left-[250px] flex -translate-y-1/2 items-center gap-3 max-book:left-[132px] max-book:gap-2"
            style={{ top: places[index] }}
          >
            {dCount === null ? null : (
              <span className="grid w-9 place-items-center">
                <DOrbitalGlyph
                  geometry={rung.geometry}
                  flattened={rung.flattened}
                  dCount={dCount}
                  multiplicity={rung.multiplicity}
                  scale={1.08}
                />
              </span>
            )}
            <PolyhedronGlyph symbol={rung.geometry} flattened={rung.flattened} size={36} />
            <span className="leading-tight">
              <span className="block text-[1.0625rem] font-semibold max-book:text-body">
                {rung.label}
                <span className="sr-only">
                  {`, ${spinWord(rung.multiplicity)}, ${rung.kJ.toFixed(1)} kilojoule per mole above the lowest${rung.favoured ? ', favoured' : ''}`}
                </span>
              </span>
              {rung.note === undefined ? null : (
                <span className="text-[0.84375rem] text-ink-3">{rung.note}</span>
              )}
            </span>
          </li>
        ))}
      </ol>
    </div>
  );
}

function Axis({ ticks, at, floor }: { ticks: readonly number[]; at: (kJ: number) => number; floor: number }) {
  return (
    <>
      <path className="stroke-rule-strong" strokeWidth="1.2" d={`M0 14V${floor + 12}`} />
      {ticks.map((tick) => (
        <g key={tick}>
          <path className="stroke-rule-strong" d={`M0 ${at(tick)}h-6`} />
          <text className="fill-ink-3" x="-10" y={at(tick) + 4} fontSize="12.5" textAnchor="end">
            {tick}
          </text>
        </g>
      ))}
    </>
  );
}
