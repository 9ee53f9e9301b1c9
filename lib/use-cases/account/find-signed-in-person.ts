import { findPerson } from '@/db/queries/people';
import { withUser } from '@/db/tenant';
import type { Person } from '@/lib/domain/league/league';

/** The person a session belongs to; undefined when the account is gone or its sessions have been ended. */
export function findSignedInPerson(session: {
  userId: string;
  sessionVersion: number;
}): Promise<Person | undefined> {
  return withUser(session.userId, (tx) => findPerson(tx, session.userId, session.sessionVersion));
}
