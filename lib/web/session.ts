import 'server-only';
import { getServerSession } from 'next-auth';
import { notFound, redirect } from 'next/navigation';
import { cache } from 'react';
import type { Person } from '@/lib/domain/league/league';
import { AppError, notFound as noSuch } from '@/lib/platform/errors';
import type { ActorContext, PersonContext } from '@/lib/use-cases/context';
import { findSignedInPerson } from '@/lib/use-cases/account/find-signed-in-person';
import { getAuthOptions } from './auth-options';
import { paths } from './paths';
import { readRequestContext } from './request';

const idPattern = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/;

/** The person of this request, read from the database once per request; undefined when nobody is signed in. */
export const findPersonOfRequest = cache(async (): Promise<Person | undefined> => {
  const session = await getServerSession(getAuthOptions());
  if (!session || !idPattern.test(session.userId)) return undefined;
  return findSignedInPerson({ userId: session.userId, sessionVersion: session.sessionVersion });
});

/** For pages: the signed-in person, or a redirect to sign in and come back to `next`. */
export async function requirePerson(next: string): Promise<{ person: Person; ctx: PersonContext }> {
  const person = await findPersonOfRequest();
  if (!person) redirect(paths.signIn(next));
  return { person, ctx: { ...(await readRequestContext()), userId: person.userId } };
}

/** For pages of a league: its context for this person; a league of others shows the same 404 as none at all. */
export async function requireLeague(
  slug: string,
  next: string,
): Promise<{ person: Person; ctx: ActorContext }> {
  const { person, ctx } = await requirePerson(next);
  const found = person.leagues.find((entry) => entry.league.slug === slug);
  if (!found) notFound();
  return { person, ctx: { ...ctx, ...found } };
}

/** For actions and routes: the signed-in person's context, or a `signed-out` error. */
export async function getPersonContext(): Promise<{ person: Person; ctx: PersonContext }> {
  const person = await findPersonOfRequest();
  if (!person) {
    throw new AppError(
      'signed-out',
      'Your session has ended. Sign in again in another tab; what you typed stays here.',
    );
  }
  return { person, ctx: { ...(await readRequestContext()), userId: person.userId } };
}

/** For actions and routes of a league: its context for this person, or `signed-out` or `not-found`. */
export async function getLeagueContext(slug: string): Promise<ActorContext> {
  const { person, ctx } = await getPersonContext();
  const found = person.leagues.find((entry) => entry.league.slug === slug);
  if (!found) throw noSuch('league');
  return { ...ctx, ...found };
}
