import { EmptyState } from '@/components/marks/empty-state';
import { ErrorState } from '@/components/marks/error-state';
import { LinkMark } from '@/components/marks/link-mark';
import { PolyhedronGlyph } from '@/components/marks/polyhedron-glyph';
import { Absent } from '@/components/numbers/absent';
import { Formula } from '@/components/numbers/formula';
import { Quantity } from '@/components/numbers/quantity';
import { QuantitySymbol } from '@/components/numbers/quantity-symbol';
import { Trace } from '@/components/numbers/trace';
import { AtWork } from '@/components/ui/at-work';
import { Button } from '@/components/ui/button';
import { DataTable } from '@/components/ui/data-table';
import { Disclosure } from '@/components/ui/disclosure';
import { Field } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { Pick } from '@/components/ui/pick';
import { ProgressBar } from '@/components/ui/progress-bar';
import { Select } from '@/components/ui/select';
import { Sift } from '@/components/ui/sift';
import { SkeletonRows } from '@/components/ui/skeleton-rows';
import { SortHead } from '@/components/ui/sort-head';
import { Tabs } from '@/components/ui/tabs';
import { TextArea } from '@/components/ui/text-area';
import { colourTokens } from '@/tailwind.config';
import { Section } from './section';

const formulas = [
  '[CuCl4]2-',
  '[Fe(OH2)6]2+',
  'CuSO4.5H2O',
  'SO42-',
  'NH4+',
  'Fe^III',
  'Cu(II)',
  'Cs2[CuCl4]',
  'O2^-',
];

/** Colours, numbers, controls, tables and page states. */
export function ControlsSections() {
  return (
    <>
      <Section id="colour" title="Colour" note="Named by meaning.">
        <ul className="grid grid-cols-[repeat(auto-fill,minmax(156px,1fr))] gap-x-5 gap-y-4.5">
          {Object.keys(colourTokens).map((token) => (
            <li key={token} className="text-small font-semibold">
              <span
                className="mb-1.5 block h-12 border border-rule-strong"
                style={{ background: `var(--${token})` }}
              />
              {token}
            </li>
          ))}
        </ul>
      </Section>
      <Section
        id="numbers"
        title="Numerals and units"
        note="Tabular, aligned, no digit more than the evidence carries."
      >
        <DataTable caption="Numerals and units">
          <tbody>
            <tr>
              <th scope="row">distance, single crystal</th>
              <td className="num">
                <Quantity value={2.0834} uncertainty={0.005} notation="parentheses" unit="Angstrom" />
              </td>
            </tr>
            <tr>
              <th scope="row">moment</th>
              <td className="num">
                <Quantity value={4.871} uncertainty={0.061} unit="muB" strong />
              </td>
            </tr>
            <tr>
              <th scope="row">energy</th>
              <td className="num">
                <Quantity value={-3480.762348} digits={6} unit="Eh" />
              </td>
            </tr>
            <tr>
              <th scope="row">molar susceptibility</th>
              <td className="num">
                <Quantity
                  value={0.00147}
                  uncertainty={0.000032}
                  notation="parentheses"
                  powerOfTen={-3}
                  unit="cm3 mol-1"
                />
              </td>
            </tr>
            <tr>
              <th scope="row">below a limit</th>
              <td className="num">
                <Quantity value={0.3} bound="below" unit="muB" />
              </td>
            </tr>
            <tr>
              <th scope="row">not printed by the output</th>
              <td className="num">
                <Quantity value={null} />
              </td>
            </tr>
          </tbody>
        </DataTable>
        <p className="mt-5 flex flex-wrap gap-x-7 gap-y-2 text-lead">
          {formulas.map((text) => (
            <Formula key={text} text={text} />
          ))}
          <QuantitySymbol of="s2" />
          <QuantitySymbol of="muEff" />
          <QuantitySymbol of="chiMCorrected" />
        </p>
      </Section>
      <Section id="buttons" title="Buttons">
        <div className="flex flex-wrap items-center gap-3">
          <Button kind="main">Attach outputs</Button>
          <Button>Preview deck</Button>
          <Button kind="quiet">Export CSV</Button>
          <Button kind="danger">Withdraw</Button>
          <Button disabled>Sign</Button>
          <Button kind="main" busy>
            Saving
          </Button>
          <Button size="small">Small</Button>
        </div>
      </Section>
      <Section
        id="fields"
        title="Fields"
        note="Unit and uncertainty belong to the field. The wrong value is kept."
      >
        <div className="grid grid-cols-3 items-start gap-x-6 gap-y-4.5 max-book:grid-cols-1">
          <Field label="Mass of the filling" defaultValue="0.1842" unit="± 0.0002 g" />
          <Field
            label="Temperature"
            defaultValue="295.2"
            unit="± 0.5 K"
            hint="In the balance, not in the room."
          />
          <Field
            label="Length of the filling"
            defaultValue="231"
            unit="cm"
            error="231 cm is longer than the tube (12 cm). Did you mean 2.31?"
          />
          <Select label="Cluster">
            <option>Loft, 2 × 16 cores</option>
          </Select>
          <TextArea
            label="Why do you doubt it?"
            rows={2}
            optional
            defaultValue="The second batch changed colour overnight."
          />
          <Field label="Sample" placeholder="FLW-Cu-D2" disabled />
          <fieldset className="col-span-full">
            <legend className="mb-1.5 text-small text-ink-2">Polyhedron</legend>
            <div className="flex flex-wrap gap-2.5">
              {['T-4', 'SP-4', 'SS-4', 'TBPY-5'].map((symbol, index) => (
                <Pick key={symbol} defaultChecked={index < 2} name="polyhedron" value={symbol}>
                  <PolyhedronGlyph symbol={symbol} size={30} decorative />
                  {symbol}
                </Pick>
              ))}
            </div>
          </fieldset>
        </div>
      </Section>
      <Section
        id="tables"
        title="Table states"
        note="A dotted underline opens the lines that a number was read from."
      >
        <Sift
          choices={[
            { key: 'all', count: 12, label: 'all', current: true, href: '?show=all' },
            {
              key: 'joined',
              count: 8,
              label: 'joined',
              current: false,
              href: '?show=joined',
              picture: <LinkMark kind="joined" width={44} decorative />,
            },
            {
              key: 'broken',
              count: 2,
              label: 'broken',
              current: false,
              href: '?show=broken',
              picture: <LinkMark kind="broken" width={44} decorative />,
            },
          ]}
        />
        <DataTable caption="Runs">
          <thead>
            <tr>
              <SortHead sorted="ascending" href="?sort=run">
                Run
              </SortHead>
              <SortHead numeric under={<Quantity value={null} absentWord="Eh" />} href="?sort=energy">
                Energy
              </SortHead>
              <SortHead>Outcome</SortHead>
            </tr>
          </thead>
          <tbody>
            <tr>
              <th scope="row">mncl4_m6</th>
              <td className="num">
                <Trace href="#x" label="−2991.413 656 hartree, show source">
                  <Quantity value={-2991.413656} digits={6} />
                </Trace>
              </td>
              <td>finished</td>
            </tr>
            <tr data-selected>
              <th scope="row">cucl4_m2, selected</th>
              <td className="num">
                <Quantity value={-3480.762348} digits={6} />
              </td>
              <td>finished</td>
            </tr>
            <tr>
              <th scope="row">cocl4_m4</th>
              <td className="num">
                <Absent />
              </td>
              <td>
                <span className="text-dissent">failed</span>
              </td>
            </tr>
          </tbody>
        </DataTable>
      </Section>
      <Section id="progress" title="Progress" note="Bytes sent, files read, jobs left. No spinner.">
        <div className="grid gap-6">
          <ProgressBar
            label="Bytes sent"
            value={0.62}
            done="14.2 of 22.9 MB sent"
            left="12 files · 4 read · 1 refused"
          />
          <ProgressBar label="Waiting" value={null} done="waiting for the first byte" />
          <p className="flex items-center gap-3 text-small">
            nicl4_m3.out <AtWork />
          </p>
        </div>
      </Section>
      <Section id="notices" title="Notices">
        <div className="grid gap-4">
          <Notice title="Two runs carry no job key">
            They were matched by composition and charge; check them.
          </Notice>
          <Notice kind="warning" title="Energies cannot be compared">
            The two candidates stand on different basis sets.
          </Notice>
          <Notice
            kind="error"
            title="The file stops in the middle"
            actions={<Button size="small">Show the line</Button>}
          >
            cocl4_m4.out, line 525: the SCF did not converge in 300 iterations.
          </Notice>
        </div>
      </Section>
      <Section id="states" title="Empty, error, loading">
        <div className="grid grid-cols-3 gap-11 max-book:grid-cols-1">
          <EmptyState
            level={3}
            title="No measurement yet"
            actions={
              <>
                <Button kind="main">Enter a reading</Button>
                <Button kind="quiet">Load the demo study</Button>
              </>
            }
          >
            Enter a balance, NMR or magnetometer reading of <Formula text="[Zn(OH2)6]2+" /> and the other end
            of this mark is tied.
          </EmptyState>
          <ErrorState
            level={3}
            title="This file stops in the middle"
            actions={<Button>Show the line</Button>}
          >
            <code className="font-mono text-[0.78125rem]">psi4/cocl4_m4.out</code>, line 525: the SCF did not
            converge in 300 iterations. No energy was read.
          </ErrorState>
          <SkeletonRows rows={4} label="Reading twelve outputs" />
        </div>
      </Section>
      <Section id="more" title="Panels on demand">
        <Tabs
          label="Excerpt"
          panels={[
            { key: 'record', label: 'Record', panel: 'What was read.' },
            { key: 'output', label: 'Output', panel: 'The text itself.' },
          ]}
        />
        <Disclosure summary="How this number was made">Formula, constants and source.</Disclosure>
      </Section>
    </>
  );
}
