import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { NumberRail } from '@/components/number-rail/number-rail';
import type { RailEntry } from '@/lib/domain/numbers/number-rail';

afterEach(cleanup);

const labels: RailEntry[] = [
  { label: '0', state: 'free', rows: [], reason: '0 is free.' },
  { label: '1', state: 'taken', rows: [4], reason: '1 is worn by Farrow.' },
  { label: '2', state: 'twice', rows: [2, 3], reason: '2 is worn by Calloway and Dunmore.' },
  {
    label: '3',
    state: 'kept back',
    rows: [],
    reason: '3 is kept back: last worn by a player who may return.',
  },
  { label: '6', state: 'refused', rows: [], reason: '6 is above 5.' },
];

describe('the number rail', () => {
  it('says each number with its state', () => {
    render(<NumberRail labels={labels} />);
    expect(screen.getAllByRole('button').map((button) => button.getAttribute('aria-label'))).toEqual([
      '0, free',
      '1, taken',
      '2, twice',
      '3, kept back',
      '6, not allowed',
    ]);
  });

  it('lets free and kept-back numbers be picked, shows who wears a worn one, and refuses the rest', async () => {
    const [onPick, onVisit] = [vi.fn(), vi.fn()];
    render(<NumberRail labels={labels} onPick={onPick} onVisit={onVisit} />);
    for (const button of screen.getAllByRole('button')) await userEvent.click(button);
    expect(onPick.mock.calls).toEqual([['0'], ['3']]);
    expect(onVisit.mock.calls).toEqual([
      [[4], '1'],
      [[2, 3], '2'],
    ]);
  });

  it('is one stop of the tab key, walked with the arrows, and tells the reason of the number in focus', async () => {
    render(<NumberRail labels={labels} chosen="1" />);
    await userEvent.tab();
    expect(document.activeElement?.getAttribute('aria-label')).toBe('1, taken');
    await userEvent.keyboard('{ArrowRight}');
    expect(document.activeElement?.getAttribute('aria-label')).toBe('2, twice');
    expect(screen.getByText('2 is worn by Calloway and Dunmore.')).toBeTruthy();
    await userEvent.tab();
    expect(document.activeElement).toBe(document.body);
  });
});
