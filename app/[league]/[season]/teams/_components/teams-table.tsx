'use client';

import { useRouter } from 'next/navigation';
import { useMemo, useState } from 'react';
import { RosterStateTag } from '@/components/status/roster-state-tag';
import { Button, ButtonLink } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { ConfirmDialog } from '@/components/ui/confirm-dialog';
import { DataTable, type DataColumn } from '@/components/ui/data-table';
import { EmptyState } from '@/components/ui/empty-state';
import { FilterChips } from '@/components/ui/filter-chips';
import { TextLink } from '@/components/ui/text-link';
import { useToast } from '@/components/ui/toast';
import { YokeTile } from '@/components/yoke-tile/yoke-tile';
import { countOf } from '@/lib/domain/text/count-of';
import type { ListedTeam, TeamList } from '@/lib/use-cases/teams/list-teams';
import type { LeagueAction } from '@/lib/web/action-result';
import { paths } from '@/lib/web/paths';

type Remove = LeagueAction<{ teamId: string }, { name: string; players: number }>;

/** Every team with its kits: find, filter by division, sort, open, remove. */
export function TeamsTable({
  league,
  season,
  list,
  onRemove,
}: {
  league: string;
  season: string;
  list: TeamList;
  onRemove: Remove;
}) {
  const router = useRouter();
  const showToast = useToast();
  const [division, setDivision] = useState('all');
  const [going, setGoing] = useState<ListedTeam | null>(null);
  const { teams, mayChange, divisions } = list;
  const leadsTo = mayChange ? 'team' : list.mayOpenRosters ? 'roster' : null;
  const shown = useMemo(
    () => teams.filter((team) => division === 'all' || team.divisionId === division),
    [teams, division],
  );
  const columns = useMemo(
    () => makeColumns(league, season, leadsTo, list.mayOpenRosters),
    [league, season, leadsTo, list.mayOpenRosters],
  );

  const remove = async () => {
    if (!going) return;
    const answer = await onRemove(league, { teamId: going.id });
    if (!answer.ok) return answer.error.message;
    showToast({
      tone: 'set',
      title: `${answer.data.name} is removed with ${countOf(answer.data.players, 'player')}`,
    });
    setGoing(null);
    router.refresh();
  };

  return (
    <Card flush>
      <DataTable
        caption="Teams of the season"
        rows={shown}
        columns={columns}
        getRowId={(team) => team.id}
        searchLabel="Find a team"
        {...(division !== 'all' && { onClearFilters: () => setDivision('all') })}
        {...(leadsTo !== null && {
          onOpenRow: (team: ListedTeam) => router.push(paths[leadsTo](league, season, team.slug)),
        })}
        toolbar={
          <FilterChips
            label="Which division"
            chosen={division}
            onChoose={setDivision}
            chips={[
              { id: 'all', label: 'All', count: teams.length },
              ...divisions.map(({ id, name }) => ({
                id,
                label: name,
                count: teams.filter((team) => team.divisionId === id).length,
              })),
            ]}
          />
        }
        {...(mayChange && {
          rowActions: (team: ListedTeam) => (
            <span className="flex justify-end gap-1">
              {/* The team's name opens the same page, so a narrow table does without this. */}
              <ButtonLink
                size="sm"
                look="quiet"
                href={paths.team(league, season, team.slug)}
                aria-label={`Edit ${team.name}`}
                className="sm:max-lg:hidden"
              >
                Edit
              </ButtonLink>
              <Button
                size="sm"
                look="quiet"
                unavailable={sayWhyItStays(team)}
                onClick={() => setGoing(team)}
                aria-label={`Remove ${team.name}`}
              >
                Remove
              </Button>
            </span>
          ),
        })}
        empty={
          <EmptyState
            title="No teams yet"
            action={
              mayChange &&
              (divisions.length === 0 ? (
                <ButtonLink look="primary" href={paths.newDivision(league, season)}>
                  Add a division first
                </ButtonLink>
              ) : (
                <>
                  <ButtonLink look="primary" href={paths.importTeams(league, season)}>
                    Import teams
                  </ButtonLink>
                  <ButtonLink href={paths.newTeam(league, season)}>Add a team</ButtonLink>
                </>
              ))
            }
          >
            {mayChange
              ? 'Bring in a list with names, divisions and colours, or add them one by one.'
              : 'Ask a league admin to name you for your team.'}
          </EmptyState>
        }
      />
      <ConfirmDialog
        open={going !== null}
        onOpenChange={(open) => {
          if (!open) setGoing(null);
        }}
        title={`Remove ${going?.name ?? 'the team'}?`}
        confirm={`Remove ${going?.name ?? 'it'}`}
        onConfirm={remove}
      >
        {going?.players === 0
          ? 'Its colours are lost. It has no players.'
          : `Its roster of ${countOf(going?.players ?? 0, 'player')} and its colours are lost for good.`}
      </ConfirmDialog>
    </Card>
  );
}

/** Where the table is narrow the shirt alone shows the colour; its name is still read aloud. */
const colourName = 'text-dusk sm:max-lg:sr-only';

/** What keeps a team from being removed, as the server would say it; undefined when nothing does. */
function sayWhyItStays({ batch, state }: ListedTeam): string | undefined {
  if (batch !== null) return `Batch ${batch} holds its roster.`;
  return state === 'signed off' || state === 'frozen'
    ? `Its roster is ${state}. Reopen it first.`
    : undefined;
}

/** `leadsTo` is the page a team's name opens, or null for a reader who may open neither. */
function makeColumns(
  league: string,
  season: string,
  leadsTo: 'team' | 'roster' | null,
  mayOpenRosters: boolean,
): DataColumn<ListedTeam>[] {
  return [
    {
      id: 'team',
      header: 'Team',
      rowHead: true,
      cell: (team) =>
        leadsTo === null ? (
          <span className="font-[560] break-words">{team.name}</span>
        ) : (
          <TextLink
            href={paths[leadsTo](league, season, team.slug)}
            className="text-ink! break-words no-underline! hover:underline!"
          >
            {team.name}
          </TextLink>
        ),
      sortValue: (team) => team.name,
      searchText: (team) => team.name,
    },
    {
      id: 'home',
      header: 'Home',
      cell: (team) => (
        <span className="flex items-center gap-2">
          <YokeTile kit={team.kits.home} number="12" />
          <span className={colourName}>{team.kits.home.name}</span>
        </span>
      ),
      sortValue: (team) => team.kits.home.name,
      searchText: (team) => team.kits.home.name,
    },
    {
      id: 'away',
      header: 'Away',
      cell: (team) =>
        team.kits.away ? (
          <span className="flex items-center gap-2">
            <YokeTile kit={team.kits.away} number="12" />
            <span className={colourName}>{team.kits.away.name}</span>
          </span>
        ) : (
          <span className="text-dusk">none</span>
        ),
      sortValue: (team) => team.kits.away?.name ?? null,
    },
    {
      id: 'division',
      header: 'Division',
      cell: (team) => <span className="text-dusk">{team.division}</span>,
      sortValue: (team) => team.division,
      searchText: (team) => team.division,
    },
    {
      id: 'players',
      header: 'Players',
      end: true,
      cell: (team) => team.players,
      sortValue: (team) => team.players,
    },
    {
      id: 'roster',
      header: 'Roster',
      cell: (team) =>
        mayOpenRosters ? (
          <TextLink
            href={paths.roster(league, season, team.slug)}
            className="no-underline!"
            aria-label={`Roster of ${team.name}, ${team.state}`}
          >
            <RosterStateTag state={team.state} />
          </TextLink>
        ) : (
          <RosterStateTag state={team.state} />
        ),
      sortValue: (team) => team.state,
      searchText: (team) => team.state,
    },
    {
      id: 'managers',
      header: 'Managers',
      end: true,
      cell: (team) => (team.managers === 0 ? <span className="text-care">none yet</span> : team.managers),
      sortValue: (team) => team.managers,
    },
  ];
}
