import { applyDivisionLimits } from '@/lib/domain/rules/apply-division-limits';
import type { RuleSet } from '@/lib/domain/rules/rule-set';
import type { Garment } from '@/lib/domain/roster/player';
import type { LeagueTx } from '../tenant';

/** A division with everything a roster of it is checked against. */
export type DivisionView = {
  id: string;
  seasonId: string;
  slug: string;
  name: string;
  ageBand: string;
  level: string;
  leastPlayers: number;
  mostPlayers: number;
  /** The division's own freeze, else the season's. */
  freezesAt: Date;
  ownFreezesAt: Date | null;
  position: number;
  rowVersion: number;
  ruleSetId: string;
  ruleSetName: string;
  /** The version in force with the division's roster limits applied; null while only a draft exists. */
  rules: { versionId: string; version: number; ruleSet: RuleSet } | null;
  garments: Garment[];
};

/** The divisions of a season in their own order, each with its garments and the rules in force. */
export async function listDivisionViews(tx: LeagueTx, seasonId: string): Promise<DivisionView[]> {
  const rows = await tx
    .selectFrom('divisions as d')
    .innerJoin('seasons as s', (join) =>
      join.onRef('s.league_id', '=', 'd.league_id').onRef('s.id', '=', 'd.season_id'),
    )
    .innerJoin('rule_sets as r', (join) =>
      join.onRef('r.league_id', '=', 'd.league_id').onRef('r.id', '=', 'd.rule_set_id'),
    )
    .leftJoin('rule_set_versions as v', (join) =>
      join
        .onRef('v.league_id', '=', 'r.league_id')
        .onRef('v.rule_set_id', '=', 'r.id')
        .on('v.state', '=', 'in force'),
    )
    .selectAll('d')
    .select([
      's.freezes_at as season_freezes_at',
      'r.name as rule_set_name',
      'v.id as version_id',
      'v.version',
      'v.body',
    ])
    .where('d.league_id', '=', tx.leagueId)
    .where('d.season_id', '=', seasonId)
    .orderBy('d.position')
    .orderBy('d.name')
    .execute();
  const garments = await tx
    .selectFrom('garments as g')
    .innerJoin('divisions as d', (join) =>
      join.onRef('d.league_id', '=', 'g.league_id').onRef('d.id', '=', 'g.division_id'),
    )
    .selectAll('g')
    .where('g.league_id', '=', tx.leagueId)
    .where('d.season_id', '=', seasonId)
    .orderBy('g.position')
    .execute();
  return rows.map((row) => {
    const limits = { leastPlayers: row.least_players, mostPlayers: row.most_players };
    return {
      id: row.id,
      seasonId: row.season_id,
      slug: row.slug,
      name: row.name,
      ageBand: row.age_band,
      level: row.level,
      ...limits,
      freezesAt: row.freezes_at ?? row.season_freezes_at,
      ownFreezesAt: row.freezes_at,
      position: row.position,
      rowVersion: row.row_version,
      ruleSetId: row.rule_set_id,
      ruleSetName: row.rule_set_name,
      rules:
        row.version_id !== null && row.version !== null && row.body !== null
          ? {
              versionId: row.version_id,
              version: row.version,
              ruleSet: applyDivisionLimits(row.body, limits),
            }
          : null,
      garments: garments
        .filter((garment) => garment.division_id === row.id)
        .map(({ code, name, worn, numbered, named, sizes }) => ({
          code,
          name,
          worn,
          numbered,
          named,
          sizes,
        })),
    };
  });
}
