import { randomUUID } from 'node:crypto';
import { afterAll, describe, expect, it } from 'vitest';
import { closeDatabase } from '@/db/client';
import { insertAuditEvent } from '@/db/queries/audit';
import { withLeague } from '@/db/tenant';
import type { AuditEvent } from '@/lib/domain/audit/event';
import { AppError } from '@/lib/platform/errors';
import { exportHistory } from '@/lib/use-cases/history/export-history';
import { historyQuerySchema } from '@/lib/use-cases/history/history-schemas';
import { listEvents } from '@/lib/use-cases/history/list-events';
import { makePerson, makeRequest } from '../../factories/people';
import { makeStaffedLeague, type StaffedLeague } from '../../factories/staffed-league';

afterAll(closeDatabase);

const note = (
  league: StaffedLeague,
  event: AuditEvent,
  minutes = 0,
  userId: string | null = league.admin.id,
) => withLeague(league.id, (tx) => insertAuditEvent(tx, { ...makeRequest(minutes), userId }, event));
const signedOff = (team: string, players = 12): AuditEvent => ({
  type: 'roster signed off',
  subjectId: randomUUID(),
  data: { team, players },
});
const ask = async (league: StaffedLeague, query: object = {}) =>
  listEvents(await league.actAs(league.admin), historyQuerySchema.parse(query));

async function readAll(pieces: AsyncGenerator<string>): Promise<string> {
  let text = '';
  for await (const piece of pieces) text += piece;
  return text;
}

describe('the history of a league', () => {
  it('tells who did what, the newest first', async () => {
    const league = await makeStaffedLeague();
    await note(league, signedOff('Otters', 1), 0);
    await note(
      league,
      { type: 'roster frozen', subjectId: randomUUID(), data: { team: 'Otters', because: 'date' } },
      5,
      null,
    );
    const { lines, next } = await ask(league);
    expect(lines.map((line) => `${line.who} ${line.what}`)).toEqual([
      'The program froze the roster of Otters on its date',
      `${league.admin.name} signed off the roster of Otters with 1 player`,
    ]);
    expect(next).toBeNull();
  });

  it('comes page by page without losing or repeating an event, also when many share one instant', async () => {
    const league = await makeStaffedLeague();
    for (let n = 0; n < 127; n += 1) await note(league, signedOff(`Team ${n}`), Math.floor(n / 60));
    const seen: string[] = [];
    let before: string | null = null;
    let pages = 0;
    do {
      const page: Awaited<ReturnType<typeof ask>> = await ask(league, { before });
      seen.push(...page.lines.map((line) => line.id));
      before = page.next;
      pages += 1;
    } while (before !== null);
    expect(pages).toBe(3);
    expect(seen).toHaveLength(127);
    expect(new Set(seen).size).toBe(127);
  });

  it('is narrowed by kind, and by every word wherever it stands', async () => {
    const league = await makeStaffedLeague();
    await note(league, signedOff('Otters'));
    await note(league, signedOff('50%_Herons'));
    await note(league, { type: 'team added', subjectId: randomUUID(), data: { name: 'Otters' } });
    const find = async (query: object) => (await ask(league, query)).lines.map((line) => line.what).sort();
    expect(await find({ kind: 'teams' })).toEqual(['added the team Otters']);
    expect(await find({ search: 'otters SIGNED' })).toEqual([
      'signed off the roster of Otters with 12 players',
    ]);
    expect(await find({ search: league.admin.name })).toHaveLength(3);
    expect(await find({ search: '50%_' })).toHaveLength(1);
    expect(await find({ search: '%' })).toHaveLength(1);
    expect(await find({ search: 'nothing like it' })).toEqual([]);
  });

  it('shows everything when the address asks for what does not exist', async () => {
    const league = await makeStaffedLeague();
    await note(league, signedOff('Otters'));
    expect((await ask(league, { kind: 'gossip', before: 'x', search: ['a', 'b'] })).lines).toHaveLength(1);
  });

  it('shows nothing of another league', async () => {
    const league = await makeStaffedLeague();
    const other = await makeStaffedLeague();
    await note(other, signedOff('Otters'));
    expect((await ask(league)).lines).toEqual([]);
  });

  it('begins at the newest when its address names a moment or an event that cannot be', () => {
    const id = '0192f7a0-0000-7000-8000-000000000000';
    const read = (before: string) => historyQuerySchema.parse({ before }).before;
    expect(read(`2027-09-01T10:00:00.000Z_${id}`)).not.toBeNull();
    for (const before of [
      `2027-99-99T10:00:00.000Z_${id}`,
      `2027-09-01T10:00:00.000Z_${'-'.repeat(36)}`,
      'x',
      `${id}_${id}`,
    ])
      expect(read(before), before).toBeNull();
  });

  it('is for league admins', async () => {
    const league = await makeStaffedLeague();
    const referee = await makePerson();
    await league.give(referee, 'referee');
    const ctx = await league.actAs(referee);
    const query = historyQuerySchema.parse({});
    await expect(listEvents(ctx, query)).rejects.toMatchObject({ code: 'forbidden' });
    expect(() => exportHistory(ctx, query)).toThrow(AppError);
  });

  it('cannot be changed or removed by the runtime role', async () => {
    const league = await makeStaffedLeague();
    await note(league, signedOff('Otters'));
    const change = withLeague(league.id, (tx) =>
      tx.updateTable('audit_events').set({ type: 'team added' }).where('league_id', '=', league.id).execute(),
    );
    await expect(change).rejects.toThrow('permission denied');
    const removal = withLeague(league.id, (tx) =>
      tx.deleteFrom('audit_events').where('league_id', '=', league.id).execute(),
    );
    await expect(removal).rejects.toThrow('permission denied');
  });

  it('goes out whole as CSV, over more events than one reading takes', async () => {
    const league = await makeStaffedLeague();
    const count = 2005;
    await withLeague(league.id, async (tx) => {
      for (let n = 0; n < count; n += 1) {
        await insertAuditEvent(
          tx,
          { ...makeRequest(n % 3), userId: league.admin.id },
          signedOff(`Team ${n}`),
        );
      }
    });
    const text = await readAll(exportHistory(await league.actAs(league.admin), historyQuerySchema.parse({})));
    const rows = text.trimEnd().split('\r\n');
    expect(rows).toHaveLength(count + 1);
    expect(new Set(rows).size).toBe(count + 1);
    expect(rows[0]).toContain('who,what');
    expect(rows[1]).toContain('2027-03-02 10:02,2027-03-02T10:02:00.000Z');
  });

  it('goes out as CSV in which no name runs as a formula', async () => {
    const league = await makeStaffedLeague();
    const person = await makePerson({ name: '=1+1' });
    await league.give(person, 'referee');
    await note(league, signedOff('Otters'), 0, person.id);
    const text = await readAll(exportHistory(await league.actAs(league.admin), historyQuerySchema.parse({})));
    expect(text).toContain(`,"'=1+1",`);
  });
});
