import { describe, expect, it } from 'vitest';
import { complexIdentity } from '@/lib/chemistry/complex-identity';

describe('the identity of a complex', () => {
  it.each([
    ['[CuCl4]2-', 'Cl4Cu', -2, ['Cu']],
    ['[Fe(OH2)6]2+', 'FeH12O6', 2, ['Fe']],
    ['[Ni(NH3)6]2+', 'H18N6Ni', 2, ['Ni']],
    ['Fe(C5H5)2', 'C10H10Fe', 0, ['Fe']],
  ])('%s is %s with charge %i', (formula, composition, charge, metals) => {
    expect(complexIdentity(formula)).toEqual({ ok: true, value: { composition, charge, metals } });
  });

  it.each(['H2O', '[CuCl4', 'Xx4', ''])('refuses %j with a sentence', (formula) => {
    const answer = complexIdentity(formula);
    expect(answer.ok).toBe(false);
    if (!answer.ok) expect(answer.error.length).toBeGreaterThan(10);
  });
});
