import type { Metadata } from 'next';
import { cache } from 'react';
import { getRoster } from '@/lib/use-cases/rosters/get-roster';
import { paths } from '@/lib/web/paths';
import { requireLeague } from '@/lib/web/session';
import { showNotFound } from '@/lib/web/show-not-found';
import { RosterEditor } from './_components/roster-editor';
import {
  freezeRosterAction,
  reopenRosterAction,
  returnRosterAction,
  signOffRosterAction,
  submitRosterAction,
  withdrawRosterAction,
} from './actions';

type Props = { params: Promise<{ league: string; season: string; team: string }> };

/** Read once for the title and the page of one request. */
const readRoster = cache(async (league: string, season: string, team: string) => {
  const { ctx } = await requireLeague(league, paths.roster(league, season, team));
  return { ctx, roster: await showNotFound(getRoster(ctx, { season, team })) };
});

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { league, season, team } = await params;
  const { roster } = await readRoster(league, season, team);
  return { title: `${roster.team.name}, roster` };
}

export default async function RosterPage({ params }: Props) {
  const { league, season, team } = await params;
  const { ctx, roster } = await readRoster(league, season, team);
  return (
    <RosterEditor
      key={roster.id}
      league={{ slug: league, timeZone: ctx.league.timeZone }}
      user={{ id: ctx.actor.userId, name: ctx.actor.name }}
      today={ctx.now}
      roster={roster}
      steps={{
        submit: submitRosterAction,
        withdraw: withdrawRosterAction,
        return: returnRosterAction,
        signOff: signOffRosterAction,
        reopen: reopenRosterAction,
        freeze: freezeRosterAction,
      }}
    />
  );
}
