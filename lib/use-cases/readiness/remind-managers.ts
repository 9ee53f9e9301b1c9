import { z } from 'zod';
import { insertAuditEvent } from '@/db/queries/audit';
import { queueEmail } from '@/db/queries/jobs';
import { listManagersOfTeams } from '@/db/queries/rosters';
import { clearRateBudget, takeRatePoint, type RateBudget } from '@/db/rate-limit';
import { withLeague } from '@/db/tenant';
import { formatInstant } from '@/lib/domain/dates/format';
import { isRosterEditable } from '@/lib/domain/roster/roster-state';
import { AppError } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';
import { links } from '../links';
import { readReadiness } from '../readiness-reading';

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
  const taken: string[] = [];
  try {
    return await withLeague(ctx.league.id, async (tx) => {
      const { season, teams } = await readReadiness(tx, ctx, input.season);
      const managers = await listManagersOfTeams(tx, input.teamIds);
      const told = new Set<string>();
      for (const team of teams.filter(
        ({ id, state }) => input.teamIds.includes(id) && isRosterEditable(state),
      )) {
        const mine = managers.filter(({ teamId }) => teamId === team.id);
        if (mine.length === 0 || (await takeRatePoint(perTeam, team.id)) !== null) continue;
        taken.push(team.id);
        for (const { email } of mine) {
          const params = {
            league: ctx.league.name,
            team: team.name,
            freezes: formatInstant(team.freezesAt, ctx.league.timeZone),
            holds: `${team.holds}.`,
            link: links.roster(ctx.league.slug, season.slug, team.slug),
          };
          await queueEmail(tx, ctx, email, { template: 'roster-reminder', params });
          told.add(email);
        }
      }
      if (taken.length === 0) {
        throw new AppError(
          'conflict',
          'Nobody was written to: these teams were reminded within a day, have no manager, or have nothing to do.',
        );
      }
      await insertAuditEvent(
        tx,
        { ...ctx, userId: ctx.actor.userId },
        {
          type: 'managers reminded',
          subjectId: season.id,
          data: { teams: taken.length, people: told.size },
        },
      );
      return { teams: taken.length, people: told.size, leftOut: input.teamIds.length - taken.length };
    });
  } catch (error) {
    // Nothing was sent, so nobody has had today's reminder.
    for (const teamId of taken) await clearRateBudget(perTeam, teamId);
    throw error;
  }
}
