import { bandText, measuredMomentText, momentAxisEnd, momentTicks, type MeasuredMoment } from './moment-axis';

const HEIGHT = 28;
const AXIS_Y = 23.5;
const VALUE_Y = 17.5;
const INSET = 4;

/** The moment ruler in the height of a table row: ticks at n = 0…5, one band, the measured value with its bar. */
export function RowRuler({
  band,
  measured,
  width = 150,
}: {
  band: { low: number; high: number } | null;
  measured: MeasuredMoment | null;
  width?: number;
}) {
  const bands = band === null ? [] : [{ ...band, label: '', favoured: true }];
  const end = momentAxisEnd(bands, measured);
  const at = (moment: number) => INSET + (Math.min(Math.max(moment, 0), end) / end) * (width - 2 * INSET);
  const said = [
    band === null ? 'No handbook band' : `Handbook band ${bandText(band)}`,
    measured === null ? 'not measured' : `measured ${measuredMomentText(measured)} Bohr magnetons`,
  ].join('; ');
  return (
    <svg
      role="img"
      aria-label={said}
      viewBox={`0 0 ${width} ${HEIGHT}`}
      width={width}
      height={HEIGHT}
      fill="none"
      className="block max-book:h-auto max-book:w-full"
    >
      <path className="stroke-rule-strong" d={`M${INSET} ${AXIS_Y}H${width - INSET}`} />
      {momentTicks(end).map(({ unpaired, moment }) => (
        <path key={unpaired} className="stroke-rule-strong" d={`M${at(moment).toFixed(1)} ${AXIS_Y}v4`} />
      ))}
      {band === null ? null : (
        <rect
          className="fill-calc-tint stroke-calc"
          x={at(band.low)}
          y="3.5"
          width={Math.max(2.5, at(band.high) - at(band.low))}
          height="8"
        />
      )}
      {measured === null ? null : <MeasuredInRow measured={measured} at={at} />}
    </svg>
  );
}

function MeasuredInRow({ measured, at }: { measured: MeasuredMoment; at: (moment: number) => number }) {
  if ('upperLimit' in measured) {
    const x = at(measured.upperLimit);
    return (
      <path
        className="stroke-meas"
        strokeWidth="2"
        d={`M${at(0)} ${VALUE_Y}H${x}M${x} ${VALUE_Y - 3.5}v7M${at(0) + 3.5} ${VALUE_Y - 3}l-3.5 3l3.5 3`}
      />
    );
  }
  const x = at(measured.mu);
  return (
    <>
      <path className="stroke-meas" d={`M${x} 1V23`} />
      <path
        className="stroke-meas"
        strokeWidth="2"
        d={`M${at(measured.mu - measured.expandedU)} ${VALUE_Y}H${at(measured.mu + measured.expandedU)}`}
      />
      <path className="fill-meas" d={`M${x} ${VALUE_Y - 4.2}l4.2 4.2l-4.2 4.2l-4.2 -4.2z`} />
    </>
  );
}
