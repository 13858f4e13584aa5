import { describe, expect, it } from 'vitest';
import { parseFormula } from '@/lib/chemistry/parse-formula';

function parsed(text: string) {
  const result = parseFormula(text);
  if (!result.ok) throw new Error(`${text}: ${result.error.message}`);
  return result.value;
}

describe('parseFormula', () => {
  it.each([
    ['CuSO4·5H2O', { Cu: 1, S: 1, O: 9, H: 10 }, 0],
    ['CuSO4.5H2O', { Cu: 1, S: 1, O: 9, H: 10 }, 0],
    ['CuSO4 * 5 H2O', { Cu: 1, S: 1, O: 9, H: 10 }, 0],
    ['CuSO₄·5H₂O', { Cu: 1, S: 1, O: 9, H: 10 }, 0],
    ['[Ni(en)3]S2O3', { Ni: 1, C: 6, H: 24, N: 6, S: 2, O: 3 }, 0],
    ['K3[Fe(CN)6]', { K: 3, Fe: 1, C: 6, N: 6 }, 0],
    ['[Fe(CN)6]4-', { Fe: 1, C: 6, N: 6 }, -4],
    ['[Fe(H2O)6]²⁺', { Fe: 1, H: 12, O: 6 }, 2],
    ['[Fe(H2O)6]^{}2+'.replace('{}', ''), { Fe: 1, H: 12, O: 6 }, 2],
    ['(NH4)2Fe(SO4)2·6H2O', { N: 2, H: 20, Fe: 1, S: 2, O: 14 }, 0],
    ['SO42-', { S: 1, O: 4 }, -2],
    ['NO3-', { N: 1, O: 3 }, -1],
    ['NH4+', { N: 1, H: 4 }, 1],
    ['Cu2+', { Cu: 1 }, 2],
    ['Fe+3', { Fe: 1 }, 3],
    ['CoCl42-', { Co: 1, Cl: 4 }, -2],
    ['Fe0.95O', { Fe: 0.95, O: 1 }, 0],
    ['[Co(py)2Cl2]·0.5MeOH', { Co: 1, C: 10.5, H: 12, N: 2, Cl: 2, O: 0.5 }, 0],
    ['[Cr(acac)3]', { Cr: 1, C: 15, H: 21, O: 6 }, 0],
    ['Hg[Co(NCS)4]', { Hg: 1, Co: 1, N: 4, C: 4, S: 4 }, 0],
    ['[Cu2(OAc)4(H2O)2]', { Cu: 2, C: 8, H: 16, O: 10 }, 0],
    ['[Fe(phen)2(NCS)2]', { Fe: 1, C: 26, H: 16, N: 6, S: 2 }, 0],
    ['[NEt4]2[NiCl4]', { N: 2, C: 16, H: 40, Ni: 1, Cl: 4 }, 0],
  ])('reads %s', (text, composition, charge) => {
    const value = parsed(text);
    expect(value.composition).toEqual(composition);
    expect(value.charge).toBe(charge);
  });

  it('keeps solvates apart with their multiplier', () => {
    expect(parsed('NiCl2·6H2O·0.5thf').parts.map((p) => [p.text, p.multiplier])).toEqual([
      ['NiCl2', 1],
      ['H2O', 6],
      ['thf', 0.5],
    ]);
  });

  it('sums parts to the same mass in any order', () => {
    expect(parsed('CoCl2·6H2O').molarMassGramPerMole).toBeCloseTo(
      parsed('6H2O·CoCl2').molarMassGramPerMole,
      9,
    );
  });

  it.each([
    ['', 'empty', 0],
    ['   ', 'empty', 0],
    ['[Ni(en)3', 'bracket', 0],
    ['Ni(en)3]', 'bracket', 7],
    ['(Ni[en)3]', 'bracket', 0],
    ['Xx2O', 'unknown symbol', 0],
    ['NiCl0', 'count', 2],
    ['Ni·', 'empty', 3],
    ['2+', 'empty', 1],
    ['Es', 'no mass', 0],
  ])('says what is wrong with "%s"', (text, code, position) => {
    expect(parseFormula(text)).toMatchObject({ ok: false, error: { code, position } });
  });
});
