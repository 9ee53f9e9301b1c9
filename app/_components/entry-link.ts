import { paths } from '@/lib/web/paths';
import { findPersonOfRequest } from '@/lib/web/session';

/** The way in from a public page: to sign in, or for somebody who has, to their leagues. */
export async function findEntryLink(): Promise<{ href: string; label: string }> {
  return (await findPersonOfRequest()) === undefined
    ? { href: paths.signIn(), label: 'Sign in' }
    : { href: paths.leagues(), label: 'Your leagues' };
}
