import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { ProgressBar } from '@/components/ui/progress-bar';
import { Tabs } from '@/components/ui/tabs';

afterEach(cleanup);

describe('Field', () => {
  it('reads its hint, its error and its unit with the input, and keeps the wrong value', () => {
    render(
      <Field
        label="Length"
        unit="cm"
        hint="of the filling"
        error="longer than the tube"
        defaultValue="231"
      />,
    );
    const input = screen.getByLabelText<HTMLInputElement>('Length');
    const said = (input.getAttribute('aria-describedby') ?? '')
      .split(' ')
      .map((id) => document.getElementById(id)?.textContent);
    expect(said).toEqual(['of the filling', 'longer than the tube', 'cm']);
    expect(input.getAttribute('aria-invalid')).toBe('true');
    expect(input.value).toBe('231');
  });

  it('is not marked wrong without an error', () => {
    render(<Field label="Mass" />);
    expect(screen.getByLabelText('Mass').hasAttribute('aria-invalid')).toBe(false);
    expect(screen.getByLabelText('Mass').hasAttribute('aria-describedby')).toBe(false);
  });
});

it('a busy button cannot be pressed twice', async () => {
  const press = vi.fn();
  render(
    <Button busy onClick={press}>
      Save
    </Button>,
  );
  await userEvent.click(screen.getByRole('button'));
  expect(press).not.toHaveBeenCalled();
  expect(screen.getByRole('button').getAttribute('aria-busy')).toBe('true');
});

it('progress has a value only when it is known', () => {
  const { rerender } = render(<ProgressBar label="Bytes" value={0.624} />);
  expect(screen.getByRole('progressbar').getAttribute('aria-valuenow')).toBe('62');
  rerender(<ProgressBar label="Bytes" value={null} />);
  expect(screen.getByRole('progressbar').hasAttribute('aria-valuenow')).toBe(false);
});

it('tabs move with the arrow keys and go round', async () => {
  render(
    <Tabs
      label="Parts"
      panels={[
        { key: 'a', label: 'First', panel: 'one' },
        { key: 'b', label: 'Second', panel: 'two' },
      ]}
    />,
  );
  await userEvent.click(screen.getByRole('tab', { name: 'First' }));
  await userEvent.keyboard('{ArrowLeft}');
  expect(screen.getByRole('tab', { name: 'Second' }).getAttribute('aria-selected')).toBe('true');
  expect(screen.getByRole('tabpanel').textContent).toBe('two');
});
