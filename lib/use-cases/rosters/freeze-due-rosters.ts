import { insertAuditEvent } from '@/db/queries/audit';
import { freezeRosters, lockRostersOfTeams } from '@/db/queries/batches';
import { listDivisionViews } from '@/db/queries/division-view';
import { listTeamViews } from '@/db/queries/team-view';
import { withLeague } from '@/db/tenant';
import type { RequestContext } from '../context';

/**
 * Freezes the signed-off rosters of every division of a season whose freeze has come. Rosters that are not signed off
 * stay as they are: late, but not lost. Running it again, or early, changes nothing.
 */
export async function freezeDueRosters(
  ctx: RequestContext,
  input: { leagueId: string; seasonId: string },
): Promise<number> {
  return withLeague(input.leagueId, async (tx) => {
    const due = (await listDivisionViews(tx, input.seasonId)).filter(
      (division) => division.freezesAt <= ctx.now,
    );
    const divisionIds = new Set(due.map((division) => division.id));
    const inDivisions = (await listTeamViews(tx, input.seasonId, null)).filter((team) =>
      divisionIds.has(team.divisionId),
    );
    if (inDivisions.length === 0) return 0;
    const teamIds = inDivisions.map((team) => team.id);
    await lockRostersOfTeams(tx, teamIds);
    // Read again under the lock: a roster returned at this moment must not be frozen.
    const teams = (await listTeamViews(tx, input.seasonId, teamIds)).filter(
      (team) => team.roster.state === 'signed off',
    );
    if (teams.length === 0) return 0;
    await freezeRosters(
      tx,
      teams.map((team) => team.roster.id),
      ctx.now,
    );
    for (const team of teams) {
      await insertAuditEvent(
        tx,
        { ...ctx, userId: null },
        { type: 'roster frozen', subjectId: team.roster.id, data: { team: team.name, because: 'date' } },
      );
    }
    return teams.length;
  });
}
