import { listDivisionViews } from '@/db/queries/division-view';
import { findSeasonBySlug } from '@/db/queries/season-view';
import { listTeamViews } from '@/db/queries/team-view';
import { countPlayersByTeam } from '@/db/queries/teams';
import { withLeague } from '@/db/tenant';
import { can, canForWholeLeague } from '@/lib/domain/access/permissions';
import { notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';
import { findVisibleDivisions } from '../visible-divisions';

/** The teams of a season that the person may see, with their colours, players and managers counted. */
export async function listTeams(ctx: ActorContext, input: { season: string }) {
  assertCan(ctx.actor, 'team.read');
  const whole = canForWholeLeague(ctx.actor, 'team.read');
  return withLeague(ctx.league.id, async (tx) => {
    const season = await findSeasonBySlug(tx, input.season);
    if (!season) throw notFound('season');
    const visible = await findVisibleDivisions(tx, ctx, 'team.read');
    const divisions = (await listDivisionViews(tx, season.id)).filter(
      (division) => visible?.has(division.id) ?? true,
    );
    const players = await countPlayersByTeam(tx, season.id);
    const teams = await listTeamViews(tx, season.id, whole ? null : ctx.actor.teamIds);
    return {
      season: { slug: season.slug, name: season.name },
      mayChange: can(ctx.actor, 'team.write'),
      mayOpenRosters: can(ctx.actor, 'roster.read'),
      divisions: divisions.map(({ id, name }) => ({ id, name })),
      teams: teams.map((team) => ({
        id: team.id,
        slug: team.slug,
        name: team.name,
        divisionId: team.divisionId,
        division: divisions.find((division) => division.id === team.divisionId)?.name ?? '',
        kits: team.kits,
        rowVersion: team.rowVersion,
        state: team.roster.state,
        batch: team.batch?.code ?? null,
        players: players.get(team.id) ?? 0,
        managers: team.managers,
      })),
    };
  });
}
export type TeamList = Awaited<ReturnType<typeof listTeams>>;
export type ListedTeam = TeamList['teams'][number];
