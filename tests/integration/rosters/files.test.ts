import { readFile } from 'node:fs/promises';
import { describe, expect, it } from 'vitest';
import { guessMapping } from '@/lib/domain/roster/import/column-mapping';
import { parseTable } from '@/lib/domain/roster/import/parse-table';
import { readRoster } from '@/lib/domain/roster/import/read-roster';
import { exportRoster } from '@/lib/use-cases/rosters/export-roster';
import { importRoster } from '@/lib/use-cases/rosters/import-roster';
import { listMappings } from '@/lib/use-cases/rosters/list-mappings';
import { readRosterFile } from '@/lib/use-cases/rosters/read-roster-file';
import { someGarments } from '../../factories/league';
import { buildRoster } from '../../factories/rosters';

describe('a roster as CSV', () => {
  it('brought in again gives the same roster, formula-looking names and all', async () => {
    const players = [
      { name: '=HYPERLINK("x")', number: '4', nameOnBack: '@home', sizes: { jersey: 'YM' } },
      { name: 'Wójcik, "Zoë"; Ana', number: '07', role: 'goalkeeper', sizes: { jersey: 'XXS' } },
      { name: "'Alembert", number: '', sizes: {} },
    ];
    const built = await buildRoster({ players });
    const { name, csv } = await exportRoster(built.ana, { rosterId: built.team.rosterId });
    expect(name).toBe(`herons-${built.season.slug}.csv`);
    expect(csv).toContain(`"'=HYPERLINK(""x"")"`);

    const parsed = parseTable(csv.replace(/^\uFEFF/, ''));
    if (!parsed.ok) throw new Error(parsed.message);
    const { rows } = parsed.table;
    const reading = readRoster(rows, guessMapping(rows, someGarments), someGarments);
    const empty = await buildRoster({ players: [] });
    const { revision } = await empty.read();
    await importRoster(empty.ana, {
      rosterId: empty.team.rosterId,
      revision,
      mode: 'add',
      lines: reading.lines,
      decisions: [],
      refused: 0,
      remember: null,
    });
    const bare = (list: { id: string; changedAt: Date; changedBy: string | null }[]) =>
      list.map(({ id: _id, changedAt: _at, changedBy: _by, ...rest }) => rest);
    expect(bare((await empty.read()).players)).toEqual(bare((await built.read()).players));
  });

  it('is for those who may see the team', async () => {
    const built = await buildRoster();
    const input = { rosterId: built.team.rosterId };
    await expect(exportRoster(built.stranger, input)).rejects.toMatchObject({ code: 'not-found' });
    await expect(listMappings(built.stranger, input)).rejects.toMatchObject({ code: 'not-found' });
  });
});

describe('a file for a roster', () => {
  it('is taken apart into sheets and rows, and nothing is stored', async () => {
    const built = await buildRoster();
    const before = await built.read();
    const bytes = await readFile('public/samples/clean-roster.xlsx');
    const input = { rosterId: built.team.rosterId, name: 'clean-roster.xlsx', bytes };
    const result = await readRosterFile(built.ana, input);
    expect(result).toMatchObject({ ok: true, kind: 'workbook' });
    expect(await built.read()).toEqual(before);
    await expect(readRosterFile(built.stranger, input)).rejects.toMatchObject({ code: 'not-found' });
  });

  it('that is no list is refused with a sentence', async () => {
    const built = await buildRoster();
    const bytes = Buffer.from('%PDF-1.7 not a list');
    const result = await readRosterFile(built.ana, {
      rosterId: built.team.rosterId,
      name: 'list.csv',
      bytes,
    });
    expect(result).toMatchObject({ ok: false, message: expect.stringMatching(/\.$/) });
  });
});
