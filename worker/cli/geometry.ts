import { readFile } from 'node:fs/promises';
import { hillFormula } from '../../lib/chemistry/formula';
import { describeCentres } from '../../lib/geometry/describe-centres';
import { readXyz } from '../../lib/structures/read-xyz';

export const usage = [
  'Usage: npm run -s cli -- geometry [--frame N] FILE…',
  '',
  'Prints one JSON object per XYZ file: file, formula and the metal centres with their donors, distances,',
  'distortion indices and shape measures. Distances in Å, angles in degrees, atom indices from 0.',
  '--frame N  takes frame N (from 1) of a file with several; without it the last.',
  'Exit 1 when a file could not be read; the others are still printed.',
].join('\n');

interface Arguments {
  files: string[];
  frame: number | null;
}

export async function run(args: string[]): Promise<number> {
  const parsed = parseArguments(args);
  if (typeof parsed === 'string') {
    process.stderr.write(`spinstead: ${parsed}\n`);
    return 1;
  }
  let code = 0;
  for (const file of parsed.files) {
    const answer = await describeFile(file, parsed.frame);
    if (answer.failed) {
      process.stderr.write(`spinstead: ${file}: ${answer.text}\n`);
      code = 1;
    } else {
      for (const warning of answer.warnings) process.stderr.write(`spinstead: ${file}: ${warning}\n`);
      process.stdout.write(`${answer.text}\n`);
    }
  }
  return code;
}

type Answer = { failed: true; text: string } | { failed: false; text: string; warnings: string[] };

async function describeFile(file: string, frameNumber: number | null): Promise<Answer> {
  let bytes: Buffer;
  try {
    bytes = await readFile(file);
  } catch (error) {
    if (!(error instanceof Error) || !('code' in error)) throw error;
    const reason =
      error.code === 'ENOENT' ? 'there is no such file' : `cannot be opened (${String(error.code)})`;
    return { failed: true, text: reason };
  }
  if (bytes.includes(0)) return { failed: true, text: 'is binary, not an XYZ file' };
  const frames = readXyz(bytes.toString('utf8'));
  if (!frames.ok) return { failed: true, text: `line ${frames.error.line}: ${frames.error.message}` };
  const frame = frames.value.at(frameNumber === null ? -1 : frameNumber - 1);
  if (!frame) {
    return { failed: true, text: `has ${frames.value.length} frame(s), frame ${frameNumber} was asked for` };
  }
  const centres = describeCentres(frame);
  return {
    failed: false,
    text: JSON.stringify({ file, formula: hillFormula(frame.elements), centres }),
    warnings: frame.warnings.map((warning) => `line ${warning.line}: ${warning.message}`),
  };
}

function parseArguments(args: readonly string[]): Arguments | string {
  const files: string[] = [];
  let frame: number | null = null;
  for (let i = 0; i < args.length; i++) {
    const [, inline] = /^--frame(?:=(.*))?$/.exec(args[i] ?? '') ?? [];
    if (args[i] === '--frame' || inline !== undefined) {
      const text = inline ?? args[++i];
      if (text === undefined || !/^[1-9]\d*$/.test(text)) {
        return `--frame takes a whole number from 1, got "${text ?? ''}"`;
      }
      frame = Number(text);
    } else if (args[i]?.startsWith('--')) {
      return `geometry knows no option "${args[i]}"; it takes --frame N`;
    } else {
      files.push(args[i] ?? '');
    }
  }
  return files.length === 0 ? 'geometry needs at least one XYZ file' : { files, frame };
}
