import { afterAll, describe, expect, it } from 'vitest';
import { closeDatabase } from '@/db/client';
import { AppError } from '@/lib/platform/errors';
import { findSignedInPerson } from '@/lib/use-cases/account/find-signed-in-person';
import { signIn } from '@/lib/use-cases/account/sign-in';
import { acceptInvitation } from '@/lib/use-cases/people/accept-invitation';
import { findInvitation } from '@/lib/use-cases/people/find-invitation';
import { invitePerson } from '@/lib/use-cases/people/invite-person';
import { joinAsNewcomer } from '@/lib/use-cases/people/join-as-newcomer';
import { listPeople } from '@/lib/use-cases/people/list-people';
import { invitePersonSchema } from '@/lib/use-cases/people/people-schemas';
import { resendInvitation } from '@/lib/use-cases/people/resend-invitation';
import { revokeInvitation } from '@/lib/use-cases/people/revoke-invitation';
import { listLetters, makePerson, makeRequest, readToken, somePassword } from '../../factories/people';
import { makeStaffedLeague, type StaffedLeague } from '../../factories/staffed-league';
import { queryAsAdmin } from '../../support/database';

afterAll(closeDatabase);

const days = (count: number) => count * 24 * 60;
const idOf = (league: StaffedLeague, name: string) =>
  league.teams.find((team) => team.name === name)?.id ?? 'no such team';
const invite = async (league: StaffedLeague, input: Parameters<typeof invitePersonSchema.parse>[0]) =>
  invitePerson(await league.actAs(league.admin), invitePersonSchema.parse(input));
const inviteManager = (league: StaffedLeague, email: string, ...teams: string[]) =>
  invite(league, { email, role: 'team manager', teamIds: teams.map((name) => idOf(league, name)) });
const readPeople = async (league: StaffedLeague) => listPeople(await league.actAs(league.admin));

const settle = (work: Promise<unknown>) =>
  work.then(
    () => 'done',
    (error: unknown) => {
      if (error instanceof AppError) return error.code;
      throw error;
    },
  );

describe('an invitation', () => {
  it('brings somebody new an account, the role and the teams, all by one link', async () => {
    const league = await makeStaffedLeague();
    await inviteManager(league, 'new.manager@club.example', 'Otters', 'Herons');
    const token = await readToken('new.manager@club.example', 'invitation');
    expect(await findInvitation(makeRequest(), token)).toMatchObject({
      state: 'open',
      league: league.name,
      role: 'team manager',
      teams: ['Herons', 'Otters'],
      hasAccount: false,
      invitedBy: league.admin.name,
      expires: 'Tuesday 16 March at 10:00',
    });

    await joinAsNewcomer(makeRequest(), { token, name: 'Nia Newcomer', password: somePassword });

    const session = await signIn(makeRequest(), {
      email: 'new.manager@club.example',
      password: somePassword,
      address: '192.0.2.1',
    });
    if (!session) throw new Error('not signed in');
    const person = await findSignedInPerson(session);
    expect(person?.leagues.map((entry) => entry.actor.roles)).toEqual([['team manager']]);
    expect(new Set(person?.leagues[0]?.actor.teamIds)).toEqual(
      new Set([idOf(league, 'Otters'), idOf(league, 'Herons')]),
    );
  });

  it('is accepted by somebody who has an account, with the address it was sent to only', async () => {
    const league = await makeStaffedLeague();
    const person = await makePerson();
    const other = await makePerson();
    await invite(league, { email: person.email.toUpperCase(), role: 'referee' });
    const token = await readToken(person.email, 'invitation');
    expect(await findInvitation(makeRequest(), token)).toMatchObject({ hasAccount: true });

    await expect(acceptInvitation(other.ctx, { token })).rejects.toThrow(`sent to ${person.email}`);
    await expect(
      joinAsNewcomer(makeRequest(), { token, name: 'Impostor', password: somePassword }),
    ).rejects.toThrow('has an account already');
    await acceptInvitation(person.ctx, { token });

    const { memberships, invitations } = await readPeople(league);
    expect(memberships.filter((entry) => entry.role === 'referee')).toMatchObject([{ userId: person.id }]);
    expect(invitations).toEqual([]);
  });

  it('works once, though five requests follow the link at the same moment', async () => {
    const league = await makeStaffedLeague();
    const person = await makePerson();
    await invite(league, { email: person.email, role: 'referee' });
    const token = await readToken(person.email, 'invitation');
    const answers = await Promise.all(
      Array.from({ length: 5 }, () => settle(acceptInvitation(person.ctx, { token }))),
    );
    expect(answers.sort()).toEqual(['conflict', 'conflict', 'conflict', 'conflict', 'done']);
    expect(await findInvitation(makeRequest(), token)).toEqual({ state: 'accepted', league: league.name });
  });

  it('opens one account when a newcomer presses the button five times', async () => {
    const league = await makeStaffedLeague();
    await invite(league, { email: 'eager@club.example', role: 'referee' });
    const token = await readToken('eager@club.example', 'invitation');
    const answers = await Promise.all(
      Array.from({ length: 5 }, () =>
        settle(joinAsNewcomer(makeRequest(), { token, name: 'Eager', password: somePassword })),
      ),
    );
    expect(answers.filter((answer) => answer === 'done')).toHaveLength(1);
    expect(await queryAsAdmin(`select id from users where email = 'eager@club.example'`)).toHaveLength(1);
  });

  it('leaves no account behind when it ran out', async () => {
    const league = await makeStaffedLeague();
    await invite(league, { email: 'slow@club.example', role: 'referee' });
    const token = await readToken('slow@club.example', 'invitation');
    expect(await findInvitation(makeRequest(days(13)), token)).toMatchObject({ state: 'open' });
    expect(await findInvitation(makeRequest(days(14)), token)).toEqual({
      state: 'expired',
      league: league.name,
    });
    const late = joinAsNewcomer(makeRequest(days(14)), { token, name: 'Slow', password: somePassword });
    await expect(late).rejects.toMatchObject({ code: 'conflict' });
    expect(await queryAsAdmin(`select id from users where email = 'slow@club.example'`)).toEqual([]);
  });

  it('opens nothing once it is withdrawn, and says so', async () => {
    const league = await makeStaffedLeague();
    const person = await makePerson();
    await invite(league, { email: person.email, role: 'league admin' });
    const token = await readToken(person.email, 'invitation');
    const [waiting] = (await readPeople(league)).invitations;
    await revokeInvitation(await league.actAs(league.admin), { invitationId: waiting?.id ?? '' });

    expect(await findInvitation(makeRequest(), token)).toEqual({ state: 'withdrawn', league: league.name });
    expect(await settle(acceptInvitation(person.ctx, { token }))).toBe('conflict');
    expect((await readPeople(league)).memberships).toHaveLength(1);
  });

  it('sent again has a new link, and the old one opens nothing', async () => {
    const league = await makeStaffedLeague();
    const person = await makePerson();
    await invite(league, { email: person.email, role: 'referee' });
    const first = await readToken(person.email, 'invitation');
    const [waiting] = (await readPeople(league)).invitations;
    const admin = await league.actAs(league.admin);
    await resendInvitation({ ...admin, now: makeRequest(days(20)).now }, { invitationId: waiting?.id ?? '' });
    const tokens = (await listLetters(person.email)).map((letter) =>
      letter.params['link']?.split('/').at(-1),
    );
    const second = tokens.find((token) => token !== first) ?? '';

    expect(await findInvitation(makeRequest(), first)).toEqual({ state: 'unknown' });
    expect(await settle(acceptInvitation(person.ctx, { token: first }))).toBe('conflict');
    expect(await findInvitation(makeRequest(days(33)), second)).toMatchObject({ state: 'open' });
    expect(await settle(acceptInvitation(person.ctx, { token: second }))).toBe('done');
  });

  it('repeated to the same address is one invitation, with the teams of both', async () => {
    const league = await makeStaffedLeague();
    await inviteManager(league, 'again@club.example', 'Otters');
    expect(await inviteManager(league, 'again@club.example', 'Egrets')).toMatchObject({
      outcome: 'sent again',
    });
    const { invitations } = await readPeople(league);
    expect(invitations.map((entry) => entry.teams.map((team) => team.name))).toEqual([['Egrets', 'Otters']]);
  });

  it('keeps 32 random bytes for its link, of which only the hash is stored', async () => {
    const league = await makeStaffedLeague();
    await invite(league, { email: 'hash@club.example', role: 'referee' });
    const token = await readToken('hash@club.example', 'invitation');
    expect(Buffer.from(token, 'base64url')).toHaveLength(32);
    const rows = await queryAsAdmin<{ text: string }>(
      `select to_jsonb(i)::text as text from invitations i where email = 'hash@club.example'`,
    );
    expect(rows).toHaveLength(1);
    expect(rows[0]?.text).not.toContain(token);
  });

  it('for a manager who is one already adds the teams at once and tells them', async () => {
    const league = await makeStaffedLeague();
    const manager = await makePerson();
    await league.give(manager, 'team manager', { teamIds: [idOf(league, 'Otters')] });
    expect(await inviteManager(league, manager.email, 'Otters', 'Herons')).toMatchObject({
      outcome: 'teams added',
    });
    expect((await league.actAs(manager)).actor.teamIds).toHaveLength(2);
    expect(await listLetters(manager.email)).toMatchObject([
      { template: 'teams-added', params: { teams: 'Herons' } },
    ]);
    await expect(inviteManager(league, manager.email, 'Herons')).rejects.toThrow('already');
  });

  it('accepted by a manager who became one in the meantime adds its teams to theirs', async () => {
    const league = await makeStaffedLeague();
    const manager = await makePerson();
    await inviteManager(league, manager.email, 'Herons');
    const token = await readToken(manager.email, 'invitation');
    await league.give(manager, 'team manager', { teamIds: [idOf(league, 'Otters')] });
    await acceptInvitation(manager.ctx, { token });
    expect((await league.actAs(manager)).actor.teamIds).toHaveLength(2);
    expect(
      (await readPeople(league)).memberships.filter((entry) => entry.userId === manager.id),
    ).toHaveLength(1);
  });

  it('names a shop for a decorator: a new one is added once, whatever its case', async () => {
    const league = await makeStaffedLeague();
    await invite(league, {
      email: 'd1@quay.example',
      role: 'decorator',
      shop: { kind: 'new', name: 'Quay press' },
    });
    await invite(league, {
      email: 'd2@quay.example',
      role: 'decorator',
      shop: { kind: 'new', name: 'QUAY PRESS' },
    });
    const { shops, invitations } = await readPeople(league);
    expect(shops.map((shop) => shop.name)).toEqual(['Quay press']);
    expect(invitations.map((entry) => entry.shop?.name)).toEqual(['Quay press', 'Quay press']);
  });

  it('refuses a role without what it needs', () => {
    const parse = (input: object) =>
      invitePersonSchema.safeParse({ email: 'a@club.example', ...input }).success;
    expect(parse({ role: 'team manager' })).toBe(false);
    expect(parse({ role: 'decorator' })).toBe(false);
    expect(parse({ role: 'referee', shop: { kind: 'new', name: 'Quay' } })).toBe(false);
    expect(parse({ role: 'owner' })).toBe(false);
    expect(parse({ role: 'referee' })).toBe(true);
  });

  it('cannot name the teams or the shop of another league', async () => {
    const league = await makeStaffedLeague();
    const other = await makeStaffedLeague();
    await expect(
      invite(league, { email: 'x@club.example', role: 'team manager', teamIds: [idOf(other, 'Otters')] }),
    ).rejects.toMatchObject({ code: 'not-found' });
    await invite(other, {
      email: 'y@club.example',
      role: 'decorator',
      shop: { kind: 'new', name: 'Elsewhere' },
    });
    const [foreign] = (await readPeople(other)).shops;
    await expect(
      invite(league, {
        email: 'x@club.example',
        role: 'decorator',
        shop: { kind: 'existing', id: foreign?.id ?? '' },
      }),
    ).rejects.toMatchObject({ code: 'not-found' });
    const [waiting] = (await readPeople(other)).invitations;
    const admin = await league.actAs(league.admin);
    for (const act of [resendInvitation, revokeInvitation]) {
      expect(await settle(act(admin, { invitationId: waiting?.id ?? '' }))).toBe('not-found');
    }
  });

  it('is for league admins to send', async () => {
    const league = await makeStaffedLeague();
    const manager = await makePerson();
    await league.give(manager, 'team manager', { teamIds: [idOf(league, 'Otters')] });
    const ctx = await league.actAs(manager);
    const input = invitePersonSchema.parse({ email: 'z@club.example', role: 'league admin' });
    expect(await settle(invitePerson(ctx, input))).toBe('forbidden');
    expect(await settle(listPeople(ctx))).toBe('forbidden');
  });
});
