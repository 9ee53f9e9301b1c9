import { cleanup, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import type { DataColumn } from '@/components/ui/data-column';
import { DataTable, type DataTableProps } from '@/components/ui/data-table';

afterEach(cleanup);

type Team = { id: string; name: string; players: number | null };
const teams: Team[] = [
  { id: 'a', name: 'Otters', players: 12 },
  { id: 'b', name: 'Éperons', players: null },
  { id: 'c', name: 'Badgers', players: 9 },
];
const columns: DataColumn<Team>[] = [
  {
    id: 'name',
    header: 'Team',
    rowHead: true,
    sortValue: (team) => team.name,
    searchText: (team) => team.name,
    cell: (team) => <a href={`#${team.id}`}>{team.name}</a>,
  },
  {
    id: 'players',
    header: 'Players',
    end: true,
    sortValue: (team) => team.players,
    cell: (team) => team.players,
  },
];

function show(more: Partial<DataTableProps<Team>> = {}) {
  render(
    <DataTable
      caption="Teams"
      rows={teams}
      columns={columns}
      getRowId={(team) => team.id}
      searchLabel="Find a team"
      empty={<p>No teams yet</p>}
      {...more}
    />,
  );
}
const namesShown = () => screen.getAllByRole('rowheader').map((cell) => cell.textContent);

describe('a data table', () => {
  it('lists rows as they came until a heading is pressed: rising, falling, as they came', async () => {
    show();
    const heading = screen.getByRole('button', { name: 'Team' });
    expect(namesShown()).toEqual(['Otters', 'Éperons', 'Badgers']);
    await userEvent.click(heading);
    expect(namesShown()).toEqual(['Badgers', 'Éperons', 'Otters']);
    expect(screen.getByRole('columnheader', { name: 'Team' }).getAttribute('aria-sort')).toBe('ascending');
    await userEvent.click(heading);
    expect(namesShown()).toEqual(['Otters', 'Éperons', 'Badgers']);
    await userEvent.click(heading);
    expect(screen.getByRole('columnheader', { name: 'Team' }).hasAttribute('aria-sort')).toBe(false);
  });

  it('keeps rows without a value last, whichever way it sorts', async () => {
    show();
    const heading = screen.getByRole('button', { name: 'Players' });
    await userEvent.click(heading);
    expect(namesShown()).toEqual(['Badgers', 'Otters', 'Éperons']);
    await userEvent.click(heading);
    expect(namesShown()).toEqual(['Otters', 'Badgers', 'Éperons']);
  });

  it('finds a name without its accent, and says what to do when nothing fits', async () => {
    show();
    const search = screen.getByRole('searchbox', { name: 'Find a team' });
    await userEvent.type(search, 'eper');
    expect(namesShown()).toEqual(['Éperons']);
    await userEvent.type(search, 'x');
    expect(screen.getByText('Nothing fits “eperx”')).toBeTruthy();
    await userEvent.click(screen.getByRole('button', { name: 'Clear the search' }));
    expect(namesShown()).toHaveLength(3);
  });

  it('is walked with the arrow keys, one stop of the tab key, and Enter opens the row', async () => {
    const onOpenRow = vi.fn();
    show({ onOpenRow });
    const rows = screen.getAllByRole('row').slice(1);
    expect(rows.map((row) => row.tabIndex)).toEqual([0, -1, -1]);
    rows[0]?.focus();
    await userEvent.keyboard('{ArrowDown}{ArrowDown}{ArrowDown}');
    expect(document.activeElement).toBe(rows[2]);
    await userEvent.keyboard('{Home}{ArrowDown}{Enter}');
    expect(onOpenRow).toHaveBeenCalledWith(teams[1]);
  });

  it('leaves the arrow keys to a field inside a row', async () => {
    show({ rowActions: (team) => <input aria-label={`Note on ${team.name}`} /> });
    const field = screen.getByLabelText('Note on Otters');
    await userEvent.click(field);
    await userEvent.keyboard('{ArrowDown}');
    expect(document.activeElement).toBe(field);
  });

  it('shows its empty state in place of itself', () => {
    show({ rows: [] });
    expect(screen.getByText('No teams yet')).toBeTruthy();
    expect(screen.queryByRole('table')).toBeNull();
  });

  it('gives each cell its heading for the cards of a phone, and each row its actions', () => {
    show({ rowActions: (team) => <button type="button">Remind {team.name}</button> });
    const row = screen.getAllByRole('row')[1];
    if (row === undefined) throw new Error('no row');
    expect(within(row).getByText('12').dataset.label).toBe('Players');
    expect(within(row).getByRole('button', { name: 'Remind Otters' })).toBeTruthy();
  });

  it('draws only some rows of a long list, and counts them all', () => {
    const many = Array.from({ length: 1500 }, (_, at) => ({ id: `t${at}`, name: `Team ${at}`, players: at }));
    show({ rows: many });
    expect(screen.getAllByRole('row').length).toBeLessThan(120);
    expect(screen.getByRole('table').getAttribute('aria-rowcount')).toBe('1501');
  });
});
