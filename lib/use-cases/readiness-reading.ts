import { listDivisionViews } from '@/db/queries/division-view';
import { listSeasonRosters } from '@/db/queries/rosters';
import { findSeasonBySlug } from '@/db/queries/season-view';
import type { LeagueTx } from '@/db/tenant';
import { canForWholeLeague } from '@/lib/domain/access/permissions';
import { formatShortDay } from '@/lib/domain/dates/format';
import { toDay } from '@/lib/domain/dates/zone';
import { judgeReadiness } from '@/lib/domain/readiness/judge-readiness';
import { checkRoster } from '@/lib/domain/rules/check-roster';
import { notFound } from '@/lib/platform/errors';
import type { ActorContext } from './context';

/**
 * Where every team of a season stands, in the order of the divisions; a manager sees the teams they are named for. Four
 * short queries, whatever the number of teams.
 */
export async function readReadiness(tx: LeagueTx, ctx: ActorContext, slug: string) {
  const season = await findSeasonBySlug(tx, slug);
  if (!season) throw notFound('season');
  const divisions = new Map(
    (await listDivisionViews(tx, season.id)).map((division) => [division.id, division]),
  );
  const whole = canForWholeLeague(ctx.actor, 'readiness.read');
  const rosters = await listSeasonRosters(tx, season.id, whole ? null : ctx.actor.teamIds);
  const teams = rosters.map((roster) => {
    const division = divisions.get(roster.team.divisionId);
    const rules = division?.rules?.ruleSet;
    return {
      id: roster.team.id,
      slug: roster.team.slug,
      name: roster.team.name,
      kit: roster.team.kits.home,
      division: division?.name ?? '',
      divisionSlug: division?.slug ?? '',
      freezesAt: division?.freezesAt ?? season.freezesAt,
      state: roster.state,
      batch: roster.batch,
      players: roster.players.length,
      // Found by name on this page, so that a coordinator can answer a family's question.
      playerNames: roster.players.map((player) => player.name),
      managers: roster.managers.map((manager) => manager.name),
      managerIds: roster.managers.map((manager) => manager.userId),
      ...judgeReadiness({
        state: roster.state,
        players: roster.players.length,
        least: division?.leastPlayers ?? 0,
        managers: roster.managers.length,
        returnReason: roster.returnReason,
        batch: roster.batch,
        signedOffOn: roster.signedOffAt && formatShortDay(toDay(roster.signedOffAt, ctx.league.timeZone)),
        check: rules ? checkRoster(rules, roster.players, division.garments) : null,
        numbers: roster.players.map((player) => player.number.trim()),
      }),
    };
  });
  return { season, teams };
}
