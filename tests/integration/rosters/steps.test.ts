import { describe, expect, it } from 'vitest';
import { withLeague } from '@/db/tenant';
import { freezeRoster } from '@/lib/use-cases/rosters/freeze-roster';
import { reopenRoster } from '@/lib/use-cases/rosters/reopen-roster';
import { returnRoster } from '@/lib/use-cases/rosters/return-roster';
import { saveRosterEdits } from '@/lib/use-cases/rosters/save-roster-edits';
import { signOffRoster } from '@/lib/use-cases/rosters/sign-off-roster';
import { submitRoster } from '@/lib/use-cases/rosters/submit-roster';
import { withdrawRoster } from '@/lib/use-cases/rosters/withdraw-roster';
import type { ActorContext } from '@/lib/use-cases/context';
import { buildShop } from '../../factories/league';
import { listLetters } from '../../factories/people';
import { buildRoster, listRosterEvents, makeSet, type BuiltRoster } from '../../factories/rosters';
import { queryAsAdmin } from '../../support/database';

const reason = 'Ask the family of Pip how the name is spelt.';

/** Takes a step on the roster as it stands. */
async function step<T>(
  built: BuiltRoster,
  ctx: ActorContext,
  run: (ctx: ActorContext, input: { rosterId: string; revision: number; reason: string }) => Promise<T>,
): Promise<T> {
  const { revision } = await built.read(built.admin);
  return run(ctx, { rosterId: built.team.rosterId, revision, reason });
}
const stateOf = async (built: BuiltRoster) => (await built.read(built.admin)).state;

describe('the steps of a roster', () => {
  it('lead from open over submitted and signed off to frozen, each in the history with who took it', async () => {
    const built = await buildRoster();
    await step(built, built.ana, submitRoster);
    await step(built, built.admin, signOffRoster);
    await step(built, built.admin, freezeRoster);
    const end = await built.read();
    expect(end).toMatchObject({
      state: 'frozen',
      submitted: { by: built.ana.actor.name },
      signedOff: { by: built.admin.actor.name },
      frozenAt: built.admin.now,
      ruleSetVersionId: built.ruleSet.versionId,
    });
    const events = await listRosterEvents(built.team.rosterId);
    expect(events.map(({ type, user_id }) => [type, user_id]).sort()).toEqual(
      [
        ['roster submitted', built.ana.actor.userId],
        ['roster signed off', built.admin.actor.userId],
        ['roster frozen', built.admin.actor.userId],
      ].sort(),
    );
  });

  it('back: a manager withdraws, an admin returns with a reason that the page shows until it is submitted again', async () => {
    const built = await buildRoster();
    await step(built, built.ana, submitRoster);
    await step(built, built.ben, withdrawRoster);
    expect(await stateOf(built)).toBe('open');
    await step(built, built.ana, submitRoster);
    await step(built, built.admin, returnRoster);
    expect(await built.read()).toMatchObject({ state: 'returned', returnReason: reason, submitted: null });
    await step(built, built.ana, submitRoster);
    expect(await built.read()).toMatchObject({ state: 'submitted', returnReason: null });
  });

  it('reopen a sign-off and unseal its players', async () => {
    const built = await buildRoster();
    await step(built, built.ana, submitRoster);
    await step(built, built.admin, signOffRoster);
    await step(built, built.admin, reopenRoster);
    const { revision, players, state, signedOff, ruleSetVersionId } = await built.read();
    expect([state, signedOff, ruleSetVersionId]).toEqual(['open', null, null]);
    await saveRosterEdits(built.ana, {
      rosterId: built.team.rosterId,
      baseRevision: revision,
      edits: [makeSet(players[0], 'number', '5')],
    });
    expect((await built.read()).players[0]?.number).toBe('5');
  });

  it('are refused while there are blockers, with their number', async () => {
    const built = await buildRoster({ players: [{ number: '7' }, { number: '7' }, { number: '8' }] });
    await expect(step(built, built.ana, submitRoster)).rejects.toMatchObject({
      code: 'conflict',
      message: 'Put 2 blockers right first; each is marked beside its cell.',
    });
    expect(await stateOf(built)).toBe('open');
  });

  it('are refused for a roster without players, and in a state that does not lead there', async () => {
    const empty = await buildRoster({ players: [] });
    await expect(step(empty, empty.ana, submitRoster)).rejects.toMatchObject({ code: 'conflict' });
    const open = await buildRoster();
    for (const run of [signOffRoster, freezeRoster, withdrawRoster, returnRoster, reopenRoster]) {
      await expect(step(open, open.admin, run)).rejects.toMatchObject({ code: 'conflict' });
    }
    expect(await stateOf(open)).toBe('open');
  });

  it('are refused with a sentence while no rules are in force for the division', async () => {
    const built = await buildRoster();
    await queryAsAdmin(`update rule_set_versions set state = 'superseded' where id = $1`, [
      built.ruleSet.versionId,
    ]);
    await expect(step(built, built.ana, submitRoster)).rejects.toMatchObject({
      message: expect.stringContaining('No number rules are in force'),
    });
  });

  it('are refused on a page that is older than the last change, naming who changed it', async () => {
    const built = await buildRoster();
    const seen = await built.read();
    await saveRosterEdits(built.ben, {
      rosterId: built.team.rosterId,
      baseRevision: seen.revision,
      edits: [makeSet(seen.players[0], 'number', '5')],
    });
    await expect(
      submitRoster(built.ana, { rosterId: built.team.rosterId, revision: seen.revision }),
    ).rejects.toMatchObject({
      code: 'conflict',
      message: expect.stringContaining(`${built.ben.actor.name} has changed`),
    });
  });

  it('taken twice at once are taken once', async () => {
    const built = await buildRoster();
    const { revision } = await built.read();
    const input = { rosterId: built.team.rosterId, revision };
    const answers = await Promise.allSettled([
      submitRoster(built.ana, input),
      submitRoster(built.ana, input),
    ]);
    expect(answers.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
    expect(await listRosterEvents(built.team.rosterId)).toHaveLength(1);
  });

  it('of the league are for its admins only, and those of a team for its own managers', async () => {
    const built = await buildRoster();
    for (const run of [submitRoster, withdrawRoster]) {
      await expect(step(built, built.stranger, run)).rejects.toMatchObject({ code: 'not-found' });
    }
    for (const run of [signOffRoster, freezeRoster, returnRoster, reopenRoster]) {
      await expect(step(built, built.ana, run)).rejects.toMatchObject({ code: 'forbidden' });
    }
  });

  it('write to every manager of the team when it is returned or signed off, and to nobody else', async () => {
    const built = await buildRoster();
    await step(built, built.ana, submitRoster);
    await step(built, built.admin, returnRoster);
    await step(built, built.ana, submitRoster);
    await step(built, built.admin, signOffRoster);
    for (const email of Object.values(built.emails)) {
      const letters = await listLetters(email);
      expect(letters.map(({ template }) => template).sort()).toEqual([
        'roster-returned',
        'roster-signed-off',
      ]);
      const returned = letters.find(({ template }) => template === 'roster-returned');
      expect(returned?.params).toEqual({
        league: built.league.name,
        team: 'Herons',
        reason,
        link: `http://localhost:3000/${built.league.slug}/${built.where.season}/rosters/herons`,
      });
    }
    const toOthers = await queryAsAdmin(
      'select 1 from emails where to_address <> all ($1) and params->>$2 like $3',
      [Object.values(built.emails), 'link', `%/${built.league.slug}/%`],
    );
    expect(toOthers).toEqual([]);
  });

  it('do not take a roster out of a batch behind its back', async () => {
    const built = await buildRoster();
    await step(built, built.ana, submitRoster);
    await step(built, built.admin, signOffRoster);
    const shop = await buildShop(built.league);
    const batchId = built.admin.newId();
    await withLeague(built.league.id, async (tx) => {
      await tx
        .insertInto('batches')
        .values({
          league_id: built.league.id,
          id: batchId,
          number: 7,
          code: 'B-07',
          season_id: built.season.id,
          shop_id: shop.id,
          state: 'held',
          promised_on: null,
          snapshot: null,
          snapshot_sha256: null,
          created_at: built.admin.now,
          created_by: null,
        })
        .execute();
      await tx
        .insertInto('batch_teams')
        .values({ league_id: built.league.id, batch_id: batchId, roster_id: built.team.rosterId })
        .execute();
    });
    for (const run of [returnRoster, reopenRoster]) {
      await expect(step(built, built.admin, run)).rejects.toMatchObject({
        message: expect.stringContaining('Batch B-07 holds this roster'),
      });
    }
  });
});
