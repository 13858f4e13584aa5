import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { polyhedra } from '@/components/marks/polyhedra';
import { PolyhedronGlyph } from '@/components/marks/polyhedron-glyph';
import { projectPolyhedron } from '@/components/marks/project-polyhedron';

afterEach(cleanup);

describe('polyhedra', () => {
  // Numbers of edges of the ideal bodies (Euler: V − E + F = 2).
  it.each([
    ['T-4', 6],
    ['SP-4', 4],
    ['TBPY-5', 9],
    ['SPY-5', 8],
    ['OC-6', 12],
    ['TPR-6', 9],
    ['PBPY-7', 15],
    ['CU-8', 12],
    ['SAPR-8', 16],
    ['TP-3', 3],
  ] as const)('%s is drawn with %i edges', (symbol, edges) => {
    expect(projectPolyhedron(polyhedra[symbol]).edges).toHaveLength(edges);
  });

  it.each(Object.keys(polyhedra) as (keyof typeof polyhedra)[])(
    '%s has its coordination number of corners, inside 40 × 40',
    (symbol) => {
      const { corners, metal } = projectPolyhedron(polyhedra[symbol]);
      expect(corners).toHaveLength(Number(/\d+$/.exec(symbol)?.[0]));
      for (const [x, y] of [...corners, metal]) {
        expect(Math.min(x, y)).toBeGreaterThanOrEqual(2);
        expect(Math.max(x, y)).toBeLessThanOrEqual(38);
      }
    },
  );

  it('hides the one far edge of a tetrahedron and the four far ones of an octahedron', () => {
    const hidden = (symbol: 'T-4' | 'OC-6') =>
      projectPolyhedron(polyhedra[symbol]).edges.filter((edge) => edge.hidden);
    expect(hidden('T-4')).toHaveLength(1);
    expect(hidden('OC-6')).toHaveLength(4);
  });

  it('has a text alternative, also for a symbol without a drawing', () => {
    render(<PolyhedronGlyph symbol="TBPY-5" />);
    expect(screen.getByRole('img', { name: 'TBPY-5, trigonal bipyramid' })).toBeTruthy();
    render(<PolyhedronGlyph symbol="TPRS-9" />);
    expect(screen.getByRole('img', { name: 'TPRS-9' }).textContent).toContain('9');
  });
});
