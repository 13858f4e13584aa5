import { DEBYE_PER_AU } from '../../chemistry/constants';
import { cite } from '../cite';
import type { Line, Section } from '../landmark';
import { numberAfter, readNumber, readNumbers, words } from '../numbers';
import type { LandmarkMap } from '../program';
import { vibrationsOf } from '../vibrations';
import { warn } from '../warnings';
import type { NwchemState } from './state';

/**
 * The first moments in the multipole table, atomic units, as a length in debye.
 *      L   x y z        total         alpha         beta         nuclear
 *      1   1 0 0      0.000154      0.000244     -0.000090      0.000000
 */
function readMultipoles(_: Line, state: NwchemState): Section | void {
  if (!state.afterEnergy) return;
  const moments: number[] = [];
  let first: Line | null = null;
  let lines = 0;
  return {
    take(line) {
      const row = words(line.text);
      if (row[0] === '1' && row.length >= 5) {
        const moment = readNumber(row[4]);
        if (moment === null) return false;
        first ??= line;
        moments.push(moment);
      } else if (moments.length === 3 && first && state.current) {
        const { point } = state.current;
        point.dipoleDebye = Number((Math.hypot(...moments) * DEBYE_PER_AU).toFixed(6));
        cite(point, 'dipoleDebye', first);
        return false;
      }
      return ++lines < 20;
    },
  };
}

/** The list of modes, once its last row has come: 3N values, translations and rotations among them. */
export function saveFrequencies(state: NwchemState): void {
  const { modesCm1, modesLine, current } = state;
  if (!current || !modesLine || modesCm1.length === 0) return;
  const atoms = current.step.atomCount;
  const values = modesCm1.filter((value) => value !== null);
  state.modesCm1 = [];
  if (values.length !== modesCm1.length || (atoms !== null && values.length !== 3 * atoms)) {
    warn(current.step, 'table-damaged', modesLine.number);
    return;
  }
  current.step.frequencies = vibrationsOf(values);
  cite(current.step, 'frequencies', modesLine);
}

function thermochemistry(state: NwchemState) {
  if (!state.current) return null;
  return (state.current.step.thermochemistry ??= {
    temperatureK: null,
    pressurePa: null,
    zeroPointHartree: null,
    enthalpyHartree: null,
    gibbsHartree: null,
  });
}

export const propertyLandmarks: LandmarkMap<NwchemState> = {
  'Multipole analysis of the density': readMultipoles,
  //  P.Frequency       49.01       81.56      151.70
  'P.Frequency': (line, state) => {
    if (state.modesCm1.length === 0) state.modesLine = line;
    state.modesCm1.push(...readNumbers(line.text.replace('P.Frequency', '')));
  },
  // Temperature                      =   298.15K
  'Temperature =': (line, state) => {
    const thermo = thermochemistry(state);
    const value = readNumber(line.text.split('=')[1]?.replace('K', ''));
    if (!thermo || value === null || !state.current) return;
    thermo.temperatureK = value;
    cite(state.current.step, 'thermochemistry.temperatureK', line);
  },
  // Zero-Point correction to Energy  =  111.089 kcal/mol  (  0.177031 au)
  'Zero-Point correction to Energy =': (line, state) => {
    const thermo = thermochemistry(state);
    const value = numberAfter(line.text, '(');
    if (!thermo || value === null || !state.current) return;
    thermo.zeroPointHartree = value;
    cite(state.current.step, 'thermochemistry.zeroPointHartree', line);
  },
};
