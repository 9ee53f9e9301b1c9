import type { RuleSet } from '@/lib/domain/rules/rule-set';
import type { LeagueTx } from '../tenant';

/** One version of a rule set. A draft can change; one in force or superseded never does. */
export type RuleSetVersion = {
  id: string;
  ruleSetId: string;
  version: number;
  state: 'draft' | 'in force' | 'superseded';
  inForceFrom: string | null;
  ruleSet: RuleSet;
  createdAt: Date;
  rowVersion: number;
};

/** The rule sets of the league by name, with the catalogue preset each was started from. */
export function listRuleSets(tx: LeagueTx) {
  return tx
    .selectFrom('rule_sets')
    .select(['id', 'name', 'preset_id as presetId'])
    .where('league_id', '=', tx.leagueId)
    .orderBy('name')
    .execute();
}

/** All versions of the given rule sets, the newest first. */
export async function listRuleSetVersions(
  tx: LeagueTx,
  ruleSetIds: readonly string[],
): Promise<RuleSetVersion[]> {
  if (ruleSetIds.length === 0) return [];
  const rows = await tx
    .selectFrom('rule_set_versions')
    .select(['id', 'rule_set_id', 'version', 'state', 'in_force_from', 'body', 'created_at', 'row_version'])
    .where('league_id', '=', tx.leagueId)
    .where('rule_set_id', 'in', [...ruleSetIds])
    .orderBy('version', 'desc')
    .execute();
  return rows.map((row) => ({
    id: row.id,
    ruleSetId: row.rule_set_id,
    version: row.version,
    state: row.state,
    inForceFrom: row.in_force_from,
    ruleSet: row.body,
    createdAt: row.created_at,
    rowVersion: row.row_version,
  }));
}

/** Which divisions, over all seasons, play by each rule set. */
export function listDivisionsByRuleSet(tx: LeagueTx) {
  return tx
    .selectFrom('divisions as d')
    .innerJoin('seasons as s', (join) =>
      join.onRef('s.league_id', '=', 'd.league_id').onRef('s.id', '=', 'd.season_id'),
    )
    .select(['d.id', 'd.rule_set_id as ruleSetId', 'd.name', 's.name as season', 's.id as seasonId'])
    .where('d.league_id', '=', tx.leagueId)
    .orderBy('s.first_match_on', 'desc')
    .orderBy('d.position')
    .execute();
}

/** Locks a rule set so that drafts and versions of it change one at a time; undefined when the league has none. */
export function lockRuleSet(tx: LeagueTx, ruleSetId: string) {
  return tx
    .selectFrom('rule_sets')
    .select(['id', 'name', 'preset_id as presetId'])
    .where('league_id', '=', tx.leagueId)
    .where('id', '=', ruleSetId)
    .forNoKeyUpdate()
    .executeTakeFirst();
}

/** Adds a rule set without any version. */
export async function insertRuleSet(
  tx: LeagueTx,
  ruleSet: { id: string; name: string; presetId: string | null; now: Date },
): Promise<void> {
  await tx
    .insertInto('rule_sets')
    .values({
      league_id: tx.leagueId,
      id: ruleSet.id,
      name: ruleSet.name,
      preset_id: ruleSet.presetId,
      created_at: ruleSet.now,
    })
    .execute();
}

/** Adds a draft; a rule set has at most one (a unique index says so). */
export async function insertDraft(
  tx: LeagueTx,
  draft: { id: string; ruleSetId: string; version: number; ruleSet: RuleSet; now: Date; userId: string },
): Promise<void> {
  await tx
    .insertInto('rule_set_versions')
    .values({
      league_id: tx.leagueId,
      id: draft.id,
      rule_set_id: draft.ruleSetId,
      version: draft.version,
      state: 'draft',
      in_force_from: null,
      body: JSON.stringify(draft.ruleSet),
      created_by: draft.userId,
      created_at: draft.now,
    })
    .execute();
}

/** Rewrites a draft; false when somebody changed it since `rowVersion`. */
export async function updateDraft(
  tx: LeagueTx,
  draft: { id: string; rowVersion: number; ruleSet: RuleSet },
): Promise<boolean> {
  const result = await tx
    .updateTable('rule_set_versions')
    .set({ body: JSON.stringify(draft.ruleSet), row_version: draft.rowVersion + 1 })
    .where('league_id', '=', tx.leagueId)
    .where('id', '=', draft.id)
    .where('state', '=', 'draft')
    .where('row_version', '=', draft.rowVersion)
    .executeTakeFirst();
  return result.numUpdatedRows === 1n;
}

/** Removes a draft. */
export async function deleteDraft(tx: LeagueTx, draftId: string): Promise<void> {
  await tx
    .deleteFrom('rule_set_versions')
    .where('league_id', '=', tx.leagueId)
    .where('id', '=', draftId)
    .where('state', '=', 'draft')
    .execute();
}

/** Supersedes the version in force and puts the draft in its place, from a day on. */
export async function putDraftInForce(
  tx: LeagueTx,
  draft: { id: string; ruleSetId: string; from: string },
): Promise<void> {
  await tx
    .updateTable('rule_set_versions')
    .set({ state: 'superseded' })
    .where('league_id', '=', tx.leagueId)
    .where('rule_set_id', '=', draft.ruleSetId)
    .where('state', '=', 'in force')
    .execute();
  await tx
    .updateTable('rule_set_versions')
    .set({ state: 'in force', in_force_from: draft.from })
    .where('league_id', '=', tx.leagueId)
    .where('id', '=', draft.id)
    .execute();
}
