import type { z } from 'zod';
import { insertAuditEvent } from '@/db/queries/audit';
import { findLeagueSettings, updateLeague } from '@/db/queries/leagues';
import { withLeague } from '@/db/tenant';
import { listDifferences } from '@/lib/domain/audit/event';
import { AppError, notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';
import type { changeLeagueSchema } from './league-schemas';

/** Changes the league's settings, unless somebody else has since they were opened. Instants stay; clocks may not. */
export async function changeLeagueSettings(
  ctx: ActorContext,
  input: z.output<typeof changeLeagueSchema>,
): Promise<{ rowVersion: number }> {
  assertCan(ctx.actor, 'league.settings');
  return withLeague(ctx.league.id, async (tx) => {
    const before = await findLeagueSettings(tx);
    if (!before) throw notFound('league');
    const { rowVersion, ...fields } = input;
    const { rowVersion: stored, ...old } = before;
    const stale = new AppError(
      'conflict',
      'Somebody else changed these settings after you opened them. Nothing was saved: look at theirs, then save yours again.',
    );
    if (stored !== rowVersion) throw stale;
    const changes = listDifferences(old, fields);
    if (changes === null) return { rowVersion };
    if (!(await updateLeague(tx, input))) throw stale;
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      { type: 'league changed', subjectId: ctx.league.id, data: { changes } },
    );
    return { rowVersion: rowVersion + 1 };
  });
}
