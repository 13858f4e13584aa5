import type { Landmark } from './landmark';
import { finishStep } from './finish-step';
import { mergeSteps } from './merge-steps';
import { stoppedWithoutWord, watchInterruptions } from './interruptions';
import type { ProgramDefinition, ProgramReading, ProgramResult } from './program';
import { programs } from './programs';
import type { Failure, OutputRecord } from './record';
import { LineScanner } from './scanner';

/**
 * Changes whenever the same bytes may give another record: records of an older version are read again.
 */
export const READER_VERSION = '1.0.0';

export interface OutputReading {
  record: OutputRecord;
  /** Byte offsets of lines 1, 1001, 2001 … (LINES_PER_OFFSET): where to open the raw file around a line. */
  lineOffsets: number[];
}

export interface OutputReader {
  /** The bytes of the file in order, in pieces of any size; a piece's memory may be reused afterwards. */
  push(chunk: Uint8Array): void;
  /** To be called once, after the last piece. */
  end(): OutputReading;
}

/**
 * Reads one program output in one pass and constant memory. Never throws on content: text of no known
 * program gives a record with `program: null`. The program is recognised by its own lines, not by names.
 * @param known - the programs to look for, all by default
 */
export function createOutputReader(known: readonly ProgramDefinition[] = programs): OutputReader {
  let program: ProgramDefinition | null = null;
  let reading: ProgramReading | null = null;
  const interruptions = watchInterruptions();
  const marks: Landmark[] = known.flatMap((candidate) =>
    candidate.marks.map((text) => ({
      text,
      read(line) {
        program = candidate;
        reading = candidate.open();
        return scanner.switchTo([...reading.landmarks, ...interruptions.landmarks], line);
      },
    })),
  );
  const scanner = new LineScanner(marks);
  return {
    push: (chunk) => scanner.push(chunk),
    end() {
      scanner.end();
      const result = completeFailure(reading?.end() ?? null, interruptions.failure());
      const steps = result.steps.map(finishStep);
      const size = { bytes: scanner.bytes, lines: scanner.lines };
      return {
        record: mergeSteps(program?.name ?? null, { ...result, steps }, size),
        lineOffsets: scanner.lineOffsets,
      };
    },
  };
}

/** A run that stopped has a failure too: what the scheduler said, or that nobody said anything. */
function completeFailure(result: ProgramResult | null, interruption: Failure | null): ProgramResult {
  if (!result) return { steps: [], outcome: 'cut off', failure: null };
  if (result.outcome === 'finished' || result.failure) return result;
  const failure = interruption ?? stoppedWithoutWord;
  const steps = result.steps.map((step, i) =>
    i === result.steps.length - 1 && step.outcome !== 'finished' ? { ...step, failure } : step,
  );
  return { ...result, steps, failure };
}

/** The record of an output that is in memory whole or in pieces. */
export function readOutput(content: Uint8Array | Iterable<Uint8Array>): OutputRecord {
  const reader = createOutputReader();
  for (const chunk of content instanceof Uint8Array ? [content] : content) reader.push(chunk);
  return reader.end().record;
}

/** The program whose lines a text begins with or contains, or null: for a look at a file's first bytes. */
export function detectProgram(bytes: Uint8Array): OutputRecord['program'] {
  return readOutput(bytes).program;
}
