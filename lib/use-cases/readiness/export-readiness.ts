import { withLeague } from '@/db/tenant';
import { writeCsv } from '@/lib/documents/csv/write-csv';
import { readinessAreas } from '@/lib/domain/readiness/judge-readiness';
import { assertCan, type ActorContext } from '../context';
import { readReadiness } from '../readiness-reading';

/** The readiness of a season as CSV, a row for each team: the columns of the page, blockers and cautions apart. */
export async function exportReadiness(
  ctx: ActorContext,
  input: { season: string },
): Promise<{ name: string; csv: string }> {
  assertCan(ctx.actor, 'readiness.read');
  const { season, teams } = await withLeague(ctx.league.id, (tx) => readReadiness(tx, ctx, input.season));
  const headings = [
    'Team',
    'Division',
    'Stands',
    'Roster',
    'Players',
    ...readinessAreas.flatMap((area) => [`Blockers in ${area}`, `Cautions in ${area}`]),
    'Batch',
    'Managers',
    'What holds it',
  ];
  const rows = teams.map((team) => [
    team.name,
    team.division,
    team.group,
    team.state,
    team.players,
    ...readinessAreas.flatMap((area) => [team.areas[area].blockers, team.areas[area].cautions]),
    team.batch?.code ?? '',
    team.managers.join(', '),
    team.holds,
  ]);
  return {
    name: `${ctx.league.slug}-${season.slug}-readiness.csv`,
    csv: writeCsv(headings, rows, { byteOrderMark: true }),
  };
}
