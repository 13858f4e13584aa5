import { describe, expect, it } from 'vitest';
import { elementSymbol } from '@/lib/chemistry/elements';
import { ligandElectronCount } from '@/lib/chemistry/ligand';
import { ligandDictionary } from '@/lib/chemistry/ligand-dictionary';
import { formulaElements } from '@/lib/chemistry/formula-elements';

describe('the ligand dictionary', () => {
  it.each(Object.entries(ligandDictionary))('%s has electrons that fit its unpaired ones', (_key, ligand) => {
    const electrons = ligandElectronCount(ligand);
    expect(electrons).not.toBeNull();
    expect(((electrons ?? 0) - ligand.unpairedElectrons) % 2).toBe(0);
  });

  it.each(Object.entries(ligandDictionary))('%s has only donors that its formula holds', (_key, ligand) => {
    const atoms = formulaElements(ligand.formula) ?? [];
    for (const donor of ligand.donors) {
      expect(elementSymbol(donor)).toBe(donor);
      const wanted = ligand.donors.filter((other) => other === donor).length;
      expect(atoms.filter((atom) => atom === donor).length).toBeGreaterThanOrEqual(wanted);
    }
  });

  it('counts the electrons of water (10), cyanide (14) and 2,2’-bipyridine (82) as their atomic numbers say', () => {
    const count = (key: string) => {
      const ligand = ligandDictionary[key];
      return ligand ? ligandElectronCount(ligand) : null;
    };
    expect([count('H2O'), count('CN'), count('bpy')]).toEqual([10, 14, 82]);
  });
});

describe('parsing a formula', () => {
  it('reads brackets, hydrate dots and two-letter elements', () => {
    expect(formulaElements('[Fe(H2O)6]')).toHaveLength(19);
    expect(formulaElements('CuSO4·5H2O')).toHaveLength(21);
    expect(formulaElements('CO')).toEqual(['C', 'O']);
    expect(formulaElements('Co')).toEqual(['Co']);
  });

  it.each(['', 'Xy2', '(H2O', 'H2O)', '(H2O]2', 'fe', 'H-2', 'C999999999'])('refuses "%s"', (text) => {
    expect(formulaElements(text)).toBeNull();
  });
});
