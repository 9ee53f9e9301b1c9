/** Words that are pages already, so that no league or season can hide them. */
const reserved = new Set([
  'api',
  'check',
  'sign-in',
  'sign-out',
  'sign-up',
  'join',
  'reset',
  'leagues',
  'account',
  'inbox',
  'match',
  'shop',
  'new',
  'people',
  'history',
  'seasons',
  'number-rules',
  'settings',
  'readiness',
  'family',
  'samples',
  'fonts',
  'icon',
  'health',
]);

/**
 * A name as it stands in an address: lower-case ASCII letters, digits and single hyphens, at most 60 characters.
 * Accents are dropped; a name with no Latin letter or digit becomes `fallback`; a reserved word gets `-1`.
 */
export function makeSlug(name: string, fallback: string): string {
  const plain = name
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .slice(0, 60)
    .replace(/^-+|-+$/g, '');
  const slug = plain === '' ? fallback : plain;
  return reserved.has(slug) ? `${slug}-1` : slug;
}

/** The first of `slug`, `slug-2`, `slug-3`… that is not taken. */
export function makeUniqueSlug(name: string, fallback: string, taken: ReadonlySet<string>): string {
  const base = makeSlug(name, fallback);
  for (let n = 1; ; n += 1) {
    const slug = n === 1 ? base : `${base}-${n}`;
    if (!taken.has(slug)) return slug;
  }
}
