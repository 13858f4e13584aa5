import { DOrbitalGlyph } from '@/components/marks/d-orbital-glyph';
import { EnergyLadder } from '@/components/marks/energy-ladder';
import { LinkMark, type LinkMarkKind } from '@/components/marks/link-mark';
import { MomentRuler } from '@/components/marks/moment-ruler';
import { polyhedra } from '@/components/marks/polyhedra';
import { PolyhedronGlyph } from '@/components/marks/polyhedron-glyph';
import { RowRuler } from '@/components/marks/row-ruler';
import { ShapeStrip } from '@/components/marks/shape-strip';
import { sampleBands } from './samples';
import { Section } from './section';

const kinds: [LinkMarkKind, string][] = [
  ['joined', 'the measured value lies in the candidate’s band'],
  ['broken', 'it lies outside, or a person doubts it'],
  ['one-ended calculated', 'only the calculated side has a value'],
  ['one-ended measured', 'only the measured side has a value'],
  ['dotted', 'cannot tell: ranges of two candidates overlap'],
];

const counts = [4, 5, 6, 7, 8, 9, 10];
const fillings: { name: string; geometry: string; flattened?: boolean; unpaired: (d: number) => number }[] = [
  { name: 'OC-6, high spin', geometry: 'OC-6', unpaired: (d) => (d <= 5 ? d : 10 - d) },
  { name: 'OC-6, low spin', geometry: 'OC-6', unpaired: (d) => [2, 1, 0, 1, 2, 1, 0][d - 4] ?? 0 },
  { name: 'T-4', geometry: 'T-4', unpaired: (d) => (d <= 5 ? d : 10 - d) },
  { name: 'T-4, flattened', geometry: 'T-4', flattened: true, unpaired: (d) => (d <= 5 ? d : 10 - d) },
  { name: 'SP-4', geometry: 'SP-4', unpaired: (d) => [4, 3, 2, 1, 0, 1, 0][d - 4] ?? 0 },
  { name: 'TBPY-5', geometry: 'TBPY-5', unpaired: (d) => (d <= 5 ? d : 10 - d) },
  { name: 'no agreed order', geometry: 'PBPY-7', unpaired: (d) => (d <= 5 ? d : 10 - d) },
];

/** Link marks, rulers, glyphs, strips and ladder in every state. */
export function MarksSections() {
  return (
    <>
      <Section
        id="marks"
        title="Link marks"
        note="Two pins and a thread. The shape tells the state; plum only repeats it."
      >
        <div className="grid grid-cols-5 gap-7 max-book:grid-cols-1">
          {kinds.map(([kind, words]) => (
            <figure key={kind}>
              <LinkMark kind={kind} width={112} />
              <div className="my-3 flex items-center gap-4">
                <LinkMark kind={kind} />
                <LinkMark kind={kind} width={36} />
              </div>
              <figcaption className="text-note text-ink-2">
                <b className="block text-body font-semibold text-ink first-letter:uppercase">{kind}</b>
                {words}
              </figcaption>
            </figure>
          ))}
        </div>
      </Section>
      <Section
        id="ruler"
        title="Moment ruler"
        note="Ticks at the spin-only moments. Bands are handbook ranges; the diamond and bar are the measured value and its 95 % interval."
      >
        <MomentRuler bands={sampleBands} measured={{ mu: 1.97, expandedU: 0.04 }} />
        <div className="mt-6">
          <MomentRuler
            bands={[
              { label: 'OC-6, sextet', low: 5.7, high: 6.1, favoured: true, verdictWord: 'consistent' },
            ]}
            measured={{ mu: 5.88, expandedU: 0.25 }}
          />
        </div>
        <div className="mt-6 flex flex-wrap gap-11 text-note text-ink-2">
          <figure>
            <RowRuler band={{ low: 4.2, high: 4.8 }} measured={{ mu: 4.63, expandedU: 0.05 }} width={170} />
            <figcaption>inside the band</figcaption>
          </figure>
          <figure>
            <RowRuler band={{ low: 3.2, high: 4.1 }} measured={{ mu: 2.97, expandedU: 0.06 }} width={170} />
            <figcaption>outside</figcaption>
          </figure>
          <figure>
            <RowRuler band={{ low: 0, high: 0 }} measured={null} width={170} />
            <figcaption>not measured</figcaption>
          </figure>
          <figure>
            <RowRuler band={null} measured={{ upperLimit: 0.3 }} width={170} />
            <figcaption>upper limit, no band</figcaption>
          </figure>
        </div>
      </Section>
      <Section id="ladder" title="Energy ladder" note="Lowest rung strong, the gap written on the arrow.">
        <EnergyLadder
          dCount={9}
          rungs={[
            {
              label: 'T-4 flattened, doublet',
              kJ: 0,
              favoured: true,
              multiplicity: 2,
              geometry: 'T-4',
              flattened: true,
              note: 'lowest of two candidates',
            },
            {
              label: 'SP-4 doublet',
              kJ: 26.4,
              favoured: false,
              multiplicity: 2,
              geometry: 'SP-4',
              note: 'no frequencies yet: may be a saddle',
            },
          ]}
        />
        <EnergyLadder
          dCount={6}
          rungs={[
            { label: 'OC-6 quintet', kJ: 0, favoured: true, multiplicity: 5, geometry: 'OC-6' },
            { label: 'OC-6 triplet', kJ: 118.3, favoured: false, multiplicity: 3, geometry: 'OC-6' },
            { label: 'OC-6 singlet', kJ: 130.5, favoured: false, multiplicity: 1, geometry: 'OC-6' },
            { label: 'TPR-6 quintet', kJ: 4.1, favoured: false, multiplicity: 5, geometry: 'TPR-6' },
          ]}
        />
      </Section>
      <Section
        id="orbitals"
        title="d-orbital glyphs"
        note="The icon of a candidate. Rows are levels, lowest at the bottom."
      >
        <div
          className="overflow-x-auto"
          role="region"
          aria-label="Fillings by field and d count"
          tabIndex={0}
        >
          <table>
            <thead>
              <tr>
                <td />
                {counts.map((count) => (
                  <th key={count} scope="col" className="pb-2 font-serif font-normal italic">
                    d<sup>{count}</sup>
                  </th>
                ))}
              </tr>
            </thead>
            <tbody>
              {fillings.map((field) => (
                <tr key={field.name}>
                  <th
                    scope="row"
                    className="pr-8 text-left text-small font-normal whitespace-nowrap text-ink-2"
                  >
                    {field.name}
                  </th>
                  {counts.map((count) => (
                    <td key={count} className="py-2.5 pr-6 align-bottom">
                      <DOrbitalGlyph
                        geometry={field.geometry}
                        flattened={field.flattened}
                        dCount={count}
                        multiplicity={field.unpaired(count) + 1}
                        scale={1.4}
                      />
                    </td>
                  ))}
                </tr>
              ))}
            </tbody>
          </table>
        </div>
      </Section>
      <Section
        id="polyhedra"
        title="Polyhedra"
        note="Solid edges in front, broken behind, a dot for the metal."
      >
        <div className="grid grid-cols-7 gap-5 max-book:grid-cols-3">
          {[...Object.keys(polyhedra), 'TPRS-9'].map((symbol) => (
            <figure key={symbol}>
              <PolyhedronGlyph symbol={symbol} size={92} className="h-auto max-w-full" />
              <div className="my-2 flex items-center gap-3">
                <PolyhedronGlyph symbol={symbol} size={40} decorative />
                <PolyhedronGlyph symbol={symbol} size={26} decorative />
              </div>
              <figcaption className="text-small font-semibold">{symbol}</figcaption>
            </figure>
          ))}
          <figure>
            <PolyhedronGlyph symbol="T-4" flattened size={92} className="h-auto max-w-full" />
            <figcaption className="text-small font-semibold">T-4, flattened</figcaption>
          </figure>
        </div>
      </Section>
      <Section id="strips" title="Shape strips" note="Where a centre stands between two ideal shapes.">
        <div className="grid grid-cols-2 gap-x-11 gap-y-7 max-book:grid-cols-1">
          <ShapeStrip
            from="T-4"
            to="SP-4"
            indexName="τ4"
            markers={[
              { value: 0.954, label: 'Co' },
              { value: 0.947, label: 'Ni' },
              { value: 0.716, label: 'Cu' },
              { value: 0, label: 'Pd' },
            ]}
          />
          <ShapeStrip from="TBPY-5" to="SPY-5" indexName="τ5" markers={[{ value: 0.48 }]} />
        </div>
      </Section>
    </>
  );
}
