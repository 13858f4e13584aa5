import { describe, expect, it } from 'vitest';
import { formulaInUnicode, parseFormula } from '@/components/numbers/parse-formula';

describe('parseFormula', () => {
  it.each([
    ['[CuCl4]2-', '[CuCl₄]²⁻'],
    ['[Fe(OH2)6]2+', '[Fe(OH₂)₆]²⁺'],
    ['Fe2+', 'Fe²⁺'],
    ['Cl-', 'Cl⁻'],
    ['O2-', 'O²⁻'],
    ['O2^-', 'O₂⁻'],
    ['NH4+', 'NH₄⁺'],
    ['SO42-', 'SO₄²⁻'],
    ['PF6-', 'PF₆⁻'],
    ['Fe^3+', 'Fe³⁺'],
    ['CuSO4.5H2O', 'CuSO₄·5H₂O'],
    ['CuSO4·5H2O', 'CuSO₄·5H₂O'],
    ['CoCl2 * 6H2O', 'CoCl₂ · 6H₂O'],
    ['Fe0.95O', 'Fe₀.₉₅O'],
    ['Cu(II)', 'Cu(II)'],
    ['Cs2[CuCl4]', 'Cs₂[CuCl₄]'],
    ['[CuCl₄]²⁻', '[CuCl₄]²⁻'],
    ['[Fe(CN)6]^4-', '[Fe(CN)₆]⁴⁻'],
    ['[Co(NH3)6] 3+', '[Co(NH₃)₆]³⁺'],
    ['[Cu2(μ-Cl)2(en)2]2+', '[Cu₂(μ-Cl)₂(en)₂]²⁺'],
    ['[Cu(OH2)6]2+ SO42-', '[Cu(OH₂)₆]²⁺ SO₄²⁻'],
    ['2H2O', '2H₂O'],
    ['', ''],
  ])('sets %s as %s', (text, set) => expect(formulaInUnicode(text)).toBe(set));

  it('raises a Roman oxidation state after a caret', () => {
    expect(parseFormula('Fe^III')).toEqual([
      { kind: 'line', text: 'Fe' },
      { kind: 'sup', text: 'III' },
    ]);
  });
});
