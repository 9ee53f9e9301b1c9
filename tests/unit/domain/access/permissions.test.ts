import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  can,
  canForWholeLeague,
  listAbilities,
  permissionTable,
  roles,
  type LeagueActor,
  type Permission,
} from '@/lib/domain/access/permissions';

const permissions = Object.keys(permissionTable) as Permission[];
const actor = (over: Partial<LeagueActor>): LeagueActor => ({
  userId: 'u',
  name: 'N',
  leagueId: 'l',
  roles: [],
  teamIds: [],
  shopIds: [],
  ...over,
});

describe('the table of roles and permissions', () => {
  it('says what each permission is in a sentence that starts with a capital letter', () => {
    for (const permission of permissions) expect(permissionTable[permission].says).toMatch(/^[A-Z][^.]+$/);
  });

  it('never lets a referee or a decorator see a roster with its sizes', () => {
    expect(can(actor({ roles: ['referee'] }), 'roster.read')).toBe(false);
    expect(can(actor({ roles: ['decorator'], shopIds: ['s'] }), 'roster.read')).toBe(false);
  });

  it('never lets a decorator change a roster, nor a referee anything', () => {
    const writing = permissions.filter((permission) => !/\.(read|check)$/.test(permission));
    for (const permission of writing)
      expect([permission, can(actor({ roles: ['referee'] }), permission)]).toEqual([permission, false]);
    const shop = writing.filter((permission) =>
      can(actor({ roles: ['decorator'], shopIds: ['s'] }), permission),
    );
    expect(shop).toEqual(['batch.mark']);
  });

  it('lets a manager work on the teams they are named for and on no other', () => {
    const manager = actor({ roles: ['team manager'], teamIds: ['herons'] });
    expect(can(manager, 'roster.edit', { teamId: 'herons' })).toBe(true);
    expect(can(manager, 'roster.edit', { teamId: 'otters' })).toBe(false);
    expect(can(manager, 'roster.sign-off', { teamId: 'herons' })).toBe(false);
  });

  it('gives a person with several roles what any of them allows, and no more', () => {
    fc.assert(
      fc.property(
        fc.subarray([...roles]),
        fc.constantFrom(...permissions),
        fc.option(fc.constantFrom('a', 'b')),
        (held, permission, team) => {
          const scope = team === null ? {} : { teamId: team, shopId: team };
          const whole = can(actor({ roles: held, teamIds: ['a'], shopIds: ['a'] }), permission, scope);
          const single = held.some((role) =>
            can(actor({ roles: [role], teamIds: ['a'], shopIds: ['a'] }), permission, scope),
          );
          expect(whole).toBe(single);
        },
      ),
    );
  });

  it('gives nothing to a person without a role', () => {
    expect(listAbilities(actor({ teamIds: ['a'], shopIds: ['a'] }))).toEqual([]);
    expect(canForWholeLeague(actor({ roles: ['team manager'], teamIds: ['a'] }), 'roster.read')).toBe(false);
  });
});
