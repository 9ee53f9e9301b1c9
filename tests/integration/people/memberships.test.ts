import { afterAll, describe, expect, it } from 'vitest';
import { closeDatabase } from '@/db/client';
import { AppError } from '@/lib/platform/errors';
import { findSignedInPerson } from '@/lib/use-cases/account/find-signed-in-person';
import { signIn } from '@/lib/use-cases/account/sign-in';
import { changeManagerTeams } from '@/lib/use-cases/people/change-manager-teams';
import { endRole } from '@/lib/use-cases/people/end-role';
import { listPeople } from '@/lib/use-cases/people/list-people';
import { listLetters, makePerson, makeRequest } from '../../factories/people';
import { makeStaffedLeague } from '../../factories/staffed-league';
import { queryAsAdmin } from '../../support/database';

afterAll(closeDatabase);

const settle = (work: Promise<unknown>) =>
  work.then(
    () => 'done',
    (error: unknown) => {
      if (error instanceof AppError) return error.code;
      throw error;
    },
  );

describe('ending a membership', () => {
  it('signs that person out at the next request, everywhere', async () => {
    const league = await makeStaffedLeague();
    const referee = await makePerson();
    const membershipId = await league.give(referee, 'referee');
    const session = await signIn(makeRequest(), { ...referee, address: '192.0.2.1' });
    if (!session) throw new Error('not signed in');
    expect((await findSignedInPerson(session))?.leagues).toHaveLength(1);

    expect(await endRole(await league.actAs(league.admin), { membershipId })).toEqual({
      person: referee.name,
      role: 'referee',
    });

    expect(await findSignedInPerson(session)).toBeUndefined();
    const again = await signIn(makeRequest(), { ...referee, address: '192.0.2.1' });
    if (!again) throw new Error('not signed in');
    expect((await findSignedInPerson(again))?.leagues).toEqual([]);
  });

  it('takes that role only, and leaves the others of the same person', async () => {
    const league = await makeStaffedLeague();
    const person = await makePerson();
    const asReferee = await league.give(person, 'referee');
    await league.give(person, 'team manager', { teamIds: [league.teams[0]?.id ?? ''] });
    await endRole(await league.actAs(league.admin), { membershipId: asReferee });
    expect((await league.actAs(person)).actor.roles).toEqual(['team manager']);
  });

  it('is refused for the only league admin', async () => {
    const league = await makeStaffedLeague();
    const ctx = await league.actAs(league.admin);
    const [membership] = (await listPeople(ctx)).memberships;
    await expect(endRole(ctx, { membershipId: membership?.id ?? '' })).rejects.toThrow('only league admin');
  });

  it('leaves one admin when several end each other at the same moment', async () => {
    const league = await makeStaffedLeague();
    const others = [await makePerson(), await makePerson(), await makePerson()];
    for (const other of others) await league.give(other, 'league admin');
    const ctx = await league.actAs(league.admin);
    const { memberships } = await listPeople(ctx);
    expect(memberships).toHaveLength(4);
    const answers = await Promise.all(
      memberships.map((membership) => settle(endRole(ctx, { membershipId: membership.id }))),
    );
    expect(answers.sort()).toEqual(['conflict', 'done', 'done', 'done']);
    const left = await queryAsAdmin(
      `select id from memberships where league_id = $1 and role = 'league admin' and ended_at is null`,
      [league.id],
    );
    expect(left).toHaveLength(1);
  });

  it('of another league is not found, nor is one that has ended', async () => {
    const league = await makeStaffedLeague();
    const other = await makeStaffedLeague();
    const foreign = await other.give(await makePerson(), 'referee');
    const ctx = await league.actAs(league.admin);
    expect(await settle(endRole(ctx, { membershipId: foreign }))).toBe('not-found');
    const own = await league.give(await makePerson(), 'referee');
    expect(await settle(endRole(ctx, { membershipId: own }))).toBe('done');
    expect(await settle(endRole(ctx, { membershipId: own }))).toBe('not-found');
  });

  it('keeps the name of that person in the history', async () => {
    const league = await makeStaffedLeague();
    const person = await makePerson({ name: 'Gone But Named' });
    const membershipId = await league.give(person, 'referee');
    await endRole(await league.actAs(league.admin), { membershipId });
    const events = await queryAsAdmin<{ data: object }>(
      `select data from audit_events where league_id = $1 and type = 'membership ended'`,
      [league.id],
    );
    expect(events).toEqual([{ data: { role: 'referee', person: 'Gone But Named' } }]);
  });
});

describe('the teams of a manager', () => {
  it('are named anew, and the new ones are told by e-mail', async () => {
    const league = await makeStaffedLeague();
    const [otters = '', herons = '', egrets = ''] = league.teams.map((team) => team.id);
    const manager = await makePerson();
    const membershipId = await league.give(manager, 'team manager', { teamIds: [otters, herons] });
    const change = await changeManagerTeams(await league.actAs(league.admin), {
      membershipId,
      teamIds: [herons, egrets],
    });
    expect(change).toEqual({ added: ['Egrets'], removed: ['Otters'] });
    expect(new Set((await league.actAs(manager)).actor.teamIds)).toEqual(new Set([herons, egrets]));
    expect(await listLetters(manager.email)).toMatchObject([{ params: { teams: 'Egrets' } }]);
  });

  it('cannot be those of another league, and belong to managers only', async () => {
    const league = await makeStaffedLeague();
    const other = await makeStaffedLeague();
    const foreign = other.teams[0]?.id ?? '';
    const ctx = await league.actAs(league.admin);
    const manager = await league.give(await makePerson(), 'team manager', {
      teamIds: [league.teams[0]?.id ?? ''],
    });
    const referee = await league.give(await makePerson(), 'referee');
    expect(await settle(changeManagerTeams(ctx, { membershipId: manager, teamIds: [foreign] }))).toBe(
      'not-found',
    );
    expect(
      await settle(changeManagerTeams(ctx, { membershipId: referee, teamIds: [league.teams[0]?.id ?? ''] })),
    ).toBe('conflict');
  });
});
