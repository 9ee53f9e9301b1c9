import { findLeagueSettings } from '@/db/queries/leagues';
import { withLeague } from '@/db/tenant';
import { notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';

/** The league's settings, with the row version that a change must name. */
export async function getLeagueSettings(ctx: ActorContext) {
  assertCan(ctx.actor, 'league.settings');
  const settings = await withLeague(ctx.league.id, findLeagueSettings);
  if (!settings) throw notFound('league');
  return settings;
}
