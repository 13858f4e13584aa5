export type Likelihood = 'usual' | 'possible' | 'rare';
export type Judgement = { keep: Likelihood; note?: string } | { leaveOut: string };

const heavy = (series: number): boolean => series > 3;

/**
 * Per polyhedron: whether a dⁿ ion with so many unpaired electrons is worth calculating, and why not.
 * `null` means that the general rule decides. Heuristics of the trade: Cotton and Wilkinson, Advanced
 * Inorganic Chemistry; Figgis and Hitchman, Ligand Field Theory and Its Applications (from memory).
 */
export const spinStateRules: Record<
  string,
  (n: number, unpaired: number, series: 3 | 4 | 5) => Judgement | null
> = {
  'OC-6': (n, unpaired, series) => {
    const high = Math.min(n, 10 - n);
    if (n < 4 || n > 7) {
      if (unpaired === high) return { keep: 'usual' };
      if (n === 8)
        return {
          leaveOut:
            'both eg electrons would have to pair; singlet d8 loses its axial donors and belongs to SP-4',
        };
      return { leaveOut: 't2g has room for every electron singly, so pairing gains nothing' };
    }
    const low = n === 4 ? 2 : n === 5 ? 1 : n === 6 ? 0 : 1;
    if (unpaired === high)
      return heavy(series)
        ? { leaveOut: 'the splitting of a 4d or 5d ion exceeds its pairing energy: only low spin occurs' }
        : { keep: 'usual' };
    if (unpaired === low)
      return { keep: 'usual', ...(n === 4 && !heavy(series) ? { note: 'needs strong-field donors' } : {}) };
    if (n === 4)
      return { leaveOut: 'two pairs in t2g need a strong tetragonal field, as an oxido group gives' };
    return {
      leaveOut:
        'never the ground state of a regular octahedron (high and low spin cross directly); plan it as SPY-5 or SP-4, or add it by hand for a strongly elongated OC-6',
    };
  },
  'T-4': (n, unpaired) => {
    if (unpaired === Math.min(n, 10 - n)) return { keep: 'usual' };
    if (n === 7) return { leaveOut: 'no practical low-spin form: e4 t2^3 is already the lowest filling' };
    if (n === 8)
      return { leaveOut: 't2 cannot pair its electrons while it is degenerate; singlet d8 belongs to SP-4' };
    if (n === 2) return { leaveOut: 'e holds both electrons singly, so pairing gains nothing' };
    return {
      leaveOut:
        'the tetrahedral splitting, 4/9 of the octahedral one, stays below the pairing energy (low spin is known only for a few strongly donating alkyls)',
    };
  },
  'SP-4': (n, unpaired, series) => {
    if (n === 8) {
      if (unpaired === 0) return { keep: 'usual', note: 'x2-y2 empty' };
      return {
        leaveOut: 'an electron in the strongly raised x2-y2 drives triplet d8 to T-4 or to more donors',
      };
    }
    if (n < 4) return unpaired === n ? { keep: 'usual' } : { leaveOut: 'pairing gains nothing' };
    if (n === 4)
      return unpaired === 4
        ? { keep: 'usual', note: 'x2-y2 empty, the other four singly filled' }
        : { leaveOut: 'the four lower orbitals lie too close together to pair' };
    if (n === 5)
      return unpaired === 5
        ? { keep: 'possible', note: 'one electron in x2-y2; known with macrocycles' }
        : unpaired === 3
          ? { keep: 'rare', note: 'x2-y2 empty, Hund’s rule among the other four' }
          : { leaveOut: 'two pairs among close-lying orbitals; a doublet takes axial donors (SPY-5, OC-6)' };
    if (n === 6)
      return unpaired === 2
        ? { keep: 'usual', note: 'x2-y2 empty, Hund’s rule among the other four' }
        : unpaired === 4
          ? heavy(series)
            ? { leaveOut: 'x2-y2 stays empty for a 4d or 5d ion' }
            : { keep: 'rare', note: 'one electron in x2-y2; rare for a true square plane' }
          : {
              leaveOut:
                'the lower orbitals lie too close together to pair all six; a singlet takes axial donors',
            };
    if (n === 7)
      return unpaired === 1
        ? { keep: 'usual', note: 'x2-y2 empty' }
        : heavy(series)
          ? { leaveOut: 'x2-y2 stays empty for a 4d or 5d ion' }
          : { keep: 'rare', note: 'one electron in x2-y2; seldom' };
    return null;
  },
  'TBPY-5': (n, unpaired) => {
    if (unpaired === Math.min(n, 10 - n)) return { keep: 'usual' };
    if (n === 5 && unpaired === 3) return { keep: 'possible', note: 'z2 empty' };
    if (n === 5 && unpaired === 1) return { keep: 'rare', note: 'z2 empty, two pairs' };
    if (n === 6 && unpaired === 2)
      return { keep: 'possible', note: 'z2 empty, Hund’s rule in the pair below' };
    if (n === 7 && unpaired === 1) return { keep: 'possible', note: 'z2 empty' };
    if (n === 8 && unpaired === 0) return { keep: 'possible', note: 'z2 empty; strong-field donors' };
    return null;
  },
  'SPY-5': (n, unpaired) => {
    if (unpaired === Math.min(n, 10 - n)) return { keep: 'usual' };
    if (n === 5 && unpaired === 3)
      return { keep: 'possible', note: 'x2-y2 empty, Hund’s rule among the other four' };
    if (n === 5 && unpaired === 1) return { keep: 'possible', note: 'strong-field donors' };
    if (n === 6 && unpaired === 2) return { keep: 'possible', note: 'x2-y2 empty' };
    if (n === 6 && unpaired === 0) return { keep: 'possible', note: 'strong apical donor' };
    if (n === 7 && unpaired === 1) return { keep: 'usual', note: 'x2-y2 empty' };
    if (n === 8 && unpaired === 0) return { keep: 'possible', note: 'x2-y2 empty; weak apical donor' };
    if (n === 4 && unpaired === 2)
      return { leaveOut: 'the four lower orbitals take the electrons singly while x2-y2 is empty' };
    return null;
  },
  'TPR-6': (n, unpaired) =>
    unpaired === Math.min(n, 10 - n)
      ? { keep: 'rare' }
      : { leaveOut: 'a low-spin ion gains most in OC-6; a prism has no comparable gap to pair against' },
};
