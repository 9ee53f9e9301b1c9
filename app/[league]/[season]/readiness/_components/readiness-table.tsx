'use client';

import { FindingMark } from '@/components/status/finding-mark';
import { ButtonLink } from '@/components/ui/button';
import type { DataColumn } from '@/components/ui/data-table';
import { EmptyState } from '@/components/ui/empty-state';
import { StatusText } from '@/components/ui/tag';
import type { ReadinessArea, ReadinessGroup } from '@/lib/domain/readiness/judge-readiness';
import { countOf } from '@/lib/domain/text/count-of';
import type { ReadyTeam } from '@/lib/use-cases/readiness/list-readiness';
import { paths } from '@/lib/web/paths';
import { TeamRosterTable } from '../../_components/team-roster-table';

const groups: { id: ReadinessGroup; label: string }[] = [
  { id: 'blocked', label: 'Blocked' },
  { id: 'collecting', label: 'Collecting' },
  { id: 'submitted', label: 'To sign off' },
  { id: 'ready', label: 'Ready' },
  { id: 'in a batch', label: 'In a batch' },
];

/** Every team of the season with what holds it: filter, find by team or player, sort, open. */
export function ReadinessTable({
  league,
  season,
  teams,
  mayAddTeams,
}: {
  league: string;
  season: string;
  teams: ReadyTeam[];
  mayAddTeams: boolean;
}) {
  return (
    <TeamRosterTable
      league={league}
      season={season}
      teams={teams}
      caption="Teams of the season"
      groupsLabel="Which teams"
      groups={groups}
      groupOf={groupOf}
      columns={columns}
      empty={
        <EmptyState
          title={mayAddTeams ? 'No teams yet' : 'No team of yours in this season'}
          action={
            mayAddTeams && (
              <ButtonLink look="primary" href={paths.teams(league, season)}>
                Add teams
              </ButtonLink>
            )
          }
        >
          {mayAddTeams
            ? 'Add them one by one, or import a list.'
            : 'Ask a league admin to name you for your team.'}
        </EmptyState>
      }
    />
  );
}

const groupOf = (team: ReadyTeam) => team.group;

const Nothing = () => (
  <span className="text-dusk" aria-label="nothing yet">
    –
  </span>
);

function RosterCell({ team }: { team: ReadyTeam }) {
  const { blockers } = team.areas.roster;
  const tone =
    team.players === 0 || blockers > 0
      ? team.group === 'collecting' && team.players > 0
        ? 'wait'
        : 'stop'
      : team.group === 'collecting' || team.group === 'blocked'
        ? 'wait'
        : 'set';
  return (
    <StatusText tone={tone}>
      <span aria-label={`${countOf(team.players, 'player')}, roster ${team.state}`}>{team.players}</span>
    </StatusText>
  );
}

const areaColumn = (area: ReadinessArea, header: string): DataColumn<ReadyTeam> => ({
  id: area,
  header,
  cell: (team) => {
    if (team.players === 0) return <Nothing />;
    const { blockers, cautions } = team.areas[area];
    if (blockers > 0) return <FindingMark severity="blocker" count={blockers} />;
    if (cautions > 0) return <FindingMark severity="caution" count={cautions} />;
    return (
      <StatusText tone="set">
        <span className="sr-only">clear</span>
      </StatusText>
    );
  },
  sortValue: (team) =>
    team.players === 0 ? null : team.areas[area].blockers * 1000 + team.areas[area].cautions,
});

const columns: DataColumn<ReadyTeam>[] = [
  {
    id: 'roster',
    header: 'Roster',
    cell: (team) => <RosterCell team={team} />,
    sortValue: (team) => team.players,
  },
  areaColumn('numbers', 'Numbers'),
  areaColumn('sizes', 'Sizes'),
  areaColumn('names', 'Names'),
  {
    id: 'batch',
    header: 'Batch',
    cell: (team) =>
      team.batch === null ? (
        <Nothing />
      ) : (
        <StatusText tone={team.batch.state === 'received' ? 'set' : 'wait'}>
          <span className="whitespace-nowrap">{team.batch.code}</span>
        </StatusText>
      ),
    sortValue: (team) => team.batch?.code ?? null,
    searchText: (team) => team.batch?.code ?? '',
  },
  {
    id: 'holds',
    header: 'What holds it',
    cell: (team) => <span className="block max-w-80 break-words">{team.holds}</span>,
    sortValue: (team) => team.holds,
    searchText: (team) => team.holds,
  },
];
