import { randomUUID } from 'node:crypto';
import type { CellField, RosterEdit, RosterEntry } from '@/lib/domain/roster/edit';
import type { ActorContext } from '@/lib/use-cases/context';
import { getRoster, type RosterPage } from '@/lib/use-cases/rosters/get-roster';
import { queryAsAdmin } from '../support/database';
import {
  buildDivision,
  buildLeague,
  buildMember,
  buildRuleSet,
  buildSeason,
  buildTeam,
  someGarments,
} from './league';
import type { RuleSet } from '@/lib/domain/rules/rule-set';
import type { RosterLine } from '@/lib/domain/roster/player';

/** A league with one division under rules of its own, one team with these players, two managers and an admin. */
export async function buildRoster(
  given: { players?: Partial<RosterLine>[]; rules?: Partial<RuleSet>; least?: number; most?: number } = {},
) {
  const bare = await buildLeague();
  const season = await buildSeason(bare);
  const league = { ...bare, currentSeason: season };
  const ruleSet = await buildRuleSet(league, given.rules === undefined ? {} : { rules: given.rules });
  const division = await buildDivision(league, season, {
    ruleSetId: ruleSet.id,
    garments: someGarments,
    leastPlayers: given.least ?? 0,
    mostPlayers: given.most ?? 200,
  });
  const team = await buildTeam(league, division, {
    name: 'Herons',
    players: given.players ?? [
      { name: 'Calloway, Ines', number: '4' },
      { name: 'Dunmore, Pip', number: '14' },
    ],
  });
  const admin = await buildMember(league, 'league admin');
  const ana = await buildMember(league, 'team manager', { teamIds: [team.id] });
  const ben = await buildMember(league, 'team manager', { teamIds: [team.id] });
  const other = await buildTeam(league, division, { name: 'Egrets', players: [{}] });
  const stranger = await buildMember(league, 'team manager', { teamIds: [other.id] });
  const where = { season: season.slug, team: team.slug };
  return {
    league,
    season,
    ruleSet,
    division,
    team,
    other,
    where,
    admin: admin.ctx,
    ana: ana.ctx,
    ben: ben.ctx,
    stranger: stranger.ctx,
    emails: { ana: ana.person.email, ben: ben.person.email },
    read: (ctx: ActorContext = ana.ctx): Promise<RosterPage> => getRoster(ctx, where),
  };
}
export type BuiltRoster = Awaited<ReturnType<typeof buildRoster>>;

/** The setting of one cell, as a screen that shows `player` would make it. */
export function makeSet(player: RosterEntry | undefined, field: CellField, to: string): RosterEdit {
  if (!player) throw new Error('no such player');
  const from = field.startsWith('size:')
    ? (player.sizes[field.slice(5)] ?? '')
    : player[field as 'name' | 'nameOnBack' | 'number' | 'role'];
  return { kind: 'set', playerId: player.id, field, from, to };
}

/** The adding of a player below another. */
export const makeAdd = (line: Partial<RosterLine>, after: string | null): RosterEdit => ({
  kind: 'add',
  after,
  player: {
    id: randomUUID(),
    name: '',
    nameOnBack: '',
    number: '',
    role: '',
    sizes: {},
    extra: {},
    ...line,
  },
});

/** The history of one roster, oldest first. */
export const listRosterEvents = (rosterId: string) =>
  queryAsAdmin<{ type: string; data: Record<string, unknown>; user_id: string | null }>(
    'select type, data, user_id from audit_events where subject_id = $1 order by at, id',
    [rosterId],
  );
