'use client';

import { useRouter } from 'next/navigation';
import { useMemo, useState } from 'react';
import { FindingMark } from '@/components/status/finding-mark';
import { ButtonLink } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { DataTable, type DataColumn } from '@/components/ui/data-table';
import { EmptyState } from '@/components/ui/empty-state';
import { FilterChips } from '@/components/ui/filter-chips';
import { StatusText } from '@/components/ui/tag';
import type { ReadinessArea, ReadinessGroup } from '@/lib/domain/readiness/judge-readiness';
import { countOf } from '@/lib/domain/text/count-of';
import type { ReadyTeam } from '@/lib/use-cases/readiness/list-readiness';
import { paths } from '@/lib/web/paths';
import { makeTeamColumns } from '../../_components/team-columns';

type Chip = 'all' | ReadinessGroup;
const chips: { id: Chip; label: string }[] = [
  { id: 'all', label: 'All' },
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
  const router = useRouter();
  const [chip, setChip] = useState<Chip>('all');
  const shown = useMemo(() => teams.filter((team) => chip === 'all' || team.group === chip), [teams, chip]);
  const columns = useMemo(() => makeColumns(league, season), [league, season]);
  return (
    <Card flush>
      <DataTable
        caption="Teams of the season"
        rows={shown}
        columns={columns}
        getRowId={(team) => team.id}
        searchLabel="Find a team or player"
        {...(chip !== 'all' && { onClearFilters: () => setChip('all') })}
        onOpenRow={(team) => router.push(paths.roster(league, season, team.slug))}
        toolbar={
          <FilterChips
            label="Which teams"
            chosen={chip}
            onChoose={setChip}
            chips={chips
              .map((entry) => ({
                ...entry,
                count: teams.filter((team) => entry.id === 'all' || team.group === entry.id).length,
              }))
              .filter((entry) => entry.id === 'all' || entry.count > 0 || entry.id === chip)}
          />
        }
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
    </Card>
  );
}

function makeColumns(league: string, season: string): DataColumn<ReadyTeam>[] {
  return [
    ...makeTeamColumns(league, season),
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
}

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
