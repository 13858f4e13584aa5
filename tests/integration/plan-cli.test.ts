import { spawnSync } from 'node:child_process';
import { existsSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';

let folder = '';
beforeAll(() => {
  folder = mkdtempSync(path.join(tmpdir(), 'plan-'));
  writeFileSync(path.join(folder, 't4.xyz'), xyz);
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

const xyz = '5\nstart\nFe 0 0 0\nCl 1.9 0 1.25\nCl -1.9 0 1.25\nCl 0 1.9 -1.25\nCl 0 -1.9 -1.25\n';
const job = {
  label: 'FeCl4',
  structure: { file: 't4.xyz' },
  charge: -2,
  multiplicity: 5,
  task: 'optimisation',
  method: 'M',
};
const plan = {
  methods: [{ name: 'M', program: 'NWChem', functional: 'B3LYP', basis: 'def2-SVP' }],
  cluster: { name: 'c', scheduler: 'Slurm' },
  jobs: [job],
};
function cli(content: unknown, name = 'plan.json', out = mkdtempSync(path.join(folder, 'out-'))) {
  writeFileSync(path.join(folder, name), typeof content === 'string' ? content : JSON.stringify(content));
  const result = spawnSync(
    process.execPath,
    ['--import', 'tsx', 'worker/cli/main.ts', 'plan', path.join(folder, name), '--out', out],
    { encoding: 'utf8' },
  );
  return { ...result, out };
}

describe('the plan command', () => {
  it('writes decks, scripts and lists', () => {
    const { status, stdout, stderr, out } = cli(plan);
    expect([status, stderr]).toEqual([0, '']);
    const summary = JSON.parse(stdout) as { jobs: { folder: string; deck: string; jobKey: string }[] };
    const [first] = summary.jobs;
    expect(readdirSync(out).toSorted()).toEqual(
      [first?.folder ?? '', 'manifest.csv', 'manifest.json', 'submit-all.sh'].toSorted(),
    );
    const deck = readFileSync(path.join(out, first?.folder ?? '', first?.deck ?? ''), 'utf8');
    expect(deck).toContain(`title "${first?.jobKey ?? ''} FeCl4 m5 optimisation"`);
    expect(existsSync(path.join(out, first?.folder ?? '', 'job.sh'))).toBe(true);
  });

  it('makes one job per candidate of a complex and says which have no structure', () => {
    const { stdout } = cli({
      ...plan,
      jobs: [],
      complexes: [
        {
          label: 'FeCl4',
          method: 'M',
          complex: {
            metals: [{ element: 'Fe', oxidationState: 2 }],
            ligands: [{ ligand: 'Cl', count: 4 }],
            charge: -2,
          },
          structures: { 'T-4': { xyz } },
        },
      ],
    });
    const summary = JSON.parse(stdout) as {
      jobs: { multiplicity: number }[];
      skipped: { candidate: string }[];
    };
    expect(summary.jobs.map((item) => item.multiplicity)).toEqual([5]);
    expect(summary.skipped.map((item) => item.candidate)).toEqual(['SP-4/4', 'SP-4/2']);
  });

  const atoms = Array.from({ length: 5000 }, (_, index) => `H ${index} 0 0`).join('\n');
  it.each<[string, unknown, RegExp]>([
    [
      'an impossible multiplicity',
      { ...plan, jobs: [{ ...job, multiplicity: 4 }] },
      /96 electrons cannot have multiplicity 4/,
    ],
    [
      'an unknown element',
      { ...plan, jobs: [{ ...job, structure: { xyz: '1\n\nXx 0 0 0\n' } }] },
      /"Xx" is no element symbol/,
    ],
    [
      'five thousand atoms',
      { ...plan, jobs: [{ ...job, structure: { xyz: `5000\n\n${atoms}\n` } }] },
      /5000 atoms/,
    ],
    [
      'a basis without the element',
      { ...plan, methods: [{ ...plan.methods[0], basis: '6-311G(d,p)' }] },
      /6-311G\(d,p\) has no functions for Fe/,
    ],
    [
      'a structure file that is not there',
      { ...plan, jobs: [{ ...job, structure: { file: 'none.xyz' } }] },
      /none\.xyz/,
    ],
    ['a method that is not there', { ...plan, jobs: [{ ...job, method: 'N' }] }, /no method "N"/],
    ['text that is no JSON', '{', /is no JSON/],
    ['a key that is not in the schema', { ...plan, extra: 1 }, /extra/],
    ['an empty plan', { ...plan, jobs: [] }, /no jobs/],
  ])('refuses %s with one line and no stack trace', (_what, content, message) => {
    const { status, stdout, stderr } = cli(content);
    expect([status, stdout]).toEqual([1, '']);
    expect(stderr).toMatch(message);
    expect(stderr.trim().split('\n')).toHaveLength(1);
  });

  it('does not write into a folder that holds something', () => {
    const { out } = cli(plan);
    const again = cli(plan, 'plan.json', out);
    expect(again.status).toBe(1);
    expect(again.stderr).toMatch(/is not empty/);
  });
});
