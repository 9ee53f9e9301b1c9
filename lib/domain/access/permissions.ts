/** Roles a person can hold in a league; one person may hold several. */
export const roles = ['league admin', 'team manager', 'decorator', 'referee'] as const;
export type Role = (typeof roles)[number];

/**
 * How far a permission reaches for a role: the whole league, only the teams a manager was named for, only batches
 * released to the decorator's own shop, or nothing.
 */
export type Reach = 'league' | 'own teams' | 'own shop' | 'none';

type Row = { says: string; reach: Record<Role, Reach> };

const row = (says: string, admin: Reach, manager: Reach, decorator: Reach, referee: Reach): Row => ({
  says,
  reach: { 'league admin': admin, 'team manager': manager, decorator, referee },
});

/** The one table of who may do what. The server, the screens, the People page and the tests all read it. */
export const permissionTable = {
  'league.settings': row(
    "Change the league's name, time zone, units and paper",
    'league',
    'none',
    'none',
    'none',
  ),
  'people.read': row('See who belongs to the league', 'league', 'none', 'none', 'none'),
  'people.manage': row('Invite people and end memberships', 'league', 'none', 'none', 'none'),
  'history.read': row('Read the history of the league', 'league', 'none', 'none', 'none'),
  'season.write': row('Open seasons and change their dates', 'league', 'none', 'none', 'none'),
  'division.read': row('See divisions', 'league', 'own teams', 'none', 'league'),
  'division.write': row('Add and change divisions, their kit and limits', 'league', 'none', 'none', 'none'),
  'team.read': row('See teams and their colours', 'league', 'own teams', 'none', 'league'),
  'team.write': row('Add, import and change teams and their colours', 'league', 'none', 'none', 'none'),
  'rule-set.read': row('Read number rules', 'league', 'own teams', 'none', 'league'),
  'rule-set.write': row('Draft number rules and put them in force', 'league', 'none', 'none', 'none'),
  'readiness.read': row(
    'See which teams are ready and what holds the rest',
    'league',
    'own teams',
    'none',
    'none',
  ),
  'readiness.remind': row('Remind managers by e-mail', 'league', 'none', 'none', 'none'),
  'roster.read': row('See a roster with its sizes', 'league', 'own teams', 'none', 'none'),
  'roster.edit': row(
    'Upload and edit a roster that is open or returned',
    'league',
    'own teams',
    'none',
    'none',
  ),
  'roster.submit': row(
    'Submit a roster, or take it back before it is signed off',
    'league',
    'own teams',
    'none',
    'none',
  ),
  'roster.return': row('Return a roster with a reason', 'league', 'none', 'none', 'none'),
  'roster.sign-off': row('Sign a roster off, reopen or freeze it', 'league', 'none', 'none', 'none'),
  'batch.read': row('See batches and download their bundles', 'league', 'none', 'own shop', 'none'),
  'batch.make': row('Make, release and discard batches', 'league', 'none', 'none', 'none'),
  'batch.mark': row('Mark a batch on press, packed or shipped', 'none', 'none', 'own shop', 'none'),
  'batch.receive': row('Mark a batch received', 'league', 'none', 'none', 'none'),
  'match.check': row('Compare two teams before a match', 'league', 'own teams', 'none', 'league'),
} as const satisfies Record<string, Row>;
export type Permission = keyof typeof permissionTable;

/** What one person is in one league. `teamIds` are the teams a manager was named for; `shopIds` the decorator's shops. */
export type LeagueActor = {
  userId: string;
  name: string;
  leagueId: string;
  roles: readonly Role[];
  teamIds: readonly string[];
  shopIds: readonly string[];
};

/** The thing a permission is asked about; leave out what does not apply. */
export type AccessScope = { teamId?: string | undefined; shopId?: string | undefined };

/**
 * Whether the actor holds the permission for this scope. Without a scope, `own teams` and `own shop` answer true
 * when there is at least one: use that only to decide whether a page is offered at all.
 */
export function can(actor: LeagueActor, permission: Permission, scope: AccessScope = {}): boolean {
  return actor.roles.some((role) => {
    switch (permissionTable[permission].reach[role]) {
      case 'league':
        return true;
      case 'own teams':
        return scope.teamId === undefined ? actor.teamIds.length > 0 : actor.teamIds.includes(scope.teamId);
      case 'own shop':
        return scope.shopId === undefined ? actor.shopIds.length > 0 : actor.shopIds.includes(scope.shopId);
      case 'none':
        return false;
    }
  });
}

/** The actor's reach over the whole table without a scope: what a screen needs to show or hide its buttons. */
export function listAbilities(actor: LeagueActor): Permission[] {
  return (Object.keys(permissionTable) as Permission[]).filter((permission) => can(actor, permission));
}

/** Whether the actor holds the permission for every team of the league, not only for named ones. */
export function canForWholeLeague(actor: LeagueActor, permission: Permission): boolean {
  return actor.roles.some((role) => permissionTable[permission].reach[role] === 'league');
}
