import type { z } from 'zod';
import { insertAuditEvent } from '@/db/queries/audit';
import { insertTeam, updateTeam } from '@/db/queries/teams';
import { withLeague } from '@/db/tenant';
import type { Kit } from '@/lib/domain/kit/kit';
import { undecidedKit } from '@/lib/domain/kit/kit-of-colours';
import { makeUniqueSlug } from '@/lib/domain/league/slug';
import { AppError, notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';
import { lockSeasonWithTeams } from '../team-guards';
import type { importTeamsSchema } from './team-schemas';

export type ImportedTeams = { added: number; changed: number; unchanged: number };

/**
 * Brings a list of teams in, all or nothing: a team that its division has already (by name) gets the colours of the
 * list, every other one is added with an open roster.
 */
export async function importTeams(
  ctx: ActorContext,
  input: z.output<typeof importTeamsSchema>,
): Promise<ImportedTeams> {
  assertCan(ctx.actor, 'team.write');
  return withLeague(ctx.league.id, async (tx) => {
    const season = await lockSeasonWithTeams(tx, input.season);
    const slugs = new Set(['new', 'import', ...season.teams.map((team) => team.slug)]);
    const seen = new Set<string>();
    const counts: ImportedTeams = { added: 0, changed: 0, unchanged: 0 };
    for (const team of input.teams) {
      if (!season.divisions.some((division) => division.id === team.divisionId)) throw notFound('division');
      const key = `${team.divisionId}/${team.name.toLowerCase()}`;
      if (seen.has(key))
        throw new AppError(
          'invalid',
          `${team.name} stands twice in the list for one division. Keep one of the rows.`,
        );
      seen.add(key);
      const known = season.teams.find((entry) => `${entry.divisionId}/${entry.name.toLowerCase()}` === key);
      if (known) {
        const kits = {
          home: mergeKit(known.kits.home, team.home),
          away: team.away ? mergeKit(known.kits.away ?? team.away, team.away) : known.kits.away,
        };
        if (JSON.stringify(kits) === JSON.stringify(known.kits)) {
          counts.unchanged += 1;
          continue;
        }
        const { id, rowVersion, name, divisionId } = known;
        if (!(await updateTeam(tx, { id, rowVersion, name, divisionId, kits }))) {
          throw new AppError(
            'conflict',
            `${name} was removed a moment ago. Nothing of the list was imported; try again.`,
          );
        }
        counts.changed += 1;
        continue;
      }
      const slug = makeUniqueSlug(team.name, 'team', slugs);
      slugs.add(slug);
      await insertTeam(tx, {
        id: ctx.newId(),
        rosterId: ctx.newId(),
        seasonId: season.seasonId,
        slug,
        name: team.name,
        divisionId: team.divisionId,
        kits: { home: team.home ?? undecidedKit, away: team.away },
        now: ctx.now,
        userId: ctx.actor.userId,
      });
      counts.added += 1;
    }
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      {
        type: 'teams imported',
        subjectId: season.seasonId,
        data: { added: counts.added, changed: counts.changed, refused: input.refused },
      },
    );
    return counts;
  });
}

/** A list names one colour of a kit and its number's; sleeves and outline stay while the body does. */
function mergeKit(known: Kit, incoming: Kit | null): Kit {
  if (incoming === null) return known;
  if (known.body.toLowerCase() !== incoming.body.toLowerCase()) return incoming;
  return { ...known, name: incoming.name, number: incoming.number };
}
