import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { LinkMark, type LinkMarkKind } from '@/components/marks/link-mark';
import { LinkMarkAnchor } from '@/components/marks/link-mark-anchor';

afterEach(cleanup);

describe('LinkMark', () => {
  it.each([
    ['joined', 'agree'],
    ['broken', 'disagree'],
    ['one-ended calculated', 'only the calculated side'],
    ['one-ended measured', 'only the measured side'],
    ['dotted', 'cannot tell'],
  ] as [LinkMarkKind, string][])('says in words what %s means', (kind, words) => {
    render(<LinkMark kind={kind} />);
    const mark = screen.getByRole('img');
    expect(mark.getAttribute('aria-label')).toContain(words);
    expect(mark.querySelector('title')?.textContent).toBe(mark.getAttribute('aria-label'));
  });

  it('keeps its proportions of 56 to 20 at every width', () => {
    render(<LinkMark kind="joined" width={36} />);
    const mark = screen.getByRole('img');
    expect(mark.getAttribute('viewBox')).toBe('0 0 56 20');
    expect(Number(mark.getAttribute('height'))).toBeCloseTo((36 * 20) / 56, 6);
  });

  it('tells the kinds apart by shape, not only by colour', () => {
    const shapes = (
      ['joined', 'broken', 'one-ended calculated', 'one-ended measured', 'dotted'] as const
    ).map((kind) => {
      const { container } = render(<LinkMark kind={kind} decorative />);
      return (container.querySelector('g')?.outerHTML ?? '').replace(/class="[^"]*"/g, '');
    });
    expect(new Set(shapes).size).toBe(5);
  });

  it('mirrors the one-ended mark when only the measured side has a value', () => {
    const { container } = render(<LinkMark kind="one-ended measured" />);
    expect(container.querySelector('g')?.getAttribute('transform')).toBe('matrix(-1 0 0 1 56 0)');
    expect(container.querySelectorAll('circle[fill="currentColor"]')).toHaveLength(1);
  });

  it('is silent beside a visible word', () => {
    const { container } = render(<LinkMark kind="joined" decorative />);
    expect(screen.queryByRole('img')).toBeNull();
    expect(container.querySelector('svg')?.getAttribute('aria-hidden')).toBe('true');
  });

  it('as a link names the complex it belongs to', () => {
    render(<LinkMarkAnchor kind="broken" href="/x" subject="[NiCl₄]²⁻" />);
    expect(
      screen.getByRole('link', { name: '[NiCl₄]²⁻, broken: calculated and measured disagree' }),
    ).toBeTruthy();
  });
});
