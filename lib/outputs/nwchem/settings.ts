import { cite } from '../cite';
import type { Line, Section } from '../landmark';
import { after, soleIntegerAfter, numberAfter, readInteger, words } from '../numbers';
import type { LandmarkMap } from '../program';
import type { Method, Step } from '../record';
import { rowTable } from '../row-table';
import { warn } from '../warnings';
import { openStep, type NwchemState } from './state';

function readCount(path: 'charge' | 'electronCount' | 'atomCount', mark = ':') {
  return (line: Line, state: NwchemState) => {
    const value = soleIntegerAfter(line.text, mark);
    const { step } = openStep(state);
    if (value === null) return;
    step[path] = value;
    cite(step, path, line);
  };
}

function setMethod(step: Step, key: Exclude<keyof Method, 'reference'>, text: string, line: Line): void {
  step.method[key] = text;
  cite(step, `method.${key}`, line);
}

const references: [RegExp, NonNullable<Method['reference']>][] = [
  [/restricted open|^rohf$|^rodft$/i, 'restricted open-shell'],
  [/spin polarized|^uhf$|unrestricted/i, 'unrestricted'],
  [/closed shell|^rhf$/i, 'restricted'],
];

function readReference(mark: string) {
  return (line: Line, state: NwchemState) => {
    const text = after(line.text, mark)?.trim() ?? '';
    const found = references.find(([pattern]) => pattern.test(text));
    const { step } = openStep(state);
    if (!found) return;
    step.method.reference = found[1];
    cite(step, 'method.reference', line);
  };
}

/**
 * The lines under "XC Information": a named functional ("B3LYP Method XC Potential"), or the components with
 * their weights when that is all there is.
 */
function readFunctional(state: NwchemState): Section {
  const parts: string[] = [];
  let first: Line | null = null;
  return {
    take(line) {
      const text = line.text.trim();
      if (/^-+$/.test(text)) return true;
      const { step } = openStep(state);
      if (text === '') {
        if (first === null) return true;
        if (parts.length > 0) setMethod(step, 'functional', parts.join(' + '), first);
        return false;
      }
      first ??= line;
      const named = /^(.{1,60}?) (?:Method )?XC (?:Potential|Functional)/.exec(text);
      if (named?.[1] && parts.length === 0) {
        setMethod(step, 'functional', named[1].replace(/ Method$/, ''), line);
        return false;
      }
      const component = /^(.{1,60}?) Functional {1,20}(\d{1,3}\.\d{1,6})/.exec(text);
      if (component?.[1]) {
        const weight = Number(component[2]);
        parts.push(weight === 1 ? component[1] : `${weight} ${component[1]}`);
      }
      return true;
    },
  };
}

//  fe                    DZVP (DFT Orbital)           10       26   5s3p2d
//  *                           6-31G*                   on all atoms
function readBasis(heading: Line, state: NwchemState): Section {
  return rowTable<string>({
    heading: 4,
    row(line) {
      const row = words(line.text);
      if (row.length < 5 || row[0] === 'Tag' || line.text.includes('----')) return null;
      const isRow = line.text.includes('on all atoms') || readInteger(row.at(-2)) !== null;
      return isRow ? row.slice(1, -3).join(' ') : null;
    },
    save(rows) {
      const names = [...new Set(rows)].filter((name) => name !== 'user specified');
      if (names.length === 0) return;
      state.basis = { text: names.join(' + '), line: heading };
      if (state.current) setMethod(state.current.step, 'basis', state.basis.text, heading);
    },
  });
}

function readMultiplicity(line: Line, state: NwchemState): void {
  const value = soleIntegerAfter(line.text, ':');
  const { step } = openStep(state);
  if (value === null || value === 0) return;
  step.multiplicity = Math.abs(value);
  cite(step, 'multiplicity', line);
  if (value < 0) warn(step, 'beta-excess', line.number);
}

function setMultiplicity(step: Step, multiplicity: number, line: Line): void {
  if (step.multiplicity !== null) return;
  step.multiplicity = multiplicity;
  cite(step, 'multiplicity', line);
}

export const settingsLandmarks: LandmarkMap<NwchemState> = {
  'No. of atoms :': readCount('atomCount'),
  'No. of electrons :': readCount('electronCount'),
  'Charge :': readCount('charge'),
  'Spin multiplicity:': readMultiplicity,
  'Wavefunction type:': readReference(':'),
  'XC Information': (_, state) => readFunctional(state),
  'Summary of "ao basis"': readBasis,
  'Dispersion Parameters': (_, state) => ({
    take(line) {
      const text = line.text.trim();
      if (text === '' || /^-+$/.test(text)) return true;
      setMethod(openStep(state).step, 'dispersion', text.replace(/ Model$/, ''), line);
      return false;
    },
  }),
  '-cosmo- solvent': (line, state) => setMethod(openStep(state).step, 'solvation', 'COSMO', line),
  'dielectric constant -eps- =': (line, state) => {
    const value = numberAfter(line.text, '=');
    if (value !== null) setMethod(openStep(state).step, 'solvation', `COSMO, ε = ${value}`, line);
  },
  // The SCF module:   charge          =   0.00   /   wavefunction    = ROHF   /   open shells     =     5
  'charge =': (line, state) => {
    const value = numberAfter(line.text, '=');
    const { step } = openStep(state);
    if (value === null || !Number.isInteger(value) || step.charge !== null) return;
    step.charge = value;
    cite(step, 'charge', line);
  },
  // Restricted open-shell prints the open shells, unrestricted the electrons of each spin.
  'open shells =': (line, state) => {
    const open = soleIntegerAfter(line.text, '=');
    if (open !== null) setMultiplicity(openStep(state).step, open + 1, line);
  },
  'alpha electrons =': (line, state) => {
    state.alphaElectrons = soleIntegerAfter(line.text, '=');
  },
  'beta electrons =': (line, state) => {
    const beta = soleIntegerAfter(line.text, '=');
    if (beta !== null && state.alphaElectrons !== null)
      setMultiplicity(openStep(state).step, Math.abs(state.alphaElectrons - beta) + 1, line);
  },
  'wavefunction =': (line, state) => {
    const { step } = openStep(state);
    if (step.method.reference === null) readReference('=')(line, state);
  },
};
