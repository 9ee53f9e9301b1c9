import { listDivisionViews, type DivisionView } from '@/db/queries/division-view';
import { lockSeason } from '@/db/queries/divisions';
import { findSeasonBySlug } from '@/db/queries/season-view';
import { listTeamViews, type TeamView } from '@/db/queries/team-view';
import type { LeagueTx } from '@/db/tenant';
import { AppError, notFound } from '@/lib/platform/errors';

/** A season with its divisions and teams, locked so that teams are added one transaction after the other. */
export async function lockSeasonWithTeams(
  tx: LeagueTx,
  slug: string,
): Promise<{ seasonId: string; divisions: DivisionView[]; teams: TeamView[] }> {
  const season = await findSeasonBySlug(tx, slug);
  if (!season || !(await lockSeason(tx, season.id))) throw notFound('season');
  return {
    seasonId: season.id,
    divisions: await listDivisionViews(tx, season.id),
    teams: await listTeamViews(tx, season.id, null),
  };
}

/** Ends the use case when the division is not one of the season, or another team of it (but `ownId`) has the name. */
export function assertTeamFits(
  team: { name: string; divisionId: string },
  season: { divisions: readonly DivisionView[]; teams: readonly TeamView[] },
  ownId: string | null,
): void {
  const division = season.divisions.find((entry) => entry.id === team.divisionId);
  if (!division) throw notFound('division');
  const twin = season.teams.some(
    (other) =>
      other.id !== ownId &&
      other.divisionId === team.divisionId &&
      other.name.toLowerCase() === team.name.toLowerCase(),
  );
  if (twin) {
    const message = `${division.name} has a team called ${team.name} already. Choose another name.`;
    throw new AppError('conflict', message, { fields: { 'fields.name': message } });
  }
}
