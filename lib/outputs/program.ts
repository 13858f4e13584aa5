/**
 * How a program file is written.
 *
 *     export const example = defineProgram<ExampleState>({
 *       name: 'NWChem',
 *       marks: ['Example Package, version'],          // any of these lines says that the file is this program's
 *       start: () => ({ steps: [], current: null, … }),         // what is known so far; a fresh one per file
 *       landmarks: { ...runLandmarks, ...energyLandmarks },    // text → what to do with that line
 *       end: (state) => ({ steps, outcome, failure }),
 *     });
 *
 * - The keys of `landmarks` are beginnings of lines (scanner.ts says how they are compared). The function gets
 *   the line and the state; it reads what stands on the line itself, and may return a `Section` that takes the
 *   lines below. A landmark closes whatever section is open; a section that was not closed by its own last line
 *   has saved nothing, so a table cut short is absent instead of half read. `rowTable` (row-table.ts) writes
 *   the usual section in one expression.
 * - In place of the function, `{ read, always: true }` marks a landmark that is looked for inside echoed input
 *   too, `{ read, onlyOutside: true }` one that must not break off a table, `{ read, evenUnended: true }` a closing
 *   line; `glance` looks at the bytes first, for rows by the hundred thousand (nwchem/orbitals.ts).
 * - The line that recognised the program is shown to its landmarks too.
 * - A job is a `StepDraft` (step-draft.ts): values of the job go into its `step`, those of one geometry into its
 *   `point`, by plain assignment, and `cite(holder, 'spin.s2', line)` (cite.ts) keeps the line as evidence. When
 *   the job is over, `addStep(steps, draft.finish())` (step-list.ts). Numbers are read with numbers.ts: stars, `inf` and nonsense are null.
 * - What is true for every program (formula, atom count, warnings on parity and spin sums, the top level) is done
 *   by finish-step.ts and merge-steps.ts; a program file reports only what is printed.
 *
 * A fifth program is one such file (a folder with a file per section past 250 lines), one line in programs.ts,
 * its name in record.ts, and its fixtures.
 */
import type { Landmark, Line, Section } from './landmark';
import type { Failure, Outcome, Program, Step } from './record';

/** What a program file knows at the end: every job in file order and how the file as a whole ended. */
export interface ProgramResult {
  steps: Step[];
  outcome: Outcome;
  failure: Failure | null;
  /** Timings of the whole file where they are printed apart from those of the steps, with their evidence. */
  whole?: Pick<Step, 'resources' | 'evidence'>;
}

export type LandmarkReader<State> = (line: Line, state: State) => Section | void;

export interface LandmarkEntry<State> {
  read: LandmarkReader<State>;
  glance?: (bytes: Uint8Array, from: number, to: number, lineNumber: number, state: State) => boolean;
  always?: boolean;
  onlyOutside?: boolean;
  evenUnended?: boolean;
}

/** Beginning of a line → how that line is read. */
export type LandmarkMap<State> = Record<string, LandmarkReader<State> | LandmarkEntry<State>>;

/** A program being read: landmarks bound to the state of one file. */
export interface ProgramReading {
  landmarks: Landmark[];
  end(): ProgramResult;
}

export interface ProgramDefinition {
  name: Program;
  marks: readonly string[];
  open(): ProgramReading;
}

export function defineProgram<State>(definition: {
  name: Program;
  marks: readonly string[];
  start: () => State;
  landmarks: LandmarkMap<State>;
  end: (state: State) => ProgramResult;
}): ProgramDefinition {
  const { name, marks, start, landmarks, end } = definition;
  return {
    name,
    marks,
    open() {
      const state = start();
      return {
        landmarks: Object.entries(landmarks).map(([text, entry]) => {
          const { read, glance, ...options } = typeof entry === 'function' ? { read: entry } : entry;
          const landmark: Landmark = { text, ...options, read: (line) => read(line, state) };
          if (glance)
            landmark.glance = (bytes, from, to, lineNumber) => glance(bytes, from, to, lineNumber, state);
          return landmark;
        }),
        end: () => end(state),
      };
    },
  };
}
