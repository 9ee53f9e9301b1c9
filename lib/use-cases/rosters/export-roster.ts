import { listPlayers } from '@/db/queries/players';
import { findRoster } from '@/db/queries/rosters';
import { withLeague } from '@/db/tenant';
import { writeCsv } from '@/lib/documents/csv/write-csv';
import { readCell } from '@/lib/domain/roster/cells';
import { notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';
import { getDivisionOf } from '../roster-guards';

/**
 * A roster as CSV: the columns of the page, then everything else that came with a file. Text that a spreadsheet might
 * run is neutralised; bringing the file in again gives the same roster.
 */
export async function exportRoster(
  ctx: ActorContext,
  input: { rosterId: string },
): Promise<{ name: string; csv: string }> {
  assertCan(ctx.actor, 'roster.read');
  return withLeague(ctx.league.id, async (tx) => {
    const roster = await findRoster(tx, input.rosterId);
    if (!roster) throw notFound('roster');
    assertCan(ctx.actor, 'roster.read', { teamId: roster.team.id, what: 'roster' });
    const { garments } = await getDivisionOf(tx, roster);
    const players = await listPlayers(tx, roster.id);
    const offered = new Set(garments.map(({ code }) => code));
    const further = [...new Set(players.flatMap(({ sizes }) => Object.keys(sizes)))].filter(
      (code) => !offered.has(code),
    );
    const extra = [...new Set(players.flatMap((player) => Object.keys(player.extra)))];
    const headings = [
      'Name',
      'Name on back',
      'Number',
      'Role',
      ...garments.map(({ name }) => `${name} size`),
      ...further.map((code) => `${code} size`),
      ...extra,
    ];
    const rows = players.map((player) => [
      player.name,
      player.nameOnBack,
      player.number,
      player.role,
      ...[...garments.map(({ code }) => code), ...further].map((code) => readCell(player, `size:${code}`)),
      ...extra.map((heading) => (Object.hasOwn(player.extra, heading) ? (player.extra[heading] ?? '') : '')),
    ]);
    const name = `${roster.team.slug}-${roster.season.slug}.csv`;
    return { name, csv: writeCsv(headings, rows, { byteOrderMark: true }) };
  });
}
