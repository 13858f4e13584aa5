import { createHash } from 'node:crypto';
import { open } from 'node:fs/promises';
import { createOutputReader } from '@/lib/outputs/reader';
import type { OutputRecord } from '@/lib/outputs/record';

export const usage = `Usage: npm run -s cli -- read FILE…
Reads outputs of ORCA, Gaussian, NWChem and Psi4 and prints one JSON object a line: file, bytes, lines, sha256
and the record (energies in hartree, lengths in ångström, orbital energies in eV, times in s; absent is null).
A file that cannot be read or is no such output is named on stderr; the others are printed, and the exit is 1.`;

const buffer = new Uint8Array(1 << 20);

/** Reads a file piece by piece through one buffer. */
async function readFile(file: string): Promise<{ record: OutputRecord; sha256: string }> {
  const handle = await open(file, 'r');
  try {
    const reader = createOutputReader();
    const hash = createHash('sha256');
    for (;;) {
      const { bytesRead } = await handle.read(buffer, 0, buffer.length, null);
      if (bytesRead === 0) break;
      const piece = buffer.subarray(0, bytesRead);
      hash.update(piece);
      reader.push(piece);
    }
    return { record: reader.end().record, sha256: hash.digest('hex') };
  } finally {
    await handle.close();
  }
}

const reasons: Record<string, string> = {
  ENOENT: 'no such file',
  EISDIR: 'is a folder',
  EACCES: 'permission denied',
  ENOTDIR: 'no such file',
  ENAMETOOLONG: 'name too long',
};

function reasonOf(error: unknown): string {
  const code = error instanceof Error && 'code' in error ? String(error.code) : null;
  if (code === null) throw error;
  return reasons[code] ?? `cannot be read (${code})`;
}

/** Waits when the pipe is full, so that a slow reader of a long list costs no memory. */
function print(text: string): Promise<void> {
  return new Promise((resolve) => {
    if (process.stdout.write(text)) resolve();
    else process.stdout.once('drain', resolve);
  });
}

export async function run(args: string[]): Promise<number> {
  const files = args.filter((arg) => arg !== '--');
  if (files.length === 0) {
    process.stderr.write('spinstead read: no file given; usage: npm run -s cli -- read FILE…\n');
    return 1;
  }
  let exit = 0;
  const refuse = (file: string, reason: string) => {
    process.stderr.write(`${file}: ${reason}\n`);
    exit = 1;
  };
  for (const file of files) {
    try {
      const { record, sha256 } = await readFile(file);
      const { bytes, lines, ...rest } = record;
      if (bytes === 0) refuse(file, 'is empty');
      else if (record.program === null) refuse(file, 'is no output of ORCA, Gaussian, NWChem or Psi4');
      else await print(`${JSON.stringify({ file, bytes, lines, sha256, ...rest })}\n`);
    } catch (error) {
      refuse(file, reasonOf(error));
    }
  }
  return exit;
}
