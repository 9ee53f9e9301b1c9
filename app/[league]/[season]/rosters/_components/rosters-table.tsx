'use client';

import { FindingSummary } from '@/components/status/finding-mark';
import { RosterStateTag } from '@/components/status/roster-state-tag';
import { ButtonLink } from '@/components/ui/button';
import type { DataColumn } from '@/components/ui/data-table';
import { EmptyState } from '@/components/ui/empty-state';
import { rosterStates } from '@/lib/domain/roster/roster-state';
import { capitalise } from '@/lib/domain/text/sentence';
import type { ReadyTeam } from '@/lib/use-cases/readiness/list-readiness';
import { paths } from '@/lib/web/paths';
import { TeamRosterTable } from '../../_components/team-roster-table';

const states = rosterStates.map((id) => ({ id, label: capitalise(id) }));

const sum = (team: ReadyTeam, key: 'blockers' | 'cautions'): number =>
  Object.values(team.areas).reduce((total, area) => total + area[key], 0);

const columns: DataColumn<ReadyTeam>[] = [
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
  return (
    <TeamRosterTable
      league={league}
      season={season}
      teams={teams}
      caption="Rosters of the season"
      groupsLabel="Which rosters"
      groups={states}
      groupOf={stateOf}
      columns={columns}
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
  );
}

const stateOf = (team: ReadyTeam) => team.state;
