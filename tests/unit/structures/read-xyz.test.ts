import { describe, expect, it } from 'vitest';
import { readXyz } from '@/lib/structures/read-xyz';
import { writeXyz } from '@/lib/structures/write-xyz';

const water = '3\nwater\nO 0 0 0.117\nH 0 0.757 -0.469\nH 0 -0.757 -0.469\n';

function frames(text: string) {
  const result = readXyz(text);
  if (!result.ok) throw new Error(`${result.error.code}, line ${result.error.line}`);
  return result.value;
}

function problem(text: string) {
  const result = readXyz(text);
  if (result.ok) throw new Error('the text was read without a problem');
  return result.error;
}

describe('reading XYZ', () => {
  it('reads elements, positions and the comment as written', () => {
    const [frame] = frames(water.replace('water', '  water, B3LYP  '));
    expect(frame?.elements).toEqual(['O', 'H', 'H']);
    expect(frame?.positionsAngstrom[1]).toEqual([0, 0.757, -0.469]);
    expect(frame?.comment).toBe('  water, B3LYP  ');
    expect(frame?.warnings).toEqual([]);
  });

  it('reads several frames and says on which line each begins', () => {
    const all = frames(water + water.replace('0.117', '0.2') + '\n' + water);
    expect(all.map((frame) => frame.line)).toEqual([1, 6, 12]);
    expect(all[1]?.positionsAngstrom[0]).toEqual([0, 0, 0.2]);
  });

  it('takes a frame without a line end and with an empty comment', () => {
    expect(frames('1\n\nHe 0 0 0')[0]?.comment).toBe('');
  });

  it('takes symbols in any case, atomic numbers and labels with a number', () => {
    const [frame] = frames('5\n\nFE 0 0 0\ncl 2 0 0\n17 -2 0 0\nO1 0 2 0\nC(3) 0 0 2\n');
    expect(frame?.elements).toEqual(['Fe', 'Cl', 'Cl', 'O', 'C']);
  });

  it('takes CRLF, tabs, a byte-order mark, Fortran exponents, signs and further columns', () => {
    const text = '\uFEFF 2 \r\nmade elsewhere\r\nFe\t0.0\t1.0D-01\t+2.5d+00\t0.4\r\nO 1.e0 .5 -2E0 0 0 0\r\n';
    const [frame] = frames(text);
    expect(frame?.positionsAngstrom).toEqual([
      [0, 0.1, 2.5],
      [1, 0.5, -2],
    ]);
  });

  it('warns of coincident atoms and still reads the file', () => {
    const [frame] = frames('3\n\nFe 0 0 0\nO 2 0 0\nO 2 0 0.0001\n');
    expect(frame?.elements).toHaveLength(3);
    expect(frame?.warnings).toMatchObject([{ code: 'coincident atoms', line: 5 }]);
    expect(frame?.warnings[0]?.message).toContain('Atoms 2 and 3');
  });

  it('names a few coincident pairs and counts the rest', () => {
    const atoms = Array.from({ length: 6 }, () => 'Fe 1 1 1').join('\n');
    const warnings = frames(`6\n\n${atoms}\n`)[0]?.warnings ?? [];
    expect(warnings).toHaveLength(6);
    expect(warnings[5]?.message).toContain('10 more pairs');
  });
});

describe('XYZ files that cannot be read', () => {
  const cases: [string, string, string, number][] = [
    ['an empty file', '', 'empty file', 1],
    ['blank lines only', ' \n\t\n', 'empty file', 1],
    ['no count', 'O 0 0 0\n', 'no atom count', 1],
    ['a count with a fraction', '2.5\n\nO 0 0 0\n', 'no atom count', 1],
    ['a negative count', '-3\n\nO 0 0 0\n', 'no atom count', 1],
    ['0 atoms', '0\nnothing\n', 'no atoms', 1],
    ['fewer atoms than announced', '4\nwater\nO 0 0 0\nH 1 0 0\nH 0 1 0\n', 'too few atoms', 6],
    ['fewer atoms than announced before a next frame', `2\n\nO 0 0 0\n${water}`, 'too few atoms', 4],
    ['more atoms than announced', '2\nwater\nO 0 0 0\nH 1 0 0\nH 0 1 0\n', 'too many atoms', 5],
    ['an unknown element', '2\n\nO 0 0 0\nQx 1 0 0\n', 'unknown element', 4],
    ['atomic number 0', '1\n\n0 0 0 0\n', 'unknown element', 3],
    ['atomic number 119', '1\n\n119 0 0 0\n', 'unknown element', 3],
    ['a missing coordinate', '2\n\nO 0 0 0\nH 1 0\n', 'incomplete atom line', 4],
    ['a coordinate that is no number', '1\n\nO 0 zero 0\n', 'not a number', 3],
    ['NaN', '1\n\nO 0 NaN 0\n', 'not a number', 3],
    ['infinity', '1\n\nO 0 0 Infinity\n', 'not a number', 3],
    ['a number beyond range', '1\n\nO 0 0 1e999\n', 'not a number', 3],
    ['stars of a full Fortran field', '1\n\nO 0 0 ********\n', 'not a number', 3],
    [
      'a lattice',
      '1\nLattice="5 0 0 0 5 0 0 0 5" Properties=species:S:1:pos:R:3\nO 0 0 0\n',
      'periodic input',
      2,
    ],
    ['periodic boundaries', '1\npbc="T T F"\nO 0 0 0\n', 'periodic input', 2],
  ];
  it.each(cases)('%s', (_, text, code, line) => {
    expect(problem(text)).toMatchObject({ code, line });
  });

  it('says what is wrong and what to do', () => {
    expect(problem('4\n\nO 0 0 0\n').message).toMatch(
      /announces 4 atoms and ends after 1\. Correct the count/,
    );
    expect(problem('1\nLattice="1 0 0"\nO 0 0 0\n').message).toMatch(/periodic.*Cut out the complex/);
  });

  it('refuses no comment that only mentions a lattice or open boundaries', () => {
    expect(frames('1\ncut from the lattice energy run\nO 0 0 0\n')).toHaveLength(1);
    expect(frames('1\npbc="F F F"\nO 0 0 0\n')).toHaveLength(1);
  });
});

describe('writing XYZ', () => {
  it('is read back within the digits written', () => {
    const structure = {
      elements: ['Fe', 'O'],
      positionsAngstrom: [
        [-12.3456789012, 0, 1e-7],
        [1 / 3, -2 / 3, 100],
      ] as [number, number, number][],
    };
    const [frame] = frames(writeXyz(structure, 'two\nlines'));
    expect(frame?.comment).toBe('two lines');
    expect(frame?.elements).toEqual(structure.elements);
    structure.positionsAngstrom.forEach((position, i) =>
      position.forEach((x, axis) => expect(frame?.positionsAngstrom[i]?.[axis]).toBeCloseTo(x, 8)),
    );
  });
});
