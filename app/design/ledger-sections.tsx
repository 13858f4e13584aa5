import { AcrossPages } from '@/components/ledger/across-pages';
import { Book } from '@/components/ledger/book';
import { CandidateTable } from '@/components/ledger/candidate-table';
import { ChecksList } from '@/components/ledger/checks-list';
import { Foot } from '@/components/ledger/foot';
import { Fraction } from '@/components/ledger/fraction';
import { IndexTabs } from '@/components/ledger/index-tabs';
import { Leaf } from '@/components/ledger/leaf';
import { LeafHead } from '@/components/ledger/leaf-head';
import { OutputExcerpt } from '@/components/ledger/output-excerpt';
import { RunningHead } from '@/components/ledger/running-head';
import { Spread } from '@/components/ledger/spread';
import { SquareRoot } from '@/components/ledger/square-root';
import { StudyLedger } from '@/components/ledger/study-ledger';
import { UncertaintyBudget } from '@/components/ledger/uncertainty-budget';
import { WorkedSteps } from '@/components/ledger/worked-steps';
import { MomentRuler } from '@/components/marks/moment-ruler';
import { Quantity } from '@/components/numbers/quantity';
import { QuantitySymbol } from '@/components/numbers/quantity-symbol';
import { StructureViewer } from '@/components/viewer/structure-viewer';
import { sampleBands, sampleGroups, sampleStructure } from './samples';

/** A study ledger and a complex spread as the pages lay them out. */
export function LedgerSections() {
  return (
    <>
      <IndexTabs
        tabs={[
          { href: '#study', label: 'Study', current: true },
          { href: '#plan', label: 'Plan' },
          { href: '#runs', label: 'Runs' },
          { href: '#measurements', label: 'Measurements' },
          { href: '#disagreements', label: 'Disagreements', count: { value: 2, word: 'open' } },
          { href: '#report', label: 'Report' },
        ]}
      />
      <Book>
        <StudyLedger
          groups={sampleGroups}
          calculatedNote="B3LYP/def2-SVP, gas phase · sample values"
          measuredNote={
            <>
              ± is expanded uncertainty, <QuantitySymbol of="coverage" /> = 2 (95 %) · sample values
            </>
          }
          sort={{ key: 'complex', direction: 'ascending' }}
          sortLinks={{ complex: '?sort=complex', gap: '?sort=gap', moment: '?sort=moment' }}
        />
      </Book>
      <Foot
        notes={[
          { id: 'n1', lead: '†', text: 'The spin is contaminated: the gap is shown, not trusted.' },
          { lead: 'Handbook μ', text: 'is a room-temperature range, a soft limit.' },
          { lead: 'Sample values', text: 'on this page belong to no study.' },
        ]}
      />
      <Book>
        <Spread
          left={
            <Leaf labelledBy="left-head">
              <RunningHead side="calculated" id="left-head">
                B3LYP/def2-SVP, gas phase · 2 runs
              </RunningHead>
              <LeafHead>Candidates</LeafHead>
              <CandidateTable
                caption="Calculated properties of two candidates"
                columns={[
                  { key: 't4', head: 'T-4 flattened' },
                  { key: 'sp4', head: 'SP-4' },
                ]}
                rows={[
                  {
                    key: 'energy',
                    head: (
                      <>
                        Energy, <i>E</i>
                        <sub>h</sub>
                      </>
                    ),
                    values: [
                      {
                        text: <Quantity value={-3480.762348} digits={6} />,
                        href: '#slip',
                        label: '−3480.762 348 hartree, show source',
                      },
                      {
                        text: <Quantity value={-3480.752291} digits={6} />,
                        href: '#slip',
                        label: '−3480.752 291 hartree, show source',
                      },
                    ],
                    slip: (
                      <OutputExcerpt
                        file="cucl4_m2.out"
                        line={18928}
                        lineCount={19262}
                        firstLine={18926}
                        lines={[
                          '   The DFT is already converged',
                          '',
                          '         Total DFT energy =  -3480.762348419284',
                          '',
                        ]}
                        sha256="bbeaba3500000000000000000000000000000000000000000000000000000f26"
                        reason="Last of 9 printed"
                      />
                    ),
                  },
                  {
                    key: 'tau',
                    head: <QuantitySymbol of="tau4" />,
                    values: [{ text: '0.716' }, { text: '0.000' }],
                  },
                  { key: 'freq', head: 'Lowest frequency', values: [{ text: null }, { text: null }] },
                ]}
              />
              <LeafHead note="T-4 flattened">Centre</LeafHead>
              <StructureViewer structure={sampleStructure} />
            </Leaf>
          }
          right={
            <Leaf labelledBy="right-head">
              <RunningHead side="measured" id="right-head">
                <i>u</i> is standard uncertainty, <QuantitySymbol of="coverage" /> = 1, on this page
              </RunningHead>
              <LeafHead>From reading to moment</LeafHead>
              <WorkedSteps
                steps={[
                  {
                    key: 'chi',
                    symbol: <QuantitySymbol of="chiG" />,
                    formula: (
                      <Fraction
                        over={
                          <>
                            <i>C l</i> (<i>R</i> − <i>R</i>
                            <sub>0</sub>)
                          </>
                        }
                        under={
                          <>
                            10<sup>9</sup> <i>m</i>
                          </>
                        }
                      />
                    ),
                    value: (
                      <Quantity
                        value={3.121e-6}
                        uncertainty={0.07e-6}
                        powerOfTen={-6}
                        unit="cm3 g-1"
                        strong
                      />
                    ),
                    source: 'C = 1.024(15), HgCo(NCS)₄',
                  },
                  {
                    key: 'mu',
                    symbol: <QuantitySymbol of="muEff" />,
                    formula: (
                      <>
                        2.8279{' '}
                        <SquareRoot>
                          <QuantitySymbol of="chiMCorrected" /> <i>T</i>
                        </SquareRoot>
                      </>
                    ),
                    value: <Quantity value={1.971} uncertainty={0.019} unit="muB" strong />,
                    source: 'T = 295.2(5) K',
                  },
                ]}
              />
              <LeafHead>Where the uncertainty comes from</LeafHead>
              <UncertaintyBudget
                caption="Uncertainty budget of the gram susceptibility"
                lines={[
                  { key: 'c', source: 'Calibration', relativePercent: 1.5, share: 0.479 },
                  { key: 'l', source: 'Length of filling', relativePercent: 1.5, share: 0.479 },
                  { key: 'r', source: 'Repeat, four fillings', relativePercent: 0.4, share: 0.034 },
                ]}
              />
            </Leaf>
          }
        />
        <AcrossPages
          id="across-ruler"
          title="Moment ruler"
          note="handbook bands in blue, soft limits near 295 K"
        >
          <MomentRuler bands={sampleBands} measured={{ mu: 1.97, expandedU: 0.04 }} />
        </AcrossPages>
        <AcrossPages id="across-checks" title="Checks" note="two hold, one waits, one fails">
          <ChecksList
            lines={[
              {
                key: '1',
                state: 'holds',
                name: 'Optimisation converged',
                finding: 'both runs, four criteria',
                where: 'cucl4_m2 line 19 055',
              },
              {
                key: '2',
                state: 'not evaluated',
                name: 'Minimum, not saddle',
                finding: 'no frequencies printed',
                where: 'plan two frequency jobs',
              },
              {
                key: '3',
                state: 'cannot tell',
                name: 'Moment tells candidates apart',
                finding: 'both bands hold 1.97 ± 0.04',
              },
              {
                key: '4',
                state: 'fails',
                name: 'Spin contamination',
                finding: '⟨S²⟩ off by 1.003; limit 0.05',
              },
            ]}
          />
        </AcrossPages>
      </Book>
    </>
  );
}
