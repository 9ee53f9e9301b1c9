import { z } from 'zod';
import { insertAuditEvent } from '@/db/queries/audit';
import { listDivisionViews } from '@/db/queries/division-view';
import { queueEmail } from '@/db/queries/jobs';
import { listManagersOfTeams, listSeasonRosters } from '@/db/queries/rosters';
import { findSeasonBySlug } from '@/db/queries/season-view';
import { takeRatePoint, type RateBudget } from '@/db/rate-limit';
import { withLeague } from '@/db/tenant';
import { formatInstant } from '@/lib/domain/dates/format';
import { judgeReadiness } from '@/lib/domain/readiness/judge-readiness';
import { checkRoster } from '@/lib/domain/rules/check-roster';
import { getEnv } from '@/lib/platform/env';
import { AppError, notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';

export const remindSchema = z.object({
  season: z.string().max(80),
  teamIds: z.array(z.uuid()).min(1).max(500),
});

/** One reminder a day for each team, however often the button is pressed and by whom. Our own figure. */
const perTeam: RateBudget = { name: 'remind-team', points: 1, seconds: 86_400 };

/**
 * Writes to the managers of teams whose roster is not handed in yet, saying what holds it. Teams that were reminded
 * within a day, have no manager, or have nothing to do are counted as left out.
 */
export async function remindManagers(
  ctx: ActorContext,
  input: z.output<typeof remindSchema>,
): Promise<{ teams: number; people: number; leftOut: number }> {
  assertCan(ctx.actor, 'readiness.remind');
  return withLeague(ctx.league.id, async (tx) => {
    const season = await findSeasonBySlug(tx, input.season);
    if (!season) throw notFound('season');
    const divisions = new Map(
      (await listDivisionViews(tx, season.id)).map((division) => [division.id, division]),
    );
    const rosters = await listSeasonRosters(tx, season.id, input.teamIds);
    const managers = await listManagersOfTeams(tx, input.teamIds);
    const told = new Set<string>();
    let teams = 0;
    for (const roster of rosters) {
      const division = divisions.get(roster.team.divisionId);
      const mine = managers.filter((manager) => manager.teamId === roster.team.id);
      if (!division || mine.length === 0 || (roster.state !== 'open' && roster.state !== 'returned'))
        continue;
      if ((await takeRatePoint(perTeam, roster.team.id)) !== null) continue;
      const { holds } = judgeReadiness({
        state: roster.state,
        players: roster.players.length,
        least: division.leastPlayers,
        managers: mine.length,
        returnReason: roster.returnReason,
        batch: null,
        signedOffOn: null,
        check: division.rules ? checkRoster(division.rules.ruleSet, roster.players, division.garments) : null,
        numbers: roster.players.map((player) => player.number.trim()),
      });
      const link = `${getEnv().RAGLAN_BASE_URL}/${ctx.league.slug}/${season.slug}/rosters/${roster.team.slug}`;
      const freezes = formatInstant(division.freezesAt, ctx.league.timeZone);
      for (const { email } of mine) {
        const params = { league: ctx.league.name, team: roster.team.name, freezes, holds: `${holds}.`, link };
        await queueEmail(tx, ctx, email, { template: 'roster-reminder', params });
        told.add(email);
      }
      teams += 1;
    }
    if (teams === 0) {
      throw new AppError(
        'conflict',
        'Nobody was written to: these teams were reminded within a day, have no manager, or have nothing to do.',
      );
    }
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      { type: 'managers reminded', subjectId: season.id, data: { teams, people: told.size } },
    );
    return { teams, people: told.size, leftOut: input.teamIds.length - teams };
  });
}
