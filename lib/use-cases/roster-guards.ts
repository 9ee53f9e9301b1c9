import { listDivisionViews, type DivisionView } from '@/db/queries/division-view';
import { listPlayers, type StoredEntry } from '@/db/queries/players';
import { queueEmail } from '@/db/queries/jobs';
import {
  listManagersOfTeams,
  lockRoster,
  updateRosterState,
  type RosterView,
  type StateChange,
} from '@/db/queries/rosters';
import type { LeagueTx } from '@/db/tenant';
import type { Permission } from '@/lib/domain/access/permissions';
import type { OutgoingEmail } from '@/lib/domain/league/email';
import { isRosterEditable, judgeRosterStep, type RosterStep } from '@/lib/domain/roster/roster-state';
import { checkRoster } from '@/lib/domain/rules/check-roster';
import { AppError, notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from './context';
import { links } from './links';

/** Everything a roster is judged by, with its row locked. */
export type LockedRoster = { roster: RosterView; players: StoredEntry[]; division: DivisionView };

/** The division of a roster with its garments and the rules in force. */
export async function getDivisionOf(tx: LeagueTx, roster: RosterView): Promise<DivisionView> {
  const divisions = await listDivisionViews(tx, roster.season.id);
  const division = divisions.find(({ id }) => id === roster.team.divisionId);
  if (!division) throw new Error('a team without its division');
  return division;
}

/** Locks a roster for somebody who holds the permission for its team; to everybody else it does not exist. */
export async function lockRosterFor(
  tx: LeagueTx,
  ctx: ActorContext,
  permission: Permission,
  rosterId: string,
): Promise<LockedRoster> {
  const roster = await lockRoster(tx, rosterId);
  if (!roster) throw notFound('roster');
  assertCan(ctx.actor, permission, { teamId: roster.team.id, what: 'roster' });
  return { roster, players: await listPlayers(tx, rosterId), division: await getDivisionOf(tx, roster) };
}

/** Ends the use case unless the players of this roster may be edited now. */
export function assertEditable(roster: RosterView): void {
  if (isRosterEditable(roster.state)) return;
  const way =
    roster.state === 'submitted'
      ? 'Take it back first, or ask a league admin to return it.'
      : 'Ask a league admin to reopen it.';
  throw new AppError('locked', `The roster of ${roster.team.name} is ${roster.state}. ${way}`);
}

/** Ends the use case unless the roster is still the one the person saw. */
export function assertRevision(roster: RosterView, revision: number): void {
  if (roster.revision === revision) return;
  const who = roster.updated.by ?? 'Somebody';
  throw new AppError(
    'conflict',
    `${who} has changed the roster of ${roster.team.name} since this page was read. Look at it again, then repeat the step.`,
  );
}

/** Ends the use case unless the step may be taken; answers the state it leads to. */
export function assertStep(
  step: RosterStep,
  { roster, players, division }: LockedRoster,
): StateChange['state'] {
  const needsRules = step === 'submit' || step === 'sign off';
  if (needsRules && division.rules === null) throw new AppError('conflict', sayNoRules(division.name));
  const blockers =
    needsRules && division.rules !== null
      ? checkRoster(division.rules.ruleSet, players, division.garments).summary.blockers
      : 0;
  const verdict = judgeRosterStep(step, {
    state: roster.state,
    blockers,
    players: players.length,
    heldByBatch: roster.batch?.code ?? null,
  });
  if (!verdict.allowed) throw new AppError('conflict', verdict.reason);
  return verdict.to;
}

const sayNoRules = (division: string): string =>
  `No number rules are in force for ${division}, so its rosters can't be checked. A league admin puts them in force under Number rules.`;

/** Writes a step; two players who would be sealed with one number end the use case. */
export async function moveRoster(
  tx: LeagueTx,
  ctx: ActorContext,
  roster: RosterView,
  change: StateChange,
): Promise<void> {
  const moved = await updateRosterState(tx, roster.id, change, { now: ctx.now, userId: ctx.actor.userId });
  if (moved) return;
  throw new AppError(
    'conflict',
    `Two players of ${roster.team.name} hold the same number, so the roster can't be ${change.state}. Nothing was changed.`,
  );
}

type Common = { league: string; team: string; link: string };

/** Writes to everybody who manages the team, in the transaction of what happened; answers how many that are. */
export async function tellManagers(
  tx: LeagueTx,
  ctx: ActorContext,
  roster: RosterView,
  compose: (common: Common) => OutgoingEmail,
): Promise<number> {
  const { team, season } = roster;
  const managers = await listManagersOfTeams(tx, [team.id]);
  const link = links.roster(ctx.league.slug, season.slug, team.slug);
  for (const { email } of managers) {
    await queueEmail(tx, ctx, email, compose({ league: ctx.league.name, team: team.name, link }));
  }
  return managers.length;
}
