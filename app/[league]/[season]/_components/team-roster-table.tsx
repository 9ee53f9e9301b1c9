'use client';

import { useRouter } from 'next/navigation';
import { useMemo, useState, type ReactNode } from 'react';
import { Card } from '@/components/ui/card';
import { DataTable, type DataColumn } from '@/components/ui/data-table';
import { FilterChips } from '@/components/ui/filter-chips';
import type { ReadyTeam } from '@/lib/use-cases/readiness/list-readiness';
import { paths } from '@/lib/web/paths';
import { makeTeamColumns } from './team-columns';

/**
 * The season's teams with their rosters: narrowed by one of `groups` (those that keep nobody are left out), found by
 * team or player, sorted, opened. `columns` follow those that name the team; keep them outside the component.
 */
export function TeamRosterTable<Group extends string>({
  league,
  season,
  teams,
  caption,
  groupsLabel,
  groups,
  groupOf,
  columns,
  empty,
  rowActions,
}: {
  league: string;
  season: string;
  teams: ReadyTeam[];
  caption: string;
  groupsLabel: string;
  groups: readonly { id: Group; label: string }[];
  groupOf: (team: ReadyTeam) => Group;
  columns: readonly DataColumn<ReadyTeam>[];
  empty: ReactNode;
  rowActions?: (team: ReadyTeam) => ReactNode;
}) {
  const router = useRouter();
  const [chosen, setChosen] = useState<Group | 'all'>('all');
  const shown = useMemo(
    () => teams.filter((team) => chosen === 'all' || groupOf(team) === chosen),
    [teams, chosen, groupOf],
  );
  const all = useMemo(() => [...makeTeamColumns(league, season), ...columns], [league, season, columns]);
  const chips = groups
    .map((group) => ({ ...group, count: teams.filter((team) => groupOf(team) === group.id).length }))
    .filter((group) => group.count > 0 || group.id === chosen);
  return (
    <Card flush>
      <DataTable
        caption={caption}
        rows={shown}
        columns={all}
        getRowId={(team) => team.id}
        searchLabel="Find a team or player"
        {...(chosen !== 'all' && { onClearFilters: () => setChosen('all') })}
        onOpenRow={(team) => router.push(paths.roster(league, season, team.slug))}
        toolbar={
          <FilterChips<Group | 'all'>
            label={groupsLabel}
            chosen={chosen}
            onChoose={setChosen}
            chips={[{ id: 'all', label: 'All', count: teams.length }, ...chips]}
          />
        }
        {...(rowActions && { rowActions })}
        empty={empty}
      />
    </Card>
  );
}
