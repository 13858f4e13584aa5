import Link from 'next/link';
import { DConfiguration } from '@/components/marks/d-configuration';
import { DOrbitalGlyph } from '@/components/marks/d-orbital-glyph';
import { LinkMarkAnchor } from '@/components/marks/link-mark-anchor';
import { bandText } from '@/components/marks/moment-axis';
import { PolyhedronGlyph } from '@/components/marks/polyhedron-glyph';
import { RowRuler } from '@/components/marks/row-ruler';
import { spinWord } from '@/components/marks/spin-word';
import { Absent } from '@/components/numbers/absent';
import { Formula } from '@/components/numbers/formula';
import { Quantity } from '@/components/numbers/quantity';
import { QuantitySymbol } from '@/components/numbers/quantity-symbol';
import { Trace } from '@/components/numbers/trace';
import { formulaInUnicode } from '@/components/numbers/parse-formula';
import type { StudyLedgerRow } from './study-ledger-row';

/** The left page of a row: what was calculated. */
export function CalculatedCells({ row }: { row: StudyLedgerRow }) {
  return (
    <>
      <th role="rowheader" scope="row" className="complex">
        <Link href={row.href} className="text-complex no-underline hover:underline">
          <Formula text={row.formula} />
        </Link>
        <span className="sub-line">
          {row.metalWords}
          {row.metalWords !== null && row.dCount !== null ? ', ' : null}
          {row.dCount === null ? null : (
            <>
              d<sup>{row.dCount}</sup>
            </>
          )}
        </span>
      </th>
      <td role="cell" className="candidate">
        <FavouredCandidate row={row} />
      </td>
      <td role="cell" className="num gap">
        <span className="phone-label">
          gap, kJ mol<sup>−1</sup>
        </span>
        {row.next.gapKJPerMol === null ? (
          <span className="text-ink-3">–</span>
        ) : (
          <span className="relative">
            {row.next.gapKJPerMol.toFixed(1)}
            {row.next.flag === undefined ? null : (
              <a href={row.next.flag.href} aria-label={row.next.flag.words} className="flag">
                †
              </a>
            )}
          </span>
        )}
        <span className="sub-line">{row.next.words}</span>
      </td>
      <td role="cell" className="num distance">
        <span className="phone-label">M–L, Å</span>
        {row.meanDistanceAngstrom !== null && row.distanceHref !== undefined ? (
          <Trace
            href={row.distanceHref}
            label={`${row.meanDistanceAngstrom.toFixed(3)} ångström, show source`}
          >
            {row.meanDistanceAngstrom.toFixed(3)}
          </Trace>
        ) : (
          <Quantity value={row.meanDistanceAngstrom} digits={3} />
        )}
      </td>
      <td role="cell" className="num shape">
        <span className="phone-label">
          {row.shape?.index === 'tau4' || row.shape?.index === 'tau5' ? (
            <QuantitySymbol of={row.shape.index} />
          ) : (
            (row.shape?.index ?? 'shape')
          )}
        </span>
        <Quantity value={row.shape?.value ?? null} digits={3} />
      </td>
      <td role="cell" className="num expected">
        <span className="phone-label">
          handbook, <i>μ</i>
          <sub>B</sub>
        </span>
        {row.handbook === null ? <Absent word="no band" /> : <b>{bandText(row.handbook)}</b>}
      </td>
    </>
  );
}

function FavouredCandidate({ row }: { row: StudyLedgerRow }) {
  if (row.favoured === null) return <Absent word="not calculated" />;
  const { geometry, flattened, multiplicity, note } = row.favoured;
  return (
    <div className="flex items-center gap-[9px]">
      {row.dCount === null ? null : (
        <DOrbitalGlyph
          geometry={geometry}
          flattened={flattened}
          dCount={row.dCount}
          multiplicity={multiplicity}
        />
      )}
      <PolyhedronGlyph symbol={geometry} flattened={flattened} className="mr-[3px] max-book:size-8" />
      <span className="whitespace-nowrap">
        <b>{geometry}</b> {spinWord(multiplicity)}
        <span className="sub-line">
          {note ??
            (row.dCount === null ? null : (
              <DConfiguration geometry={geometry} dCount={row.dCount} multiplicity={multiplicity} />
            ))}
        </span>
      </span>
    </div>
  );
}

/** The gutter of a row: its link mark, leading to the facing pages of the complex. */
export function GutterCell({ row }: { row: StudyLedgerRow }) {
  return (
    <td role="cell" className="gutter-cell">
      <LinkMarkAnchor
        kind={row.mark}
        href={row.href}
        sentence={row.markSentence}
        subject={formulaInUnicode(row.formula)}
      />
    </td>
  );
}

/** The right page of a row: what was measured and what the group concluded. */
export function MeasuredCells({ row }: { row: StudyLedgerRow }) {
  return (
    <>
      <td role="cell" className="num moment">
        {row.moment === null ? (
          <span className="text-ink-3">{row.unmeasuredWord ?? 'not measured'}</span>
        ) : 'mu' in row.moment ? (
          <Quantity value={row.moment.mu} uncertainty={row.moment.expandedU} digits={2} strong />
        ) : (
          <>
            <Quantity value={row.moment.upperLimit} bound="below" strong /> (95 %)
          </>
        )}
      </td>
      <td role="cell" className="ruler">
        <RowRuler band={row.handbook} measured={row.moment} />
      </td>
      <td role="cell" className="num unpaired">
        <span className="phone-label">
          <i>n</i> spin-only
        </span>
        {row.unpaired === null ? (
          <span className="text-ink-3">–</span>
        ) : (
          <Quantity
            value={row.unpaired.count}
            uncertainty={row.unpaired.expandedU}
            digits={row.unpaired.expandedU === 0 ? 0 : 2}
          />
        )}
      </td>
      <td role="cell" className="technique">
        {row.technique ?? <span className="text-ink-3">not planned</span>}
        {row.samplesWords === undefined ? null : <span className="sub-line">{row.samplesWords}</span>}
      </td>
      <td role="cell" className="assignment" data-state={row.assignment.state}>
        {row.assignment.state === 'signed' && row.assignment.signedBy !== undefined ? (
          <>
            <span className="sr-only">signed </span>
            <i className="block font-serif text-lead leading-tight">{row.assignment.signedBy}</i>
          </>
        ) : (
          <span className="block first-letter:uppercase">{row.assignment.state}</span>
        )}
        <span className="sub-line whitespace-nowrap">{row.assignment.words}</span>
      </td>
    </>
  );
}
