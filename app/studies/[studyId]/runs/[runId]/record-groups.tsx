import { LeafHead } from '@/components/ledger/leaf-head';
import { Trace } from '@/components/numbers/trace';
import { Quantity } from '@/components/numbers/quantity';
import type { OutputRecord } from '@/lib/outputs/record';

interface Value {
  words: string;
  value: React.ReactNode;
  /** Path of the value in the record's evidence. */
  path?: string;
}

const number = (value: number | null | undefined, digits: number) =>
  value === null || value === undefined ? null : <Quantity value={value} digits={digits} />;

/** The record in readable groups; every value with evidence opens the lines it was read from. */
export function RecordGroups({ record }: { record: OutputRecord }) {
  const { method, optimisation, frequencies, thermochemistry, orbitals } = record;
  const groups: { title: string; values: Value[] }[] = [
    {
      title: 'What was calculated',
      values: [
        { words: 'Tasks', value: record.tasks.join(', ') || null, path: 'tasks' },
        { words: 'Title', value: record.title, path: 'title' },
        { words: 'Formula', value: record.formula },
        { words: 'Charge', value: number(record.charge, 0), path: 'charge' },
        { words: 'Multiplicity', value: number(record.multiplicity, 0), path: 'multiplicity' },
        { words: 'Functional', value: method.functional, path: 'method.functional' },
        { words: 'Basis', value: method.basis, path: 'method.basis' },
        { words: 'Reference', value: method.reference, path: 'method.reference' },
        { words: 'Dispersion', value: method.dispersion, path: 'method.dispersion' },
        { words: 'Solvation', value: method.solvation, path: 'method.solvation' },
        { words: 'Relativity', value: method.relativity, path: 'method.relativity' },
      ],
    },
    {
      title: 'Energy and spin',
      values: [
        { words: 'Energy, Eh', value: number(record.energyHartree, 9), path: 'energyHartree' },
        { words: 'SCF converged', value: yesNo(record.scf.converged), path: 'scf.converged' },
        { words: 'SCF iterations', value: number(record.scf.iterations, 0), path: 'scf.iterations' },
        { words: '⟨S²⟩', value: number(record.spin.s2, 4), path: 'spin.s2' },
        { words: '⟨S²⟩ ideal', value: number(record.spin.s2Ideal, 4), path: 'spin.s2Ideal' },
        { words: 'α HOMO, eV', value: number(orbitals?.alpha.homoEv, 3), path: 'orbitals.alpha.homoEv' },
        { words: 'α LUMO, eV', value: number(orbitals?.alpha.lumoEv, 3), path: 'orbitals.alpha.lumoEv' },
        { words: 'β HOMO, eV', value: number(orbitals?.beta?.homoEv, 3), path: 'orbitals.beta.homoEv' },
        { words: 'β LUMO, eV', value: number(orbitals?.beta?.lumoEv, 3), path: 'orbitals.beta.lumoEv' },
        { words: 'Dipole, D', value: number(record.dipoleDebye, 3), path: 'dipoleDebye' },
      ],
    },
    {
      title: 'Geometry and vibrations',
      values: [
        {
          words: 'Optimisation converged',
          value: optimisation && yesNo(optimisation.converged),
          path: 'optimisation.converged',
        },
        { words: 'Optimisation steps', value: number(optimisation?.steps, 0) },
        { words: 'Frequencies', value: number(frequencies?.count, 0), path: 'frequencies' },
        {
          words: 'Lowest frequency, cm⁻¹',
          value: number(frequencies?.lowestCm1, 2),
          path: 'frequencies.lowestCm1',
        },
        { words: 'Imaginary frequencies', value: number(frequencies?.imaginaryCount, 0) },
        {
          words: 'Zero-point energy, Eh',
          value: number(thermochemistry?.zeroPointHartree, 6),
          path: 'thermochemistry.zeroPointHartree',
        },
        {
          words: 'Gibbs energy, Eh',
          value: number(thermochemistry?.gibbsHartree, 6),
          path: 'thermochemistry.gibbsHartree',
        },
        {
          words: 'Wall time, s',
          value: number(record.resources.wallSeconds, 1),
          path: 'resources.wallSeconds',
        },
        { words: 'Cores', value: number(record.resources.cores, 0), path: 'resources.cores' },
      ],
    },
  ];
  return (
    <div className="grid gap-x-14 wide:grid-cols-3">
      {groups.map(({ title, values }) => (
        <section key={title}>
          <LeafHead>{title}</LeafHead>
          <dl>
            {values.map(({ words, value, path }) => (
              <div key={words} className="flex justify-between gap-4 border-b border-rule py-1.5">
                <dt className="text-ink-2">{words}</dt>
                <dd className="text-right">{traced(record, value, path, words)}</dd>
              </div>
            ))}
          </dl>
        </section>
      ))}
    </div>
  );
}

function traced(record: OutputRecord, value: React.ReactNode, path: string | undefined, words: string) {
  if (value === null || value === undefined) return <i className="text-ink-3">absent</i>;
  const line = path === undefined ? undefined : record.evidence[path]?.line;
  if (line === undefined) return value;
  return (
    <Trace href={`?line=${line}#excerpt`} label={`${words}: show line ${line} of the output`}>
      {value}
    </Trace>
  );
}

function yesNo(value: boolean | null): string | null {
  return value === null ? null : value ? 'yes' : 'no';
}
