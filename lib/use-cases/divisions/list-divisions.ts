import { listDivisionViews } from '@/db/queries/division-view';
import { countByDivision } from '@/db/queries/divisions';
import { listRuleSets, listRuleSetVersions } from '@/db/queries/rule-sets';
import { findSeasonBySlug } from '@/db/queries/season-view';
import { withLeague } from '@/db/tenant';
import { can } from '@/lib/domain/access/permissions';
import { notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';
import { findVisibleDivisions } from '../visible-divisions';

/** The divisions of a season that the person may see, in their order, with their teams and players counted. */
export async function listDivisions(ctx: ActorContext, input: { season: string }) {
  assertCan(ctx.actor, 'division.read');
  return withLeague(ctx.league.id, async (tx) => {
    const season = await findSeasonBySlug(tx, input.season);
    if (!season) throw notFound('season');
    const counts = await countByDivision(tx, season.id);
    const visible = await findVisibleDivisions(tx, ctx, 'division.read');
    const divisions = (await listDivisionViews(tx, season.id)).filter(
      (division) => visible?.has(division.id) ?? true,
    );
    return {
      season,
      mayChange: can(ctx.actor, 'division.write'),
      divisions: divisions.map((division) => ({
        ...division,
        ...(counts.get(division.id) ?? { teams: 0, players: 0 }),
      })),
    };
  });
}

/**
 * What the form of a division needs: the division (undefined for a new one) and the rule sets to pick from, each with
 * the version in force if there is one.
 */
export async function getDivisionForm(ctx: ActorContext, input: { season: string; division: string | null }) {
  assertCan(ctx.actor, 'division.write');
  return withLeague(ctx.league.id, async (tx) => {
    const season = await findSeasonBySlug(tx, input.season);
    if (!season) throw notFound('season');
    const known = await listRuleSets(tx);
    const inForce = (
      await listRuleSetVersions(
        tx,
        known.map((entry) => entry.id),
      )
    ).filter((version) => version.state === 'in force');
    const ruleSets = known.map(({ id, name }) => ({
      id,
      name,
      rules: inForce.find((version) => version.ruleSetId === id)?.ruleSet ?? null,
    }));
    if (input.division === null) return { season, ruleSets, division: undefined, teams: 0 };
    const division = (await listDivisionViews(tx, season.id)).find((entry) => entry.slug === input.division);
    if (!division) throw notFound('division');
    return {
      season,
      ruleSets,
      division,
      teams: (await countByDivision(tx, season.id)).get(division.id)?.teams ?? 0,
    };
  });
}
