import { randomUUID } from 'node:crypto';
import { withLeague } from '@/db/tenant';
import type { Role } from '@/lib/domain/access/permissions';
import { findSignedInPerson } from '@/lib/use-cases/account/find-signed-in-person';
import type { ActorContext } from '@/lib/use-cases/context';
import { queryAsAdmin } from '../support/database';
import { makePerson, makeRequest, type MadePerson } from './people';

const kit = { name: 'navy', body: '#14375e', sleeves: '#14375e', number: '#ffffff', outline: null };
let count = 0;

export type StaffedLeague = {
  id: string;
  slug: string;
  name: string;
  admin: MadePerson;
  teams: { id: string; name: string }[];
  /** What a person is in the league at this moment, as each request finds it out. */
  actAs: (person: MadePerson) => Promise<ActorContext>;
  /** Gives a person a role by the back door. */
  give: (person: MadePerson, role: Role, more?: { teamIds?: string[]; shopId?: string }) => Promise<string>;
};

/** A league with one admin, a season, a division and the teams named. */
export async function makeStaffedLeague(
  teamNames: string[] = ['Otters', 'Herons', 'Egrets'],
): Promise<StaffedLeague> {
  count += 1;
  const id = randomUUID();
  const slug = `league-${count}-${id.slice(0, 4)}`;
  const name = `League ${count}`;
  const { now } = makeRequest();
  const admin = await makePerson({ name: `Admin ${count}` });
  const [seasonId, ruleSetId, divisionId] = [randomUUID(), randomUUID(), randomUUID()];
  const teams = teamNames.map((team) => ({ id: randomUUID(), name: team }));

  const give: StaffedLeague['give'] = async (person, role, more = {}) => {
    const membershipId = randomUUID();
    await withLeague(id, async (tx) => {
      await tx
        .insertInto('memberships')
        .values({
          league_id: id,
          id: membershipId,
          user_id: person.id,
          role,
          shop_id: more.shopId ?? null,
          created_at: now,
        })
        .execute();
      for (const teamId of more.teamIds ?? []) {
        await tx
          .insertInto('membership_teams')
          .values({ league_id: id, membership_id: membershipId, team_id: teamId })
          .execute();
      }
    });
    return membershipId;
  };

  await withLeague(id, async (tx) => {
    const own = { league_id: id, created_at: now };
    await tx
      .insertInto('leagues')
      .values({
        id,
        slug,
        name,
        time_zone: 'Europe/London',
        unit: 'mm',
        paper: 'A4',
        currency: 'GBP',
        created_at: now,
      })
      .execute();
    await tx
      .insertInto('seasons')
      .values({
        ...own,
        id: seasonId,
        slug: 'spring',
        name: 'Spring',
        sport: 'basketball',
        roster_opens_on: '2027-03-01',
        freezes_at: new Date('2027-04-01T17:00:00Z'),
        hand_out_on: '2027-04-20',
        first_match_on: '2027-04-24',
      })
      .execute();
    await tx.updateTable('leagues').set({ current_season_id: seasonId }).where('id', '=', id).execute();
    await tx
      .insertInto('rule_sets')
      .values({ ...own, id: ruleSetId, name: 'Rules' })
      .execute();
    await tx
      .insertInto('divisions')
      .values({
        ...own,
        id: divisionId,
        season_id: seasonId,
        slug: 'under-12',
        name: 'Under 12',
        rule_set_id: ruleSetId,
        least_players: 5,
        most_players: 15,
        position: 0,
      })
      .execute();
    for (const team of teams) {
      await tx
        .insertInto('teams')
        .values({
          ...own,
          id: team.id,
          season_id: seasonId,
          division_id: divisionId,
          slug: team.name.toLowerCase(),
          name: team.name,
          home_kit: JSON.stringify(kit),
        })
        .execute();
    }
  });
  await give(admin, 'league admin');

  const actAs = async (person: MadePerson): Promise<ActorContext> => {
    const [row] = await queryAsAdmin<{ session_version: number }>(
      'select session_version from users where id = $1',
      [person.id],
    );
    const found = await findSignedInPerson({ userId: person.id, sessionVersion: row?.session_version ?? 0 });
    const entry = found?.leagues.find((league) => league.league.id === id);
    if (!entry) throw new Error(`${person.name} does not belong to ${name}`);
    return { ...makeRequest(), ...entry };
  };
  return { id, slug, name, admin, teams, actAs, give };
}
