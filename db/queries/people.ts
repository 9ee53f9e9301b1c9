import type { Role } from '@/lib/domain/access/permissions';
import type { LeagueSummary, Person } from '@/lib/domain/league/league';
import type { EmailTx, UserTx } from '../tenant';

/** The account with the transaction's address: id, password hash and session version; undefined when there is none. */
export function findAccountByEmail(tx: EmailTx, email: string) {
  return tx
    .selectFrom('users')
    .select(['id', 'name', 'email', 'password_hash', 'session_version'])
    .where('email', '=', email)
    .executeTakeFirst();
}

/** The person of a session with every league they belong to; undefined once the session's version is out of date. */
export async function findPerson(
  tx: UserTx,
  userId: string,
  sessionVersion: number,
): Promise<Person | undefined> {
  const account = await tx
    .selectFrom('users')
    .select(['id', 'email', 'name'])
    .where('id', '=', userId)
    .where('session_version', '=', sessionVersion)
    .executeTakeFirst();
  if (!account) return undefined;
  const rows = await tx
    .selectFrom('memberships as m')
    .innerJoin('leagues as l', 'l.id', 'm.league_id')
    .leftJoin('seasons as s', (join) =>
      join.onRef('s.league_id', '=', 'l.id').onRef('s.id', '=', 'l.current_season_id'),
    )
    .leftJoin('membership_teams as t', (join) =>
      join.onRef('t.league_id', '=', 'm.league_id').onRef('t.membership_id', '=', 'm.id'),
    )
    .select([
      'l.id',
      'l.slug',
      'l.name',
      'l.time_zone',
      'l.unit',
      'l.paper',
      'l.currency',
      's.id as season_id',
      's.slug as season_slug',
      's.name as season_name',
      'm.role',
      'm.shop_id',
      't.team_id',
    ])
    .where('m.user_id', '=', userId)
    .where('m.ended_at', 'is', null)
    .orderBy('l.name')
    .orderBy('l.id')
    .execute();

  const leagues = new Map<
    string,
    { league: LeagueSummary; roles: Set<Role>; teamIds: Set<string>; shopIds: Set<string> }
  >();
  for (const row of rows) {
    const entry = leagues.get(row.id) ?? {
      league: {
        id: row.id,
        slug: row.slug,
        name: row.name,
        timeZone: row.time_zone,
        unit: row.unit,
        paper: row.paper,
        currency: row.currency,
        currentSeason:
          row.season_id !== null && row.season_slug !== null && row.season_name !== null
            ? { id: row.season_id, slug: row.season_slug, name: row.season_name }
            : null,
      },
      roles: new Set<Role>(),
      teamIds: new Set<string>(),
      shopIds: new Set<string>(),
    };
    entry.roles.add(row.role);
    if (row.team_id !== null) entry.teamIds.add(row.team_id);
    if (row.shop_id !== null) entry.shopIds.add(row.shop_id);
    leagues.set(row.id, entry);
  }
  return {
    userId: account.id,
    email: account.email,
    name: account.name,
    leagues: [...leagues.values()].map(({ league, roles, teamIds, shopIds }) => ({
      league,
      actor: {
        userId: account.id,
        name: account.name,
        leagueId: league.id,
        roles: [...roles],
        teamIds: [...teamIds],
        shopIds: [...shopIds],
      },
    })),
  };
}
