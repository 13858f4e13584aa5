import { execFileSync, spawnSync } from 'node:child_process';
import { createServer } from 'node:http';
import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { spawn } from 'node:child_process';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterEach, describe, expect, it } from 'vitest';
import { clusterSchema, startingClusters, type ClusterInput } from '@/lib/planning/cluster';
import { buildPackage, type PackageFile } from '@/lib/planning/packages/build-package';
import { jobFolderName } from '@/lib/planning/packages/file-name';
import { manifestCsv } from '@/lib/planning/packages/manifest';
import { wallClock } from '@/lib/planning/packages/scheduler-header';
import { request } from '../decks/deck-cases';

const has = (program: string) => spawnSync('which', [program]).status === 0;
const job = (jobKey: string, program: 'ORCA' | 'Gaussian' | 'NWChem' | 'Psi4' = 'NWChem') => ({
  ...request({ program }, { jobKey }),
  origin: 'built by hand',
});
const handBack = { url: 'https://example.org/api/v1/outputs/{jobKey}', tokenVariable: 'SPINSTEAD_TOKEN' };
const build = (cluster: ClusterInput, jobs = [job('SP1234567W')]) => {
  const built = buildPackage(jobs, clusterSchema.parse(cluster));
  if (!built.ok) throw new Error(built.error.message);
  return built.value;
};

const folders: string[] = [];
function unpack(files: readonly PackageFile[]): string {
  const folder = mkdtempSync(path.join(tmpdir(), 'package-'));
  folders.push(folder);
  for (const file of files) {
    mkdirSync(path.dirname(path.join(folder, file.path)), { recursive: true });
    writeFileSync(path.join(folder, file.path), file.text, { mode: file.executable ? 0o755 : 0o644 });
  }
  return folder;
}
afterEach(() => {
  for (const folder of folders.splice(0)) rmSync(folder, { recursive: true, force: true });
});

describe('a package', () => {
  it('has a folder per job with deck, start.xyz and script, and the lists beside them', () => {
    const { files, manifest } = build({ name: 'c', scheduler: 'Slurm' });
    expect(files.map((file) => file.path)).toEqual([
      'SP1234567W-fecl4-m5-single-point/SP1234567W.nw',
      'SP1234567W-fecl4-m5-single-point/start.xyz',
      'SP1234567W-fecl4-m5-single-point/job.sh',
      'submit-all.sh',
      'manifest.json',
      'manifest.csv',
    ]);
    expect(files[1]?.text.split('\n').slice(0, 2)).toEqual(['5', 'SP1234567W built by hand']);
    expect(JSON.parse(files[4]?.text ?? '')).toEqual({ manifestVersion: 1, jobs: manifest });
    expect(files[5]?.text.split('\r\n')).toHaveLength(3);
  });

  const scripts = startingClusters.flatMap((cluster) =>
    (['ORCA', 'Gaussian', 'NWChem', 'Psi4'] as const).map((program) => ({ cluster, program })),
  );
  it.each(scripts)('has scripts that bash accepts: $cluster.scheduler, $program', ({ cluster, program }) => {
    const folder = unpack(
      build({ ...cluster, handBack, modules: ['chem/2024'] }, [job('SP1234567W', program)]).files,
    );
    const found = execFileSync('find', [folder, '-name', '*.sh'], { encoding: 'utf8' }).trim().split('\n');
    expect(found).toHaveLength(2);
    for (const script of found) {
      expect(spawnSync('bash', ['-n', script], { encoding: 'utf8' })).toMatchObject({
        status: 0,
        stderr: '',
      });
      if (has('shellcheck')) expect(spawnSync('shellcheck', [script], { encoding: 'utf8' }).stdout).toBe('');
    }
  });

  it('asks each scheduler in its own words', () => {
    const header = (scheduler: ClusterInput['scheduler']) =>
      build({
        name: 'c',
        scheduler,
        cores: 4,
        memoryMb: 8000,
        wallMinutes: 2165,
        queue: 'long',
        account: 'chem',
      })
        .files[2]?.text.split('\n')
        .filter((line) => /^#(SBATCH|PBS|\$) /.test(line));
    expect(header('Slurm')).toContain('#SBATCH --time=36:05:00');
    expect(header('Slurm')).toContain('#SBATCH --partition=long');
    expect(header('PBS')).toContain('#PBS -l select=1:ncpus=4:mpiprocs=4:mem=8000mb');
    expect(header('Torque')).toContain('#PBS -l nodes=1:ppn=4,mem=8000mb');
    // h_vmem counts per slot.
    expect(header('Grid Engine')).toContain('#$ -l h_vmem=2000M');
    expect(header('shell')).toEqual([]);
    expect(wallClock(59)).toBe('00:59:00');
  });

  it('runs, hands the output back with the token, and keeps the program’s exit code', async () => {
    const seen: { url: string; token: string; body: string }[] = [];
    const server = createServer((incoming, answer) => {
      let body = '';
      incoming.on('data', (chunk: Buffer) => (body += chunk.toString()));
      incoming.on('end', () => {
        seen.push({ url: incoming.url ?? '', token: incoming.headers.authorization ?? '', body });
        answer.end('ok');
      });
    });
    await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
    const address = server.address();
    const port = typeof address === 'object' && address ? address.port : 0;
    const { files } = build({
      name: 'c',
      scheduler: 'shell',
      commands: { NWChem: 'echo "energy of {deck}" > {output}; (exit 7)' },
      handBack: { url: `http://127.0.0.1:${port}/outputs/{jobKey}`, tokenVariable: 'SPINSTEAD_TOKEN' },
    });
    const folder = unpack(files);
    const child = spawn('bash', [path.join(folder, 'SP1234567W-fecl4-m5-single-point/job.sh')], {
      env: { ...process.env, SPINSTEAD_TOKEN: 'secret' },
    });
    const status = await new Promise((resolve) => child.on('exit', resolve));
    server.close();
    expect(status).toBe(7);
    expect(seen).toEqual([
      { url: '/outputs/SP1234567W', token: 'Bearer secret', body: 'energy of SP1234567W.nw\n' },
    ]);
  });

  it('submits each job once and says which could not be submitted', () => {
    const { files } = build({ name: 'c', scheduler: 'shell', commands: { NWChem: 'true', ORCA: 'false' } }, [
      job('SP1234567W'),
      job('SP0000000' + '0', 'ORCA'),
    ]);
    const folder = unpack(files);
    const first = spawnSync('bash', [path.join(folder, 'submit-all.sh')], { encoding: 'utf8' });
    expect(first.status).toBe(1);
    expect(first.stdout).toContain('SP1234567W-fecl4-m5-single-point: submitted');
    expect(first.stderr).toContain('SP00000000-fecl4-m5-single-point: not submitted');
    const second = spawnSync('bash', [path.join(folder, 'submit-all.sh')], { encoding: 'utf8' });
    expect(second.stdout).toContain('SP1234567W-fecl4-m5-single-point: submitted before');
  });

  it('is refused for a key used twice, a job that cannot be written and a request above the limits', () => {
    const cluster = clusterSchema.parse({ name: 'c', scheduler: 'Slurm' });
    const code = (result: ReturnType<typeof buildPackage>) =>
      result.ok ? null : [result.error.code, result.error.jobIndex];
    expect(code(buildPackage([job('SP1234567W'), job('SP1234567W')], cluster))).toEqual([
      'key used twice',
      1,
    ]);
    expect(code(buildPackage([{ ...job('SP1234567W'), multiplicity: 2 }], cluster))).toEqual([
      'impossible multiplicity',
      0,
    ]);
    expect(code(buildPackage([], cluster))).toEqual(['no jobs', null]);
    expect(
      code(buildPackage([job('SP1234567W')], { ...cluster, limits: { ...cluster.limits, cores: 2 } })),
    ).toEqual(['above cluster limit', null]);
  });
});

describe('names and lists', () => {
  it('are safe on every file system whatever the label', () => {
    for (const label of ['a/b\\c:d*e?f"g<h>i|j', 'CON', '..', 'Größe ²⁺ ', 'x'.repeat(300), '', 'trailing. '])
      expect(jobFolderName('SP1234567W', label)).toMatch(/^SP1234567W(-[a-z0-9]+)*$/);
    expect(jobFolderName('SP1234567W', 'x'.repeat(300))).toHaveLength(60);
  });

  it('quote commas and quotation marks and disarm spreadsheet formulas', () => {
    const { manifest } = build({ name: 'c', scheduler: 'Slurm' });
    const csv = manifestCsv(manifest.map((row) => ({ ...row, label: '=1+1,"x"' })));
    expect(csv).toContain('" =1+1,""x"""');
    expect(csv).toContain(',-2,5\r\n');
  });

  it('refuse a profile whose words could run a command', () => {
    for (const bad of [
      { queue: 'a; rm' },
      { account: '$(id)' },
      { modules: ['a b'] },
      { handBack: { ...handBack, url: "http://x/'" } },
    ])
      expect(clusterSchema.safeParse({ name: 'c', scheduler: 'Slurm', ...bad }).success).toBe(false);
  });
});
