import {
  bandText,
  measuredMomentText,
  momentAxisEnd,
  momentTicks,
  type MeasuredMoment,
  type MomentBand,
} from './moment-axis';

export interface MomentRulerProps {
  bands: readonly MomentBand[];
  measured: MeasuredMoment | null;
}

/** Past this share of the axis, words stand to the left of what they name. */
const TURN_AT = 0.72;

function alternative(bands: readonly MomentBand[], measured: MeasuredMoment | null): string {
  const said = bands.map(
    (band) =>
      `${band.label}: ${bandText(band)}${band.verdictWord === undefined ? '' : `, ${band.verdictWord}`}.`,
  );
  const value =
    measured === null ? 'Not measured.' : `Measured ${measuredMomentText(measured)} Bohr magnetons.`;
  return ['Moment ruler. Spin-only ticks by number of unpaired electrons.', ...said, value].join(' ');
}

/** Words beside a band or a value: to its right, or to its left near the end of the axis. */
function Beside({
  low,
  high,
  end,
  className,
  children,
}: {
  low: number;
  high: number;
  end: number;
  className: string;
  children: React.ReactNode;
}) {
  const turned = high / end > TURN_AT;
  const style = turned
    ? { right: `calc(${(100 - (low / end) * 100).toFixed(2)}% + 12px)` }
    : { left: `calc(${((high / end) * 100).toFixed(2)}% + 12px)` };
  return (
    <span
      style={style}
      className={`absolute bottom-[5px] flex gap-4 bg-page px-0.5 leading-none whitespace-nowrap ${className}`}
    >
      {children}
    </span>
  );
}

/**
 * A horizontal axis of the effective moment with spin-only ticks; each candidate's expected band in ink blue, the
 * measured value with its 95 % bar in copper, its hairline running up through all bands.
 * On phones the labels stand over their bands.
 */
export function MomentRuler({ bands, measured }: MomentRulerProps) {
  const end = momentAxisEnd(bands, measured);
  const at = (moment: number) => `${((Math.min(Math.max(moment, 0), end) / end) * 100).toFixed(2)}%`;
  const ticks = momentTicks(end);
  const hairlines = (
    <>
      {ticks.map(({ unpaired, moment }) => (
        <line key={unpaired} className="stroke-rule" x1={at(moment)} x2={at(moment)} y1="0" y2="100%" />
      ))}
      {measured !== null && 'mu' in measured ? (
        <line
          className="stroke-meas"
          strokeWidth="1.2"
          x1={at(measured.mu)}
          x2={at(measured.mu)}
          y1="0"
          y2="100%"
        />
      ) : null}
    </>
  );
  const row =
    'relative grid grid-cols-[188px_minmax(0,1fr)] gap-x-[22px] pr-[30px] max-book:block max-book:px-4';
  const name =
    'self-end pb-[5px] text-right text-[0.90625rem] leading-tight text-ink max-book:absolute max-book:top-1 max-book:left-4 max-book:z-[1] max-book:bg-page max-book:pb-0 max-book:text-left max-book:text-[0.8125rem]';
  const strip = 'block h-[34px] w-full overflow-visible max-book:h-[46px]';
  return (
    <div role="img" aria-label={alternative(bands, measured)} className="mt-1.5">
      {bands.map((band) => (
        <div key={band.label} className={row}>
          <span className={name}>{band.label}</span>
          <div className="relative">
            <svg aria-hidden="true" className={strip}>
              {hairlines}
              <svg y="100%" className="overflow-visible">
                <rect
                  className="fill-calc-tint stroke-calc"
                  strokeWidth={band.favoured ? 1.5 : 1}
                  strokeDasharray={band.favoured ? undefined : '4 3'}
                  fillOpacity={band.favoured ? 1 : 0.45}
                  x={at(band.low)}
                  y="-18"
                  width={band.high === band.low ? 3 : `${(((band.high - band.low) / end) * 100).toFixed(2)}%`}
                  height="14"
                />
              </svg>
            </svg>
            <Beside low={band.low} high={band.high} end={end} className="text-small">
              <span className="text-calc">{bandText(band)}</span>
              {band.verdictWord === undefined ? null : (
                <span className="text-ink-3 max-book:hidden">{band.verdictWord}</span>
              )}
            </Beside>
          </div>
        </div>
      ))}
      <div className={row}>
        <span className={name}>{measured === null ? 'not measured' : 'measured, 95 %'}</span>
        <div className="relative">
          <svg aria-hidden="true" className={strip}>
            {ticks.map(({ unpaired, moment }) => (
              <line key={unpaired} className="stroke-rule" x1={at(moment)} x2={at(moment)} y1="0" y2="100%" />
            ))}
            {measured === null ? null : <MeasuredBar measured={measured} at={at} />}
          </svg>
          {measured === null ? null : (
            <Beside
              low={'mu' in measured ? Math.max(0, measured.mu - measured.expandedU) : 0}
              high={'mu' in measured ? measured.mu + measured.expandedU : measured.upperLimit}
              end={end}
              className="text-[1rem] font-semibold text-meas max-book:text-small"
            >
              <span>
                {measuredMomentText(measured)}{' '}
                <span className="max-book:hidden">
                  <i>μ</i>
                  <sub>B</sub>
                </span>
              </span>
            </Beside>
          )}
        </div>
      </div>
      <div className={row}>
        <span className="pt-3 text-right text-[0.8125rem] leading-[1.25] text-ink-3 max-book:hidden">
          unpaired electrons, <i>n</i>
          <br />
          spin-only <i>μ</i> / <i>μ</i>
          <sub>B</sub>
        </span>
        <svg aria-hidden="true" className="block h-[50px] w-full overflow-visible">
          <line className="stroke-rule-strong" strokeWidth="1.2" x1="0" x2="100%" y1="0" y2="0" />
          {ticks.map(({ unpaired, moment }) => (
            <svg key={unpaired} x={at(moment)} className="overflow-visible">
              <path className="stroke-ink" strokeWidth="1.4" d="M0 0v9" />
              <text className="fill-ink" y="27" fontSize="15" fontWeight="600" textAnchor="middle">
                {unpaired}
              </text>
              <text className="fill-ink-3" y="43" fontSize="12.5" textAnchor="middle">
                {moment.toFixed(2)}
              </text>
            </svg>
          ))}
        </svg>
      </div>
    </div>
  );
}

function MeasuredBar({ measured, at }: { measured: MeasuredMoment; at: (moment: number) => string }) {
  const [low, high] =
    'mu' in measured
      ? [measured.mu - measured.expandedU, measured.mu + measured.expandedU]
      : [0, measured.upperLimit];
  return (
    <>
      {'mu' in measured ? (
        <line
          className="stroke-meas"
          strokeWidth="1.2"
          x1={at(measured.mu)}
          x2={at(measured.mu)}
          y1="0"
          y2="100%"
        />
      ) : null}
      <svg y="100%" className="overflow-visible">
        <line className="stroke-meas" strokeWidth="3" x1={at(low)} x2={at(high)} y1="-11" y2="-11" />
        {[low, high].map((cap) => (
          <svg key={cap} x={at(cap)} className="overflow-visible">
            <path className="stroke-meas" strokeWidth="1.6" d="M0 -18v14" />
          </svg>
        ))}
        {'mu' in measured ? (
          <svg x={at(measured.mu)} className="overflow-visible">
            <path className="fill-meas" d="M0 -17l6 6l-6 6l-6 -6z" />
          </svg>
        ) : null}
      </svg>
    </>
  );
}
