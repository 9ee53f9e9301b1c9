import { beforeAll, describe, expect, it } from 'vitest';
import { withLeague } from '@/db/tenant';
import { listCataloguePresets } from '@/lib/domain/rules/catalogue/catalogue';
import { discardDraft } from '@/lib/use-cases/rule-sets/discard-draft';
import { getRuleSet } from '@/lib/use-cases/rule-sets/get-rule-set';
import { listRuleSets } from '@/lib/use-cases/rule-sets/list-rule-sets';
import { putInForce } from '@/lib/use-cases/rule-sets/put-in-force';
import { saveDraft } from '@/lib/use-cases/rule-sets/save-draft';
import { startRuleSet } from '@/lib/use-cases/rule-sets/start-rule-set';
import { buildDivision, buildTeam, buildWorld, laterBy, type FurnishedLeague } from '../../factories/league';
import { queryAsAdmin } from '../../support/database';

let world: FurnishedLeague;
let other: FurnishedLeague;
let count = 0;
beforeAll(async () => {
  [world, other] = await buildWorld({ leagues: 2 });
});

const start = async () => {
  const name = `Own rules ${(count += 1)}`;
  return startRuleSet(world.admin, { name, sport: 'basketball', presetId: null });
};
const versionsOf = async (ruleSetId: string) => (await getRuleSet(world.admin, { ruleSetId })).versions;
const draftOf = async (ruleSetId: string) => {
  const draft = (await versionsOf(ruleSetId)).find((version) => version.state === 'draft');
  if (!draft) throw new Error('no draft');
  return draft;
};
/** A rule set with version 1 in force. */
const startInForce = async () => {
  const { ruleSetId } = await start();
  const { rowVersion } = await draftOf(ruleSetId);
  await putInForce(world.admin, { ruleSetId, rowVersion });
  return ruleSetId;
};
/** Saves the next draft of a rule set, whose only number is this one. */
const draftOnly = async (ruleSetId: string, allowed: string) => {
  const [latest] = await versionsOf(ruleSetId);
  if (!latest) throw new Error('no version');
  const ruleSet = { ...latest.ruleSet, labels: { ...latest.ruleSet.labels, allowed } };
  return saveDraft(world.admin, {
    ruleSetId,
    rowVersion: latest.state === 'draft' ? latest.rowVersion : null,
    ruleSet,
  });
};

describe('starting a rule set', () => {
  it('brings the rules and the citations of every preset of the catalogue in as a draft', async () => {
    for (const preset of listCataloguePresets()) {
      const { ruleSetId } = await startRuleSet(world.admin, {
        name: preset.title.slice(0, 60) + count++,
        sport: preset.sport,
        presetId: preset.id,
      });
      const [version, ...more] = await versionsOf(ruleSetId);
      expect(more).toEqual([]);
      expect(version).toMatchObject({ state: 'draft', version: 1, inForceFrom: null });
      expect(version?.ruleSet.labels).toEqual(preset.ruleSet.labels);
      expect(version?.ruleSet.citations).toEqual(preset.ruleSet.citations);
    }
  });

  it('refuses a preset that the catalogue has not, and a name the league has', async () => {
    await expect(
      startRuleSet(world.admin, { name: 'Unknown', sport: 'chess', presetId: 'chess' }),
    ).rejects.toMatchObject({ code: 'not-found' });
    await startRuleSet(world.admin, { name: 'Taken', sport: 'basketball', presetId: null });
    await expect(
      startRuleSet(world.admin, { name: 'taken', sport: 'basketball', presetId: null }),
    ).rejects.toMatchObject({ code: 'conflict' });
  });
});

describe('the draft of a rule set', () => {
  it('is one at a time: saving again rewrites it, and the version in force stays', async () => {
    const ruleSetId = await startInForce();
    await draftOnly(ruleSetId, '1-20');
    await draftOnly(ruleSetId, '1-30');
    const versions = await versionsOf(ruleSetId);
    expect(versions.map(({ version, state }) => [version, state])).toEqual([
      [2, 'draft'],
      [1, 'in force'],
    ]);
    expect(versions[0]?.ruleSet.labels.allowed).toBe('1-30');
  });

  it('is one at a time in the database too, whatever is written past the program', async () => {
    const ruleSetId = await startInForce();
    await draftOnly(ruleSetId, '1-20');
    const insert = withLeague(world.league.id, (tx) =>
      tx
        .insertInto('rule_set_versions')
        .values({
          league_id: world.league.id,
          id: world.admin.newId(),
          rule_set_id: ruleSetId,
          version: 9,
          state: 'draft',
          in_force_from: null,
          body: '{}',
          created_by: null,
          created_at: world.admin.now,
        })
        .execute(),
    );
    await expect(insert).rejects.toMatchObject({ constraint: 'one_draft_version' });
  });

  it('is kept from a stale writer, also when two start it at the same moment', async () => {
    const ruleSetId = await startInForce();
    const [inForce] = await versionsOf(ruleSetId);
    if (!inForce) throw new Error('no version');
    const save = (allowed: string) =>
      saveDraft(world.admin, {
        ruleSetId,
        rowVersion: null,
        ruleSet: { ...inForce.ruleSet, labels: { ...inForce.ruleSet.labels, allowed } },
      });
    const outcomes = await Promise.allSettled([save('1-10'), save('1-11')]);
    const refused = outcomes.filter((one) => one.status === 'rejected');
    expect(refused.map((one) => (one.reason as { code?: string }).code)).toEqual(['conflict']);
  });

  it('is refused with the sentence of what would make it useless', async () => {
    const ruleSetId = await startInForce();
    await expect(draftOnly(ruleSetId, 'twelve')).rejects.toMatchObject({ code: 'invalid' });
    expect(await versionsOf(ruleSetId)).toHaveLength(1);
  });

  it('can be discarded, which the history keeps, but not as the only version', async () => {
    const ruleSetId = await startInForce();
    await draftOnly(ruleSetId, '1-20');
    await discardDraft(world.admin, { ruleSetId });
    expect((await versionsOf(ruleSetId)).map((version) => version.state)).toEqual(['in force']);
    const events = await queryAsAdmin(
      `select data->>'version' as version from audit_events where subject_id = $1 and type = 'rule set draft discarded'`,
      [ruleSetId],
    );
    expect(events).toEqual([{ version: '2' }]);
    const { ruleSetId: fresh } = await start();
    await expect(discardDraft(world.admin, { ruleSetId: fresh })).rejects.toMatchObject({ code: 'conflict' });
  });
});

describe('putting a draft in force', () => {
  it('supersedes the version before, which stays readable, from that day on the league’s calendar', async () => {
    const ruleSetId = await startInForce();
    await draftOnly(ruleSetId, '1-20');
    const { rowVersion } = await draftOf(ruleSetId);
    // Half past eleven at night in UTC in summer is the next day in Dublin.
    const late = laterBy(world.admin, 0);
    await putInForce({ ...late, now: new Date('2027-06-01T23:30:00Z') }, { ruleSetId, rowVersion });
    const versions = await versionsOf(ruleSetId);
    expect(versions.map(({ version, state, inForceFrom }) => [version, state, inForceFrom])).toEqual([
      [2, 'in force', '2027-06-02'],
      [1, 'superseded', '2027-03-02'],
    ]);
    expect(versions.map((version) => version.ruleSet.labels.allowed)).toEqual(['1-20', '0, 00, 1–99']);
  });

  it('is refused for a draft that was changed since it was looked at', async () => {
    const ruleSetId = await startInForce();
    await draftOnly(ruleSetId, '1-20');
    const { rowVersion } = await draftOf(ruleSetId);
    await draftOnly(ruleSetId, '1-30');
    await expect(putInForce(world.admin, { ruleSetId, rowVersion })).rejects.toMatchObject({
      code: 'conflict',
    });
  });

  it('happens once, however often it is asked for at the same moment', async () => {
    const ruleSetId = await startInForce();
    await draftOnly(ruleSetId, '1-20');
    const { rowVersion } = await draftOf(ruleSetId);
    const ask = () => putInForce(world.admin, { ruleSetId, rowVersion });
    const outcomes = await Promise.allSettled([ask(), ask(), ask()]);
    expect(outcomes.filter((one) => one.status === 'fulfilled')).toHaveLength(1);
    expect((await versionsOf(ruleSetId)).filter((version) => version.state === 'in force')).toHaveLength(1);
  });
});

describe('a version that is not a draft', () => {
  const write = (id: string, change: Record<string, string | null>) =>
    withLeague(world.league.id, (tx) =>
      tx.updateTable('rule_set_versions').set(change).where('id', '=', id).execute(),
    );

  it('never changes, whatever is written past the program', async () => {
    const ruleSetId = await startInForce();
    const [inForce] = await versionsOf(ruleSetId);
    await draftOnly(ruleSetId, '1-20');
    for (const change of [
      { body: '{}' },
      { in_force_from: '2020-01-01' },
      { rule_set_id: world.ruleSet.id },
      { state: 'draft', in_force_from: null },
    ])
      await expect(write(inForce?.id ?? '', change)).rejects.toThrow('never changes');
    await expect(queryAsAdmin('delete from rule_set_versions where id = $1', [inForce?.id])).rejects.toThrow(
      'never changes',
    );
    const { rowVersion } = await draftOf(ruleSetId);
    await putInForce(world.admin, { ruleSetId, rowVersion });
    await expect(write(inForce?.id ?? '', { body: '{}' })).rejects.toThrow('never changes');
    await expect(write(inForce?.id ?? '', { state: 'in force' })).rejects.toThrow();
    await expect(write(inForce?.id ?? '', { state: 'draft' })).rejects.toThrow();
  });
});

describe('who reads number rules', () => {
  it('a manager those of their divisions, a referee all in force, and neither a draft', async () => {
    const ruleSetId = await startInForce();
    await draftOnly(ruleSetId, '1-20');
    await start();
    expect((await listRuleSets(world.manager)).map((entry) => entry.id)).toEqual([world.ruleSet.id]);
    const forReferee = await listRuleSets(world.referee);
    expect(forReferee.some((entry) => entry.id === ruleSetId)).toBe(true);
    expect(forReferee.every((entry) => entry.inForce !== null && entry.draft === null)).toBe(true);
    await expect(getRuleSet(world.manager, { ruleSetId })).rejects.toMatchObject({ code: 'not-found' });
    const division = await buildDivision(world.league, world.season, { ruleSetId });
    const team = await buildTeam(world.league, division);
    const manager = { ...world.manager, actor: { ...world.manager.actor, teamIds: [team.id] } };
    expect((await getRuleSet(manager, { ruleSetId })).versions.map((version) => version.state)).toEqual([
      'in force',
    ]);
  });

  it('and only a league admin writes them', async () => {
    const ruleSetId = await startInForce();
    const [version] = await versionsOf(ruleSetId);
    if (!version) throw new Error('no version');
    for (const ctx of [world.manager, world.referee, world.decorator]) {
      const forbidden = { code: 'forbidden' };
      await expect(startRuleSet(ctx, { name: 'Mine', sport: 'x', presetId: null })).rejects.toMatchObject(
        forbidden,
      );
      await expect(
        saveDraft(ctx, { ruleSetId, rowVersion: null, ruleSet: version.ruleSet }),
      ).rejects.toMatchObject(forbidden);
      await expect(putInForce(ctx, { ruleSetId, rowVersion: 1 })).rejects.toMatchObject(forbidden);
      await expect(discardDraft(ctx, { ruleSetId })).rejects.toMatchObject(forbidden);
    }
    await expect(listRuleSets(world.decorator)).rejects.toMatchObject({ code: 'forbidden' });
  });

  it('and nobody reaches those of another league', async () => {
    await expect(getRuleSet(world.admin, { ruleSetId: other.ruleSet.id })).rejects.toMatchObject({
      code: 'not-found',
    });
    await expect(
      putInForce(world.admin, { ruleSetId: other.ruleSet.id, rowVersion: 1 }),
    ).rejects.toMatchObject({ code: 'not-found' });
  });
});
