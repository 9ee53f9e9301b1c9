import { capitalise } from '../text/sentence';
import { roles, type Role } from './permissions';

/** What somebody is in a league, in one line: "League admin, referee"; roles stand in the order of the table. */
export function describeRoles(held: readonly Role[]): string {
  const line = roles.filter((role) => held.includes(role)).join(', ');
  return capitalise(line);
}
