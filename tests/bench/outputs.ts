import { spawnSync } from 'node:child_process';
import {
  closeSync,
  existsSync,
  mkdtempSync,
  openSync,
  readFileSync,
  rmSync,
  writeFileSync,
  writeSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { buildSync } from 'esbuild';
import { programs } from '@/lib/outputs/programs';

/**
 * How fast an output is read, and in how much memory: 300 MB and 3 GB made by repeating the steps of a real
 * optimisation, read by the bundled reader in a process of its own, beside `wc -l` and a grep for the reader's
 * own landmarks on the same file.
 */
const sources = [
  {
    file: '../shared/outputs/orca/dvb-opt.out',
    program: 'ORCA',
    from: /^.*GEOMETRY OPTIMIZATION CYCLE {3}2/m,
    to: /^.*GEOMETRY OPTIMIZATION CYCLE {3}3/m,
  },
  {
    file: '../shared/outputs/nwchem/dvb-opt.out',
    program: 'NWChem',
    from: /^ {10}Step {3}1/m,
    to: /^ {10}Step {3}2/m,
  },
];

const childSource = `
import { openSync, readSync } from 'node:fs';
import { createOutputReader } from '@/lib/outputs/reader';
const buffer = new Uint8Array(1 << 20);
const file = openSync(process.argv[2], 'r');
const start = performance.now();
const reader = createOutputReader();
for (;;) {
  const length = readSync(file, buffer, 0, buffer.length, null);
  if (length === 0) break;
  reader.push(buffer.subarray(0, length));
}
const { record } = reader.end();
const seconds = (performance.now() - start) / 1000;
const peakMb = process.resourceUsage().maxRSS / 1024;
console.log(JSON.stringify({ seconds, peakMb, lines: record.lines, steps: record.optimisation?.steps }));
`;

/** Writes a file of about so many bytes: the head of the output, its middle again and again, its tail. */
function writeLong(source: (typeof sources)[number], target: string, bytes: number): number {
  const text = readFileSync(path.resolve(process.cwd(), source.file), 'latin1');
  const from = text.search(source.from);
  const to = text.search(source.to);
  if (from < 0 || to <= from) throw new RangeError(`${source.file} holds no step to repeat`);
  const middle = Buffer.from(text.slice(from, to), 'latin1');
  const file = openSync(target, 'w');
  let written = writeSync(file, Buffer.from(text.slice(0, from), 'latin1'));
  while (written < bytes) written += writeSync(file, middle);
  written += writeSync(file, Buffer.from(text.slice(to), 'latin1'));
  closeSync(file);
  return written;
}

function secondsOf(command: string, args: string[]): number {
  const start = performance.now();
  const { status, stderr } = spawnSync(command, args, {
    env: { ...process.env, LC_ALL: 'C' },
    encoding: 'utf8',
  });
  if (status !== 0) throw new Error(`${command} ended with ${status}: ${stderr}`);
  return (performance.now() - start) / 1000;
}

interface ChildReport {
  seconds: number;
  peakMb: number;
  lines: number;
  steps: number;
}

export async function run(): Promise<void> {
  const folder = mkdtempSync(path.join(tmpdir(), 'spinstead-outputs-'));
  try {
    const child = path.join(folder, 'child.mjs');
    buildSync({
      stdin: { contents: childSource, resolveDir: process.cwd(), loader: 'ts' },
      bundle: true,
      platform: 'node',
      format: 'esm',
      outfile: child,
      alias: { '@': process.cwd() },
    });
    for (const source of sources) {
      if (!existsSync(path.resolve(process.cwd(), source.file))) {
        console.log(`${source.file}: absent, not measured`);
        continue;
      }
      const landmarks = path.join(folder, 'landmarks');
      const reading = programs.find(({ name }) => name === source.program)?.open();
      writeFileSync(landmarks, (reading?.landmarks ?? []).map(({ text }) => `${text}\n`).join(''));
      for (const megabytes of [300, 3000]) {
        const long = path.join(folder, 'long.out');
        const bytes = writeLong(source, long, megabytes * 1e6);
        secondsOf('wc', ['-l', long]); // brings the file into memory
        const wc = secondsOf('wc', ['-l', long]);
        const grep = secondsOf('grep', ['-c', '-F', '-f', landmarks, long]);
        const { stdout } = spawnSync(process.execPath, [child, long], { encoding: 'utf8' });
        const report = JSON.parse(stdout) as ChildReport;
        const rate = (seconds: number) => `${(bytes / 1e6 / seconds).toFixed(0)} MB/s`;
        console.log(
          `${source.program} ${megabytes} MB, ${report.lines} lines, ${report.steps} optimisation steps: ` +
            `read ${rate(report.seconds)}, peak ${report.peakMb.toFixed(0)} MB; wc -l ${rate(wc)}; ` +
            `grep ${rate(grep)}; ${(report.seconds / wc).toFixed(1)} times wc, ${(report.seconds / grep).toFixed(1)} times grep`,
        );
        rmSync(long);
      }
    }
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}
