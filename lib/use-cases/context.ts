import { can, type AccessScope, type LeagueActor, type Permission } from '@/lib/domain/access/permissions';
import type { LeagueSummary } from '@/lib/domain/league/league';
import { AppError, notFound } from '@/lib/platform/errors';

/** What no use case may read for itself: the time, new ids, and the request it belongs to. */
export type RequestContext = { now: Date; requestId: string; newId: () => string };

/** A request of one person in one league. */
export type ActorContext = RequestContext & { actor: LeagueActor; league: LeagueSummary };

/** A request of one person outside any league: the account itself, or a decorator's list over leagues. */
export type PersonContext = RequestContext & { userId: string };

/**
 * Ends the use case unless the actor holds the permission. Somebody who holds it for other teams or shops, or not at
 * all for a thing they may not even see, gets the same answer as for a thing that does not exist.
 */
export function assertCan(
  actor: LeagueActor,
  permission: Permission,
  scope: AccessScope & { what?: string } = {},
): void {
  if (can(actor, permission, scope)) return;
  if (scope.teamId !== undefined || scope.shopId !== undefined) throw notFound(scope.what ?? 'page');
  throw new AppError('forbidden', 'Your role in this league does not include this. Ask a league admin.');
}
