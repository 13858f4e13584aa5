import { HARTREE_EV } from '../../chemistry/constants';
import { FrontierOrbitals } from '../frontier';
import type { Line } from '../landmark';
import { numberAfter } from '../numbers';
import type { LandmarkMap } from '../program';
import type { NwchemState } from './state';

/** Longest line of an orbital kept, bytes. */
const MAX_BYTES = 120;

/** A line kept as bytes, since only the last of many is ever wanted as text. */
class KeptLine {
  value = NaN;
  private readonly bytes = new Uint8Array(MAX_BYTES);
  private length = 0;
  private number = 0;

  keep(value: number, bytes: Uint8Array, from: number, to: number, lineNumber: number): void {
    this.value = value;
    this.length = Math.min(to - from, MAX_BYTES);
    for (let i = 0; i < this.length; i++) this.bytes[i] = bytes[from + i] as number;
    this.number = lineNumber;
  }

  get line(): Line | null {
    if (Number.isNaN(this.value)) return null;
    return { text: String.fromCharCode(...this.bytes.subarray(0, this.length)), number: this.number };
  }
}

/** The orbitals of one spin: the highest occupied and the lowest empty line so far. */
export class OrbitalList {
  private readonly homo = new KeptLine();
  private readonly lumo = new KeptLine();

  get hasEmpty(): boolean {
    return this.lumo.line !== null;
  }

  /**
   * Every orbital of every SCF prints such a line, a tenth of a whole output; none becomes text here.
   * Vector   26  Occ=1.000000D+00  E=-1.672071D-01
   * Vector   26  Occ=0.000000D+00  E= 1.667757D+00  Symmetry=a1
   */
  add(bytes: Uint8Array, from: number, to: number, lineNumber: number): void {
    const occupationAt = afterEquals(bytes, from, to);
    const energyAt = afterEquals(bytes, occupationAt, to);
    const occupation = fortranNumber(bytes, occupationAt, to);
    const energy = fortranNumber(bytes, energyAt, to);
    if (Number.isNaN(occupation) || Number.isNaN(energy)) return;
    const { homo, lumo } = this;
    if (occupation > 0.5) {
      if (!(energy <= homo.value)) homo.keep(energy, bytes, from, to, lineNumber);
    } else if (!(energy >= lumo.value)) lumo.keep(energy, bytes, from, to, lineNumber);
  }

  frontier(): FrontierOrbitals {
    const orbitals = new FrontierOrbitals();
    for (const [line, occupied] of [
      [this.homo.line, true],
      [this.lumo.line, false],
    ] as const) {
      const energy = line && numberAfter(line.text, ' E=');
      if (energy !== null && line) orbitals.add(energy, occupied, line);
    }
    return orbitals;
  }
}

const EQUALS = 61;

function afterEquals(bytes: Uint8Array, from: number, to: number): number {
  let at = from;
  while (at < to && bytes[at] !== EQUALS) at++;
  return at + 1;
}

/** The value of " 1.672071D-01" at a place in bytes, good to its digits; NaN when there is no number. */
function fortranNumber(bytes: Uint8Array, from: number, to: number): number {
  let at = from;
  while (at < to && bytes[at] === 32) at++;
  const negative = bytes[at] === 45;
  if (negative) at++;
  let digits = 0;
  let decimals = -1;
  let seen = 0;
  for (; at < to; at++) {
    const digit = (bytes[at] as number) - 48;
    if (digit >= 0 && digit <= 9) {
      digits = digits * 10 + digit;
      seen++;
      if (decimals >= 0) decimals++;
    } else if (digit === -2 && decimals < 0) decimals = 0;
    else break;
  }
  const sign = bytes[at + 1];
  const isExponent = bytes[at] === 68 && (sign === 43 || sign === 45);
  if (seen === 0 || !isExponent) return NaN;
  const power = ((bytes[at + 2] as number) - 48) * 10 + ((bytes[at + 3] as number) - 48);
  const value = digits * 10 ** ((sign === 45 ? -power : power) - Math.max(decimals, 0));
  return negative ? -value : value;
}

function openList(spin: 'alpha' | 'beta') {
  return (_: Line, state: NwchemState) => {
    state.orbitalSpin = spin;
    if (spin === 'alpha') state.orbitals = { alpha: new OrbitalList(), beta: null };
    else if (state.orbitals) state.orbitals.beta = new OrbitalList();
  };
}

/** Takes the orbitals seen since the last SCF into the point at hand; a list cut short has no empty ones. */
export function saveOrbitals(state: NwchemState, isCutOff: boolean): void {
  const { orbitals, current } = state;
  state.orbitals = null;
  if (!orbitals || !current) return;
  if (isCutOff && (!orbitals.alpha.hasEmpty || orbitals.beta?.hasEmpty === false)) return;
  const alpha = orbitals.alpha.frontier();
  if (alpha.isEmpty) return;
  const { point } = current;
  point.orbitals = {
    alpha: alpha.read(point, 'alpha', HARTREE_EV),
    beta: orbitals.beta?.frontier().read(point, 'beta', HARTREE_EV) ?? null,
  };
}

export const orbitalLandmarks: LandmarkMap<NwchemState> = {
  'DFT Final Molecular Orbital Analysis': openList('alpha'),
  'DFT Final Alpha Molecular Orbital Analysis': openList('alpha'),
  'DFT Final Beta Molecular Orbital Analysis': openList('beta'),
  'ROHF Final Molecular Orbital Analysis': openList('alpha'),
  'RHF Final Molecular Orbital Analysis': openList('alpha'),
  'UHF Final Alpha Molecular Orbital Analysis': openList('alpha'),
  'UHF Final Beta Molecular Orbital Analysis': openList('beta'),
  Vector: {
    read: () => undefined,
    glance(bytes, from, to, lineNumber, { orbitals, orbitalSpin }) {
      if (orbitals && orbitalSpin) orbitals[orbitalSpin]?.add(bytes, from, to, lineNumber);
      return false;
    },
  },
};
