import { beforeEach, describe, expect, it } from 'vitest';
import { batchStates, type BatchState } from '@/lib/domain/batch/batch-state';
import { getBatch } from '@/lib/use-cases/batches/get-batch';
import { holdBatch } from '@/lib/use-cases/batches/hold-batch';
import { markBatch } from '@/lib/use-cases/batches/mark-batch';
import { releaseBatch } from '@/lib/use-cases/batches/release-batch';
import type { ActorContext } from '@/lib/use-cases/context';
import { buildMember, buildShop, buildWorld, laterBy, type FurnishedLeague } from '../../factories/league';
import { queryAsAdmin } from '../../support/database';
import { codeOf } from '../../support/outcomes';

type Marked = Exclude<BatchState, 'held'>;
const states = batchStates.filter((state): state is Marked => state !== 'held');
const steps: [Marked, Marked, 'shop' | 'league'][] = [
  ['released', 'on press', 'shop'],
  ['on press', 'packed', 'shop'],
  ['packed', 'shipped', 'shop'],
  ['shipped', 'received', 'league'],
];

let world: FurnishedLeague;
let code: string;
let batchId: string;
beforeEach(async () => {
  [world] = await buildWorld();
  ({ code } = await holdBatch(world.admin, {
    season: world.season.slug,
    teamIds: [world.teams[1].id],
    shopId: world.shop.id,
    promisedOn: null,
  }));
  batchId = (await getBatch(world.admin, { code })).batch.id;
  await releaseBatch(world.admin, { batchId });
});

const who = (owner: 'shop' | 'league'): ActorContext => (owner === 'shop' ? world.decorator : world.admin);
const mark = (ctx: ActorContext, from: Marked, to: Marked, note = '') =>
  markBatch(ctx, { batchId, from, to, note });
const stateOf = async () => (await getBatch(world.admin, { code })).batch.state;
/** Walks to a state by the steps that lead there. */
const walkTo = async (state: Marked) => {
  for (const [from, to, owner] of steps.slice(0, states.indexOf(state))) await mark(who(owner), from, to);
};
const countMarks = async () =>
  (
    await queryAsAdmin(`select 1 from audit_events where subject_id = $1 and type = 'batch marked'`, [
      batchId,
    ])
  ).length;

describe('marking a batch', () => {
  it('walks through every state in order, each noted with the time, the person and the words', async () => {
    let minutes = 0;
    for (const [from, to, owner] of steps) {
      minutes += 60;
      await expect(mark(laterBy(who(owner), minutes), from, to, `now ${to}`)).resolves.toEqual({
        code,
        state: to,
      });
    }
    const { events } = await getBatch(world.admin, { code });
    expect(events.map(({ state, note, by }) => [state, note, by])).toEqual([
      ['released', '', world.members.admin.person.name],
      ['on press', 'now on press', world.members.decorator.person.name],
      ['packed', 'now packed', world.members.decorator.person.name],
      ['shipped', 'now shipped', world.members.decorator.person.name],
      ['received', 'now received', world.members.admin.person.name],
    ]);
    expect(await countMarks()).toBe(4);
  });

  it('goes one step on or one back, and never any other way, from whatever state', async () => {
    for (const at of states) {
      [world] = await buildWorld();
      ({ code } = await holdBatch(world.admin, {
        season: world.season.slug,
        teamIds: [world.teams[1].id],
        shopId: world.shop.id,
        promisedOn: null,
      }));
      batchId = (await getBatch(world.admin, { code })).batch.id;
      await releaseBatch(world.admin, { batchId });
      await walkTo(at);
      for (const from of states) {
        for (const to of states.filter((state) => state !== at)) {
          const isStep = from === at && Math.abs(states.indexOf(from) - states.indexOf(to)) === 1;
          if (isStep) continue;
          const outcomes = await Promise.allSettled([
            mark(world.admin, from, to),
            mark(world.decorator, from, to),
          ]);
          expect([at, from, to, outcomes.map(codeOf).includes('done')]).toEqual([at, from, to, false]);
        }
      }
      expect(await stateOf()).toBe(at);
    }
  });

  it('can be undone one step at a time by whoever took it, down to released and no further', async () => {
    await walkTo('received');
    for (const [to, from, owner] of steps.toReversed())
      await expect(mark(who(owner), from, to, 'a slip')).resolves.toEqual({ code, state: to });
    expect(await stateOf()).toBe('released');
    await expect(mark(world.admin, 'released', 'held' as never)).rejects.toMatchObject({ code: 'conflict' });
  });

  it('does nothing more on a second click, also when both clicks come at once', async () => {
    const clicks = await Promise.all([
      mark(world.decorator, 'released', 'on press'),
      mark(world.decorator, 'released', 'on press'),
      mark(world.decorator, 'released', 'on press'),
    ]);
    expect(clicks).toEqual(Array(3).fill({ code, state: 'on press' }));
    expect(await countMarks()).toBe(1);
    expect((await getBatch(world.admin, { code })).events).toHaveLength(2);
  });

  it('is refused to a page that is behind, which then says where the batch is', async () => {
    await walkTo('packed');
    await expect(mark(world.decorator, 'released', 'on press')).rejects.toMatchObject({
      code: 'conflict',
      message: `Batch ${code} is packed now, so it can't go from released to on press. Reload to see it.`,
    });
  });

  it('is the shop’s up to shipped and the league’s for received, and nobody else’s', async () => {
    const other = await buildMember(world.league, 'decorator', {
      shopId: (await buildShop(world.league)).id,
    });
    for (const [from, to, owner] of steps) {
      const refused = owner === 'shop' ? [world.admin] : [world.decorator];
      for (const ctx of [...refused, world.manager, world.referee, other.ctx]) {
        const [outcome] = await Promise.allSettled([mark(ctx, from, to)]);
        expect([to, codeOf(outcome)]).toEqual([to, expect.stringMatching(/^(not-found|forbidden)$/)]);
        const [back] = await Promise.allSettled([mark(ctx, to, from)]);
        expect([to, codeOf(back)]).toEqual([to, expect.stringMatching(/^(not-found|forbidden)$/)]);
      }
      await mark(who(owner), from, to);
    }
  });

  it('finds no batch that is still held', async () => {
    const [other] = await buildWorld();
    const held = await holdBatch(other.admin, {
      season: other.season.slug,
      teamIds: [other.teams[1].id],
      shopId: other.shop.id,
      promisedOn: null,
    });
    const { batch } = await getBatch(other.admin, held);
    const input = { batchId: batch.id, from: 'released', to: 'on press', note: '' } as const;
    await expect(markBatch(other.decorator, input)).rejects.toMatchObject({ code: 'not-found' });
    await expect(markBatch(other.admin, { ...input, from: 'shipped', to: 'received' })).rejects.toMatchObject(
      { code: 'conflict' },
    );
  });
});
