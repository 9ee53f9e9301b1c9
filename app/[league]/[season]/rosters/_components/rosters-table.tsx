'use client';

import { useRouter } from 'next/navigation';
import { useMemo, useState } from 'react';
import { FindingSummary } from '@/components/status/finding-mark';
import { RosterStateTag } from '@/components/status/roster-state-tag';
import { ButtonLink } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { DataTable, type DataColumn } from '@/components/ui/data-table';
import { EmptyState } from '@/components/ui/empty-state';
import { FilterChips } from '@/components/ui/filter-chips';
import { rosterStates, type RosterState } from '@/lib/domain/roster/roster-state';
import { capitalise } from '@/lib/domain/text/sentence';
import type { ReadyTeam } from '@/lib/use-cases/readiness/list-readiness';
import { paths } from '@/lib/web/paths';
import { makeTeamColumns } from '../../_components/team-columns';

type Chip = 'all' | RosterState;

const sum = (team: ReadyTeam, key: 'blockers' | 'cautions'): number =>
  Object.values(team.areas).reduce((total, area) => total + area[key], 0);

/** Every roster with its state and what was found in it: filter by state, find a team or a player, open. */
export function RostersTable({
  league,
  season,
  teams,
}: {
  league: string;
  season: string;
  teams: ReadyTeam[];
}) {
  const router = useRouter();
  const [chip, setChip] = useState<Chip>('all');
  const shown = useMemo(() => teams.filter((team) => chip === 'all' || team.state === chip), [teams, chip]);
  const columns = useMemo((): DataColumn<ReadyTeam>[] => {
    return [
      ...makeTeamColumns(league, season),
      {
        id: 'players',
        header: 'Players',
        end: true,
        cell: (team) => team.players,
        sortValue: (team) => team.players,
      },
      {
        id: 'state',
        header: 'State',
        cell: (team) => <RosterStateTag state={team.state} />,
        sortValue: (team) => rosterStates.indexOf(team.state),
      },
      {
        id: 'found',
        header: 'Found',
        cell: (team) =>
          team.players === 0 ? (
            <span className="text-dusk">no players yet</span>
          ) : (
            <FindingSummary
              summary={{ blockers: sum(team, 'blockers'), cautions: sum(team, 'cautions'), notes: 0 }}
            />
          ),
        sortValue: (team) => sum(team, 'blockers') * 1000 + sum(team, 'cautions'),
      },
      {
        id: 'managers',
        header: 'Managers',
        cell: (team) => team.managers.join(', ') || <span className="text-care">none yet</span>,
        sortValue: (team) => team.managers.length,
        searchText: (team) => team.managers.join(' '),
      },
    ];
  }, [league, season]);
  return (
    <Card flush>
      <DataTable
        caption="Rosters of the season"
        rows={shown}
        columns={columns}
        getRowId={(team) => team.id}
        searchLabel="Find a team or player"
        {...(chip !== 'all' && { onClearFilters: () => setChip('all') })}
        onOpenRow={(team) => router.push(paths.roster(league, season, team.slug))}
        toolbar={
          <FilterChips
            label="Which rosters"
            chosen={chip}
            onChoose={setChip}
            chips={[
              { id: 'all' as Chip, label: 'All', count: teams.length },
              ...rosterStates
                .map((state) => ({
                  id: state as Chip,
                  label: capitalise(state),
                  count: teams.filter((team) => team.state === state).length,
                }))
                .filter((entry) => entry.count > 0 || entry.id === chip),
            ]}
          />
        }
        rowActions={(team) => (
          <ButtonLink
            size="sm"
            look="quiet"
            href={paths.roster(league, season, team.slug)}
            aria-label={`Open the roster of ${team.name}`}
          >
            Open
          </ButtonLink>
        )}
        empty={
          <EmptyState title="No roster here">
            A roster comes with its team. Ask a league admin to add the team or to name you as its manager.
          </EmptyState>
        }
      />
    </Card>
  );
}
