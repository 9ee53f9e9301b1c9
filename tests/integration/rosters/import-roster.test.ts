import { describe, expect, it } from 'vitest';
import { listColumnMappings } from '@/db/queries/column-mappings';
import { withLeague } from '@/db/tenant';
import type { ColumnMapping } from '@/lib/domain/roster/import/column-mapping';
import type { MergeMode } from '@/lib/domain/roster/import/merge-roster';
import { importRosterSchema } from '@/lib/use-cases/rosters/roster-schemas';
import { importRoster } from '@/lib/use-cases/rosters/import-roster';
import type { ActorContext } from '@/lib/use-cases/context';
import { moveRoster } from '../../factories/league';
import { buildRoster, listRosterEvents, type BuiltRoster } from '../../factories/rosters';

const line = (
  name: string,
  number: string,
  more: { sizes?: Record<string, string>; extra?: Record<string, string> } = {},
) => ({
  line: { name, nameOnBack: '', number, role: '', sizes: more.sizes ?? {} },
  extra: more.extra ?? {},
});
const mapping: ColumnMapping = { headerRow: 0, columns: [{ field: 'name' }, { field: 'number' }] };

async function bring(
  built: BuiltRoster,
  lines: ReturnType<typeof line>[],
  more: {
    mode?: MergeMode;
    ctx?: ActorContext;
    revision?: number;
    decisions?: unknown;
    signature?: string;
  } = {},
) {
  const revision = more.revision ?? (await built.read()).revision;
  const input = importRosterSchema.parse({
    rosterId: built.team.rosterId,
    revision,
    mode: more.mode ?? 'update matching',
    lines,
    decisions: more.decisions ?? [],
    refused: 0,
    remember: { signature: more.signature ?? 'player|number', mapping },
  });
  return importRoster(more.ctx ?? built.ana, input);
}
const rowsOf = async (built: BuiltRoster) =>
  (await built.read()).players.map(({ name, number, sizes }) => [name, number, sizes['jersey'] ?? '']);

describe('bringing a file into a roster', () => {
  it('brings matching players up to date, adds new ones in the order of the file, and loses nobody', async () => {
    const built = await buildRoster();
    const counts = await bring(
      built,
      [line('Pip Dunmore', '15'), line('Dunmore, Pip', '15', { extra: { Photo: 'yes' } })]
        .slice(1)
        .concat([line('Ellery, Jonah', '25', { sizes: { jersey: 'AS' } }), line('Farrow, Lumi', '0')]),
    );
    expect(counts).toEqual({ added: 2, changed: 1, removed: 0, unchanged: 1 });
    expect(await rowsOf(built)).toEqual([
      ['Calloway, Ines', '4', 'YM'],
      ['Dunmore, Pip', '15', 'YM'],
      ['Ellery, Jonah', '25', 'AS'],
      ['Farrow, Lumi', '0', ''],
    ]);
    expect((await built.read()).players[1]?.extra).toEqual({ Photo: 'yes' });
  });

  it('adds only, when asked to leave the others alone', async () => {
    const built = await buildRoster();
    await bring(built, [line('Dunmore, Pip', '15'), line('Farrow, Lumi', '0')], { mode: 'add' });
    expect((await rowsOf(built)).map(([, number]) => number)).toEqual(['4', '14', '0']);
  });

  it('replaces the list only when asked to', async () => {
    const built = await buildRoster();
    const counts = await bring(built, [
      line('Dunmore, Pip', '15', { extra: { Photo: 'yes' } }),
      line('Ellery, Jonah', '25', { sizes: { jersey: 'AS' } }),
      line('Farrow, Lumi', '0'),
    ]);
    expect(counts).toEqual({ added: 2, changed: 1, removed: 0, unchanged: 1 });
    expect(await rowsOf(built)).toEqual([
      ['Calloway, Ines', '4', 'YM'],
      ['Dunmore, Pip', '15', 'YM'],
      ['Ellery, Jonah', '25', 'AS'],
      ['Farrow, Lumi', '0', ''],
    ]);
    expect((await built.read()).players[1]?.extra).toEqual({ Photo: 'yes' });
  });

  it('adds only, when asked to leave the others alone', async () => {
    const built = await buildRoster();
    await bring(built, [line('Dunmore, Pip', '15'), line('Farrow, Lumi', '0')], { mode: 'add' });
    expect((await rowsOf(built)).map(([, number]) => number)).toEqual(['4', '14', '0']);
  });

  it('replaces the list only when asked to', async () => {
    const built = await buildRoster();
    const counts = await bring(built, [line('Farrow, Lumi', '0'), line('Dunmore, Pip', '')], {
      mode: 'replace',
    });
    expect(counts).toEqual({ added: 1, changed: 0, removed: 1, unchanged: 1 });
    expect(await rowsOf(built)).toEqual([
      ['Dunmore, Pip', '14', 'YM'],
      ['Farrow, Lumi', '0', ''],
    ]);
  });

  it('is refused when somebody has changed the roster since the preview, and changes nothing', async () => {
    const built = await buildRoster();
    const { revision } = await built.read();
    await bring(built, [line('Farrow, Lumi', '0')], { ctx: built.ben });
    await expect(bring(built, [line('Ellery, Jonah', '1')], { revision })).rejects.toMatchObject({
      code: 'conflict',
    });
    expect(await rowsOf(built)).toHaveLength(3);
  });

  it('clicked twice is done once', async () => {
    const built = await buildRoster();
    const { revision } = await built.read();
    const answers = await Promise.allSettled([
      bring(built, [line('Farrow, Lumi', '0')], { revision }),
      bring(built, [line('Farrow, Lumi', '0')], { revision }),
    ]);
    expect(answers.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
    expect(await rowsOf(built)).toHaveLength(3);
  });

  it('waits for a person where a line may be one of two players', async () => {
    const built = await buildRoster({
      players: [
        { name: 'Marwood, Ana', number: '1' },
        { name: 'Marwood, Ana', number: '2' },
      ],
    });
    const twin = [line('Marwood, Ana', '9')];
    await expect(bring(built, twin)).rejects.toMatchObject({
      code: 'invalid',
      message: expect.stringContaining('1 line'),
    });
    const second = (await built.read()).players[1]?.id;
    await bring(built, twin, { decisions: [{ row: 0, decision: { as: 'player', id: second } }] });
    expect((await rowsOf(built)).map(([, number]) => number)).toEqual(['1', '9']);
  });

  it('is refused for more than 200 players, a locked roster and other teams', async () => {
    const built = await buildRoster();
    const many = Array.from({ length: 199 }, (_, at) => line(`Player ${at}`, ''));
    await expect(bring(built, many)).rejects.toMatchObject({
      message: expect.stringContaining('at most 200'),
    });
    await expect(bring(built, many.slice(0, 3), { ctx: built.stranger })).rejects.toMatchObject({
      code: 'not-found',
    });
    await moveRoster(built.league, built.team.rosterId, 'submitted');
    await expect(bring(built, many.slice(0, 3))).rejects.toMatchObject({ code: 'locked' });
    expect(await rowsOf(built)).toHaveLength(2);
  });

  it('keeps the mapping of the columns for the next file of that team with these headings', async () => {
    const built = await buildRoster();
    await bring(built, [line('Farrow, Lumi', '0')]);
    for (let at = 0; at < 21; at += 1) {
      await bring(built, [line('Farrow, Lumi', String(at))], { signature: `kind ${at}` });
    }
    const kept = await withLeague(built.league.id, (tx) => listColumnMappings(tx, built.team.id));
    expect(kept).toHaveLength(20);
    expect(kept[0]?.mapping).toEqual(mapping);
    const others = await withLeague(built.league.id, (tx) => listColumnMappings(tx, built.other.id));
    expect(others).toEqual([]);
  });

  it('writes into the history how many were added, changed, removed and refused', async () => {
    const built = await buildRoster();
    await bring(built, [line('Farrow, Lumi', '0')]);
    expect((await listRosterEvents(built.team.rosterId)).at(-1)).toMatchObject({
      type: 'roster imported',
      data: { team: 'Herons', added: 1, changed: 0, removed: 0, refused: 0 },
    });
  });
});
