import type { ComplexDetail } from '@/app/_server/read-complex';
import { Leaf } from '@/components/ledger/leaf';
import { LeafHead } from '@/components/ledger/leaf-head';
import { RunningHead } from '@/components/ledger/running-head';
import { WorkedSteps } from '@/components/ledger/worked-steps';
import { LinkMark } from '@/components/marks/link-mark';
import { Quantity } from '@/components/numbers/quantity';
import { QuantitySymbol } from '@/components/numbers/quantity-symbol';
import { candidateWords } from '@/components/study/spin-and-shape';
import { buttonClass } from '@/components/ui/button';
import { DataTable } from '@/components/ui/data-table';
import { StatePanel } from '@/components/ui/state-panel';
import { COVERAGE_FACTOR } from '@/lib/comparison/measured-moment';
import type { Verdict } from '@/lib/comparison/verdict';

/** The right page: what was measured, how it becomes a moment and a count of electrons, what it says. */
export function MeasuredLeaf({
  studyId,
  detail,
  mayMeasure,
}: {
  studyId: string;
  detail: ComplexDetail;
  mayMeasure: boolean;
}) {
  const { complex, compared, measurements } = detail;
  const enter = mayMeasure ? (
    <a className={buttonClass('main')} href={`/studies/${studyId}/complexes/${complex.id}/measure`}>
      Enter a measurement
    </a>
  ) : null;
  return (
    <Leaf labelledBy="measured">
      <RunningHead side="measured" id="measured">
        {compared?.measurement.invented ? 'invented readings · ' : ''}
        <i>u</i> is standard uncertainty, <QuantitySymbol of="coverage" /> = 1, on this page
      </RunningHead>
      {compared ? (
        <Compared detail={detail} compared={compared} />
      ) : (
        <StatePanel
          picture={<LinkMark kind="one-ended calculated" decorative />}
          title="No measurement yet"
          level={3}
        >
          Enter the replicates of a balance, NMR or magnetometer determination; the other end of the mark is
          tied then.
        </StatePanel>
      )}
      {enter ? <p className="mt-6">{enter}</p> : null}
      {measurements.length > 1 ? (
        <>
          <LeafHead>Earlier measurements</LeafHead>
          <ul className="text-small">
            {measurements
              .filter(({ id }) => id !== compared?.measurement.id)
              .map((measurement) => (
                <li key={measurement.id} className="border-b border-rule py-1.5">
                  {measurement.sampleCode}, {measurement.technique}, {measurement.measuredOn}:{' '}
                  {measurement.replicatesBohr.map((value) => value.toFixed(2)).join(', ')} μ<sub>B</sub>
                  {measurement.withdrawnAt ? ` (withdrawn: ${measurement.withdrawnBecause ?? ''})` : ''}
                </li>
              ))}
          </ul>
        </>
      ) : null}
    </Leaf>
  );
}

function Compared({
  detail,
  compared: { measurement, moment },
}: {
  detail: ComplexDetail;
  compared: NonNullable<ComplexDetail['compared']>;
}) {
  const { statistics } = moment;
  return (
    <>
      <dl className="mt-3 grid grid-cols-[auto_1fr] gap-x-4 gap-y-0.5 text-small">
        <dt className="text-ink-3">Sample</dt>
        <dd>{measurement.sampleCode}</dd>
        <dt className="text-ink-3">Technique</dt>
        <dd>
          {measurement.technique},{' '}
          <Quantity
            value={measurement.temperatureK}
            uncertainty={measurement.uTemperatureK || null}
            unit="K"
            digits={1}
          />
        </dd>
        <dt className="text-ink-3">By</dt>
        <dd>
          {measurement.enteredBy ?? 'unknown'}, {measurement.measuredOn}
        </dd>
      </dl>
      <LeafHead>Replicates</LeafHead>
      <DataTable caption="Replicates of the moment">
        <thead>
          <tr>
            <th scope="col">Replicate</th>
            <th scope="col" className="num">
              <QuantitySymbol of="muEff" />, μ<sub>B</sub>
            </th>
          </tr>
        </thead>
        <tbody>
          {measurement.replicatesBohr.map((value, index) => (
            <tr key={index}>
              <td>{index + 1}</td>
              <td className="num">{value.toFixed(3)}</td>
            </tr>
          ))}
        </tbody>
      </DataTable>
      <LeafHead>From replicates to electrons</LeafHead>
      <WorkedSteps
        steps={[
          {
            key: 'mean',
            symbol: <QuantitySymbol of="muEff" />,
            formula: `mean of ${statistics.count}`,
            source:
              statistics.sampleStandardDeviation === null
                ? 'one value shows no scatter'
                : `s = ${statistics.sampleStandardDeviation.toFixed(4)}, standard error s/√n = ${statistics.standardError?.toFixed(4)}`,
            value: `${statistics.mean.toFixed(3)} μB`,
          },
          {
            key: 'u',
            symbol: <i>u</i>,
            formula: '√(s²/n + u²ₛ)',
            source: `uₛ = ${measurement.uSystematicBohr} μB: calibration and corrections, as entered. GUM 5.1.2`,
            value: `${moment.uMuBohr.toFixed(3)} μB`,
          },
          {
            key: 'n',
            symbol: <QuantitySymbol of="unpaired" />,
            formula: '√(1 + μ²) − 1',
            source: 'spin-only: an orbital part raises it. u by the derivative',
            value: <Quantity value={moment.unpaired} uncertainty={moment.uUnpaired} notation="plus-minus" />,
          },
        ]}
      />
      <p className="mt-4 flex items-baseline justify-between text-small" data-testid="stated-moment">
        <span>
          Stated for comparison, expanded, <QuantitySymbol of="coverage" /> = {COVERAGE_FACTOR}
        </span>
        <span className="text-head text-meas">
          <Quantity
            value={moment.muBohr}
            uncertainty={COVERAGE_FACTOR * moment.uMuBohr}
            unit="muB"
            notation="plus-minus"
            strong
          />
        </span>
      </p>
      <LeafHead>What it says of the candidates</LeafHead>
      <DataTable caption="Verdict of the measurement on each candidate">
        <thead>
          <tr>
            <th scope="col">Candidate</th>
            <th scope="col" className="num">
              Expected μ, μ<sub>B</sub>
            </th>
            <th scope="col">Verdict</th>
          </tr>
        </thead>
        <tbody>
          {detail.comparison.candidates.map(({ candidate, band, verdict }) => (
            <tr key={candidate.id}>
              <td>{candidateWords(candidate)}</td>
              <td className="num" title={band?.source}>
                {band
                  ? `${band.low.toFixed(1)}–${band.high.toFixed(1)}${band.tag === 'limits' ? ' (limits)' : ''}`
                  : 'none known'}
              </td>
              <td>
                <span className="inline-flex items-center gap-2">
                  <LinkMark
                    kind={verdict ? verdictMarks[verdict] : 'one-ended measured'}
                    width={36}
                    decorative
                  />
                  {verdict ?? 'cannot tell'}
                </span>
              </td>
            </tr>
          ))}
        </tbody>
      </DataTable>
    </>
  );
}

const verdictMarks = {
  consistent: 'joined',
  excluded: 'broken',
  'cannot tell': 'dotted',
} as const satisfies Record<Verdict, string>;
