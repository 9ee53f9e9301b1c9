import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Role } from '@/lib/domain/access/permissions';
import { chooseHome, readNext } from '@/lib/domain/league/home';
import type { Person } from '@/lib/domain/league/league';

const belong = (
  slug: string,
  roles: Role[],
  season: string | null = 'spring',
): Person['leagues'][number] => ({
  league: {
    id: slug,
    slug,
    name: slug,
    timeZone: 'Europe/London',
    unit: 'mm',
    paper: 'A4',
    currency: 'GBP',
    currentSeason: season === null ? null : { id: season, slug: season, name: season },
  },
  actor: { userId: 'u', name: 'n', leagueId: slug, roles, teamIds: [], shopIds: [] },
});
const home = (...leagues: Person['leagues']) => chooseHome({ leagues });

describe('where a person starts', () => {
  it('is the readiness of the one league they run or fill rosters for', () => {
    const readiness = { page: 'readiness', league: 'tern', season: 'spring' };
    expect(home(belong('tern', ['league admin']))).toEqual(readiness);
    expect(home(belong('tern', ['team manager']))).toEqual(readiness);
    expect(home(belong('tern', ['referee', 'team manager']))).toEqual(readiness);
  });

  it('is the shop for somebody who only decorates, over however many leagues', () => {
    expect(home(belong('tern', ['decorator']))).toEqual({ page: 'shop' });
    expect(home(belong('tern', ['decorator']), belong('pell', ['decorator']))).toEqual({ page: 'shop' });
  });

  it('is match check for somebody who only referees', () => {
    expect(home(belong('tern', ['referee']), belong('pell', ['referee']))).toEqual({ page: 'match' });
  });

  it('is the list of leagues for everybody else', () => {
    expect(home()).toEqual({ page: 'leagues' });
    expect(home(belong('tern', ['league admin']), belong('pell', ['referee']))).toEqual({ page: 'leagues' });
    expect(home(belong('tern', ['decorator', 'referee']))).toEqual({ page: 'leagues' });
    expect(home(belong('tern', ['league admin'], null))).toEqual({ page: 'leagues' });
  });
});

describe('the address to go on to after signing in', () => {
  it.each(['/tern/spring/rosters/otters?view=all#row-3', '/leagues', '/', '/signing/in'])(
    'takes %s',
    (next) => expect(readNext(next)).toBe(next),
  );

  it.each([
    undefined,
    ['/a', '/b'],
    '',
    'leagues',
    'https://elsewhere.example/',
    '//elsewhere.example/',
    '/\\elsewhere.example',
    '\\\\elsewhere.example',
    '/\t/elsewhere.example',
    '/a\r\nSet-Cookie: x=1',
    'javascript:alert(1)',
    '/..//elsewhere.example',
    '/api/auth/signout',
    '/sign-in?next=/sign-in',
    `/${'a'.repeat(3000)}`,
  ])('refuses %j', (next) => expect(readNext(next)).toBeNull());

  it('never leaves the product, whatever is asked for', () => {
    const piece = fc.constantFrom(
      '/',
      '\\',
      '.',
      '..',
      ':',
      '@',
      '#',
      '?',
      '%2f',
      '%5c',
      '\t',
      'x',
      'e.example',
      'http:',
    );
    fc.assert(
      fc.property(fc.array(piece, { maxLength: 12 }), (pieces) => {
        const next = readNext(pieces.join(''));
        if (next === null) return;
        expect(new URL(next, 'https://raglan.example').origin).toBe('https://raglan.example');
      }),
      { numRuns: 2000 },
    );
  });
});
