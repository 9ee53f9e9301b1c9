import { randomUUID } from 'node:crypto';
import pg from 'pg';
import { afterEach, describe, expect, it } from 'vitest';
import { saveRosterEdits } from '@/lib/use-cases/rosters/save-roster-edits';
import { signOffRoster } from '@/lib/use-cases/rosters/sign-off-roster';
import { moveRoster } from '../../factories/league';
import { buildRoster, makeSet, type BuiltRoster } from '../../factories/rosters';
import { getTestUrls, queryAsAdmin } from '../../support/database';

const open: pg.Client[] = [];
afterEach(async () => {
  await Promise.all(open.splice(0).map((client) => client.end()));
});

/** A connection of its own as the runtime role, inside a transaction of the league. */
async function beginIn(built: BuiltRoster): Promise<pg.Client> {
  const client = new pg.Client({ connectionString: getTestUrls().appUrl });
  await client.connect();
  open.push(client);
  await client.query('begin');
  await client.query(`select set_config('app.league_id', $1, true)`, [built.league.id]);
  return client;
}

/** Resolves once some connection of this database waits for a lock. */
async function waitForWaiter(): Promise<void> {
  for (;;) {
    const waiting = await queryAsAdmin(
      `select 1 from pg_stat_activity where datname = current_database() and wait_event_type = 'Lock'`,
    );
    if (waiting.length > 0) return;
  }
}

const numbersOf = (built: BuiltRoster) =>
  queryAsAdmin<{ number: string; sealed: boolean }>(
    'select number, sealed from players where roster_id = $1 order by position',
    [built.team.rosterId],
  );

describe('a number once signed off', () => {
  it('cannot be held twice, whatever is written past the program', async () => {
    const built = await buildRoster({ players: [{ number: '7' }, { number: '7' }] });
    await expect(moveRoster(built.league, built.team.rosterId, 'signed off')).rejects.toMatchObject({
      constraint: 'one_number_once_signed_off',
    });
    await expect(moveRoster(built.league, built.team.rosterId, 'frozen')).rejects.toMatchObject({
      constraint: 'one_number_once_signed_off',
    });
  });

  it('cannot be given to a second player by a connection that saw the roster open', async () => {
    const built = await buildRoster();
    await moveRoster(built.league, built.team.rosterId, 'submitted');
    const late = await beginIn(built);
    const signer = await beginIn(built);
    // Both have looked; the sign-off comes first, and the late one waits for it.
    await late.query('select state from rosters where id = $1', [built.team.rosterId]);
    await signer.query(`update rosters set state = 'signed off', signed_off_at = now() where id = $1`, [
      built.team.rosterId,
    ]);
    const change = late
      .query(`update players set number = '4', number_key = '4' where roster_id = $1`, [built.team.rosterId])
      .catch((error: unknown) => error);
    await waitForWaiter();
    await signer.query('commit');
    expect(await change).toMatchObject({ constraint: 'roster_is_sealed' });
    await late.query('rollback');
    expect(await numbersOf(built)).toEqual([
      { number: '4', sealed: true },
      { number: '14', sealed: true },
    ]);
  });

  it('cannot be joined by a player inserted at the same moment', async () => {
    const built = await buildRoster();
    await moveRoster(built.league, built.team.rosterId, 'submitted');
    const late = await beginIn(built);
    await late.query(
      `insert into players (league_id, id, roster_id, position, name, name_on_back, number, role, sizes, number_key, updated_at)
       values ($1, $2, $3, 9, 'Late', '', '4', '', '{}', '4', now())`,
      [built.league.id, randomUUID(), built.team.rosterId],
    );
    const signing = moveRoster(built.league, built.team.rosterId, 'signed off').catch(
      (error: unknown) => error,
    );
    await waitForWaiter();
    await late.query('commit');
    // The sign-off sees the player who got in before it, and the repeated number stops it.
    expect(await signing).toMatchObject({ constraint: 'one_number_once_signed_off' });
    const [roster] = await queryAsAdmin('select state from rosters where id = $1', [built.team.rosterId]);
    expect(roster).toEqual({ state: 'submitted' });
  });
});

describe('an edit and a sign-off at the same moment', () => {
  it('end with the edit refused when the sign-off came first', async () => {
    const built = await buildRoster();
    const seen = await built.read();
    const signer = await beginIn(built);
    await signer.query(`update rosters set state = 'submitted' where id = $1`, [built.team.rosterId]);
    await signer.query(`update rosters set state = 'signed off', signed_off_at = now() where id = $1`, [
      built.team.rosterId,
    ]);
    const edit = saveRosterEdits(built.ana, {
      rosterId: built.team.rosterId,
      baseRevision: seen.revision,
      edits: [makeSet(seen.players[0], 'number', '14')],
    }).catch((error: unknown) => error);
    await waitForWaiter();
    await signer.query('commit');
    expect(await edit).toMatchObject({ code: 'locked' });
    expect((await numbersOf(built)).map(({ number }) => number)).toEqual(['4', '14']);
  });

  it('end with the sign-off refused when a repeated number got in first', async () => {
    const built = await buildRoster();
    await moveRoster(built.league, built.team.rosterId, 'submitted');
    const { revision } = await built.read();
    const editor = await beginIn(built);
    await editor.query(`update players set number = '14' where roster_id = $1 and number = '4'`, [
      built.team.rosterId,
    ]);
    const signing = signOffRoster(built.admin, { rosterId: built.team.rosterId, revision }).catch(
      (error: unknown) => error,
    );
    await waitForWaiter();
    await editor.query('commit');
    expect(await signing).toMatchObject({ code: 'conflict', message: expect.stringContaining('2 blockers') });
    expect((await built.read()).state).toBe('submitted');
  });

  it('of many people at once never leave a signed-off roster with a number twice', async () => {
    const built = await buildRoster({ players: [{ number: '1' }, { number: '2' }, { number: '3' }] });
    const seen = await built.read();
    await moveRoster(built.league, built.team.rosterId, 'submitted');
    const { revision } = await built.read();
    await queryAsAdmin(`update rosters set state = 'open' where id = $1`, [built.team.rosterId]);
    const edits = seen.players.map((player) =>
      saveRosterEdits(built.ana, {
        rosterId: built.team.rosterId,
        baseRevision: revision,
        edits: [makeSet(player, 'number', '9')],
      }),
    );
    const submitAndSign = (async () => {
      await moveRoster(built.league, built.team.rosterId, 'submitted');
      const now = await built.read();
      return signOffRoster(built.admin, { rosterId: built.team.rosterId, revision: now.revision });
    })();
    await Promise.allSettled([...edits, submitAndSign]);
    const rows = await numbersOf(built);
    const sealed = rows.filter((row) => row.sealed).map(({ number }) => number);
    expect(new Set(sealed).size).toBe(sealed.length);
  });
});
