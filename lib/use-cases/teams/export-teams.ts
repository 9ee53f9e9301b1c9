import { listDivisionViews } from '@/db/queries/division-view';
import { findSeasonBySlug } from '@/db/queries/season-view';
import { listTeamViews } from '@/db/queries/team-view';
import { withLeague } from '@/db/tenant';
import { writeCsv } from '@/lib/documents/csv/write-csv';
import { canForWholeLeague } from '@/lib/domain/access/permissions';
import type { Kit } from '@/lib/domain/kit/kit';
import { notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';

const writeColour = (kit: Kit | null): string => (kit ? `${kit.name} (${kit.body})` : '');

/** The teams of a season as CSV with headings that an import understands; bringing it in again changes no team. */
export async function exportTeams(
  ctx: ActorContext,
  input: { season: string },
): Promise<{ name: string; csv: string }> {
  assertCan(ctx.actor, 'team.read');
  const whole = canForWholeLeague(ctx.actor, 'team.read');
  return withLeague(ctx.league.id, async (tx) => {
    const season = await findSeasonBySlug(tx, input.season);
    if (!season) throw notFound('season');
    const divisions = new Map(
      (await listDivisionViews(tx, season.id)).map((division) => [division.id, division.name]),
    );
    const teams = await listTeamViews(tx, season.id, whole ? null : ctx.actor.teamIds);
    const csv = writeCsv(
      ['Team', 'Division', 'Home colour', 'Home number', 'Away colour', 'Away number', 'Roster'],
      teams.map(({ name, divisionId, kits, roster }) => [
        name,
        divisions.get(divisionId) ?? '',
        writeColour(kits.home),
        kits.home.number,
        writeColour(kits.away),
        kits.away?.number ?? '',
        roster.state,
      ]),
      { byteOrderMark: true },
    );
    return { name: `${ctx.league.slug}-${season.slug}-teams.csv`, csv };
  });
}
