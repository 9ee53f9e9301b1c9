import type { z } from 'zod';
import { insertAuditEvent } from '@/db/queries/audit';
import { insertTeam } from '@/db/queries/teams';
import { withLeague } from '@/db/tenant';
import { makeUniqueSlug } from '@/lib/domain/league/slug';
import { assertCan, type ActorContext } from '../context';
import { assertTeamFits, lockSeasonWithTeams } from '../team-guards';
import type { addTeamSchema } from './team-schemas';

/** Adds a team with an open, empty roster. */
export async function addTeam(
  ctx: ActorContext,
  input: z.output<typeof addTeamSchema>,
): Promise<{ slug: string }> {
  assertCan(ctx.actor, 'team.write');
  return withLeague(ctx.league.id, async (tx) => {
    const season = await lockSeasonWithTeams(tx, input.season);
    assertTeamFits(input.fields, season, null);
    const id = ctx.newId();
    const slug = makeUniqueSlug(
      input.fields.name,
      'team',
      new Set(['new', 'import', ...season.teams.map((team) => team.slug)]),
    );
    await insertTeam(tx, {
      ...input.fields,
      id,
      rosterId: ctx.newId(),
      seasonId: season.seasonId,
      slug,
      now: ctx.now,
      userId: ctx.actor.userId,
    });
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      { type: 'team added', subjectId: id, data: { name: input.fields.name } },
    );
    return { slug };
  });
}
