import type { Role } from '../access/permissions';
import type { Person } from './league';

/** Where a person starts after signing in. */
export type Home =
  { page: 'readiness'; league: string; season: string } | { page: 'leagues' | 'shop' | 'match' };

/**
 * The page a person most likely came for: of one league its readiness for whoever fills rosters or waits for them, the
 * shop for somebody who only decorates, match check for somebody who only referees, and the list of leagues for all
 * others (several leagues, several kinds of work, no league, or a league without a season).
 */
export function chooseHome(person: Pick<Person, 'leagues'>): Home {
  const held = new Set(person.leagues.flatMap((entry) => entry.actor.roles));
  const only = (role: Role) => held.size === 1 && held.has(role);
  if (only('decorator')) return { page: 'shop' };
  if (only('referee')) return { page: 'match' };
  const [first, ...more] = person.leagues;
  const season = first?.league.currentSeason;
  if (!first || !season || more.length > 0) return { page: 'leagues' };
  const plans = held.has('league admin') || held.has('team manager');
  return plans ? { page: 'readiness', league: first.league.slug, season: season.slug } : { page: 'leagues' };
}

/**
 * The address to go on to after signing in, if it is a page of this product; null for anything else. A link in a
 * stranger's mail must not use our sign-in to send people elsewhere: `//host`, `/\host`, other schemes, control
 * characters and the API are all refused, and so is the sign-in page itself.
 */
export function readNext(next: unknown): string | null {
  if (typeof next !== 'string' || next.length > 2000) return null;
  if (!next.startsWith('/') || /[\\\p{Cc}]/u.test(next)) return null;
  const base = 'http://product.invalid';
  if (!URL.canParse(next, base)) return null;
  const url = new URL(next, base);
  if (url.origin !== base || /^\/(api|sign-in)(\/|$)/.test(url.pathname) || url.pathname.startsWith('//'))
    return null;
  return url.pathname + url.search + url.hash;
}
