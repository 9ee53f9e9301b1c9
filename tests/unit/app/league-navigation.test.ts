import { describe, expect, it } from 'vitest';
import {
  findSameSubject,
  listLeagueNavigation,
  listPhoneTabs,
} from '@/app/[league]/_components/league-navigation';
import { listAbilities, type Role } from '@/lib/domain/access/permissions';

const factsOf = (role: Role, season: string | null = 'spring') => ({
  league: 'tern',
  season,
  abilities: listAbilities({
    userId: 'u',
    name: 'n',
    leagueId: 'l',
    roles: [role],
    teamIds: role === 'team manager' ? ['t'] : [],
    shopIds: role === 'decorator' ? ['s'] : [],
  }),
});
const linesOf = (role: Role, season: string | null = 'spring') =>
  listLeagueNavigation(factsOf(role, season)).flatMap((group) => group.items.map((item) => item.label));

describe('the side panel', () => {
  it('shows each role the pages it may open and no others', () => {
    expect(linesOf('league admin')).toEqual([
      'Readiness',
      'Dates',
      'Number rules',
      'Divisions',
      'Teams',
      'Rosters',
      'Batches',
      'Match check',
      'Seasons',
      'People',
      'History',
      'Settings',
    ]);
    expect(linesOf('team manager')).toEqual([
      'Readiness',
      'Dates',
      'Number rules',
      'Divisions',
      'Teams',
      'Rosters',
      'Match check',
    ]);
    expect(linesOf('referee')).toEqual(['Number rules', 'Divisions', 'Teams', 'Match check']);
    expect(linesOf('decorator')).toEqual(['Batches']);
  });

  it('leads a decorator to the shop’s batches and an admin to the league’s', () => {
    const hrefOf = (role: Role) =>
      listLeagueNavigation(factsOf(role))
        .flatMap((group) => group.items)
        .find((item) => item.label === 'Batches')?.href;
    expect(hrefOf('decorator')).toBe('/shop');
    expect(hrefOf('league admin')).toBe('/tern/spring/batches');
  });

  it('keeps to pages of the league before the first season', () => {
    expect(linesOf('league admin', null)).toEqual([
      'Number rules',
      'Seasons',
      'People',
      'History',
      'Settings',
    ]);
  });
});

describe('the tabs of a phone', () => {
  it('are at most four, and none for a reader with one page', () => {
    expect(listPhoneTabs(factsOf('league admin')).map((tab) => tab.label)).toEqual([
      'Readiness',
      'Rosters',
      'Teams',
      'Batches',
    ]);
    expect(listPhoneTabs(factsOf('decorator'))).toEqual([]);
  });
});

describe('a change of season', () => {
  const to = factsOf('league admin', 'autumn');
  it('keeps the subject and leaves what is only in the old season', () => {
    expect(findSameSubject('/tern/spring/teams', 'spring', to)).toBe('/tern/autumn/teams');
    expect(findSameSubject('/tern/spring/teams/otters', 'spring', to)).toBe('/tern/autumn/teams');
  });

  it('starts at the first page from a page of the whole league', () => {
    expect(findSameSubject('/tern/people', null, to)).toBe('/tern/autumn/readiness');
    expect(findSameSubject('/tern/spring/nonsense', 'spring', to)).toBe('/tern/autumn/readiness');
  });

  it('leads nobody to a subject their role does not include', () => {
    expect(findSameSubject('/tern/spring/batches', 'spring', factsOf('referee', 'autumn'))).toBe(
      '/tern/number-rules',
    );
  });
});
