import { listPlayers, type StoredEntry } from '@/db/queries/players';
import { findRoster, findRosterOfTeam, type RosterView } from '@/db/queries/rosters';
import { withLeague } from '@/db/tenant';
import { can, type Permission } from '@/lib/domain/access/permissions';
import type { RosterState } from '@/lib/domain/roster/roster-state';
import { notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';
import { getDivisionOf } from '../roster-guards';

/** A player as the roster page shows them, with who changed them last. */
export type RosterPlayer = Omit<StoredEntry, 'position'>;

/** Everything the page of one roster shows, and what the person looking at it may do. */
export async function getRoster(ctx: ActorContext, input: { season: string; team: string }) {
  assertCan(ctx.actor, 'roster.read');
  return withLeague(ctx.league.id, async (tx) => {
    const roster = await findRosterOfTeam(tx, input);
    if (!roster) throw notFound('roster');
    assertCan(ctx.actor, 'roster.read', { teamId: roster.team.id, what: 'roster' });
    const division = await getDivisionOf(tx, roster);
    const may = (permission: Permission): boolean => can(ctx.actor, permission, { teamId: roster.team.id });
    return {
      ...roster,
      players: (await listPlayers(tx, roster.id)).map(toRosterPlayer),
      division: {
        name: division.name,
        leastPlayers: division.leastPlayers,
        mostPlayers: division.mostPlayers,
        freezesAt: division.freezesAt,
      },
      garments: division.garments,
      ruleSetName: division.ruleSetName,
      rules: division.rules,
      may: {
        edit: may('roster.edit'),
        submit: may('roster.submit'),
        return: may('roster.return'),
        signOff: may('roster.sign-off'),
        changeRules: may('rule-set.write'),
      },
    };
  });
}
export type RosterPage = Awaited<ReturnType<typeof getRoster>>;

const toRosterPlayer = ({ position: _, ...player }: StoredEntry): RosterPlayer => player;

/** The part of a roster that changes while somebody looks at it. */
export type RosterNews =
  | { changed: false; revision: number }
  | {
      changed: true;
      revision: number;
      state: RosterState;
      updated: RosterView['updated'];
      players: RosterPlayer[];
    };

/** What is new in a roster since a revision and state; a small answer when nothing is. */
export async function getRosterNews(
  ctx: ActorContext,
  input: { rosterId: string; since: number; state: RosterState | undefined },
): Promise<RosterNews> {
  assertCan(ctx.actor, 'roster.read');
  return withLeague(ctx.league.id, async (tx) => {
    const roster = await findRoster(tx, input.rosterId);
    if (!roster) throw notFound('roster');
    assertCan(ctx.actor, 'roster.read', { teamId: roster.team.id, what: 'roster' });
    const { revision, state, updated } = roster;
    if (revision === input.since && (input.state ?? state) === state) return { changed: false, revision };
    const players = (await listPlayers(tx, roster.id)).map(toRosterPlayer);
    return { changed: true, revision, state, updated, players };
  });
}
