import type { DivisionFields } from '@/db/queries/divisions';
import { listDivisionViews, type DivisionView } from '@/db/queries/division-view';
import { enqueueJob } from '@/db/queries/jobs';
import { listRuleSets } from '@/db/queries/rule-sets';
import { listSeasons } from '@/db/queries/season-view';
import type { LeagueTx } from '@/db/tenant';
import { listSeasonFaults } from '@/lib/domain/dates/list-season-faults';
import { toInstant } from '@/lib/domain/dates/zone';
import { AppError, notFound } from '@/lib/platform/errors';
import type { ActorContext } from './context';

type Input = Omit<DivisionFields, 'freezesAt'> & { freezesAt: string | null };

/**
 * The fields of a division as they are stored, once its rule set is known to belong to the league, no other division
 * of the season (but `ownId`) has its name, and a freeze of its own lies between the season's days.
 */
export async function readDivisionFields(
  tx: LeagueTx,
  ctx: ActorContext,
  input: Input,
  place: { seasonId: string; ownId: string | null },
): Promise<{ fields: DivisionFields; others: DivisionView[] }> {
  if (!(await listRuleSets(tx)).some((ruleSet) => ruleSet.id === input.ruleSetId)) throw notFound('rule set');
  const others = (await listDivisionViews(tx, place.seasonId)).filter(
    (division) => division.id !== place.ownId,
  );
  if (others.some((division) => division.name.toLowerCase() === input.name.toLowerCase())) {
    const message = `This season has a division called ${input.name} already. Choose another name.`;
    throw new AppError('conflict', message, { fields: { 'fields.name': message } });
  }
  const season = (await listSeasons(tx)).find((entry) => entry.id === place.seasonId);
  if (!season) throw notFound('season');
  if (input.freezesAt !== null) {
    const { freezeOn, handOutOn } = listSeasonFaults({ ...season, freezeOn: input.freezesAt.slice(0, 10) });
    const message = freezeOn ?? (handOutOn && 'A division freezes at least a day before the hand-out day.');
    if (message !== undefined)
      throw new AppError('invalid', message, { fields: { 'fields.freezesAt': message } });
  }
  const freezesAt = input.freezesAt === null ? null : toInstant(input.freezesAt, ctx.league.timeZone).instant;
  const { name, ageBand, level, ruleSetId, leastPlayers, mostPlayers } = input;
  return { fields: { name, ageBand, level, ruleSetId, leastPlayers, mostPlayers, freezesAt }, others };
}

/**
 * Puts a division's own freeze on the worker's calendar. Without one the season's counts, which stands there already but
 * may have passed while the division had a later one: then the worker looks at once.
 */
export async function scheduleOwnFreeze(
  tx: LeagueTx,
  division: { id: string; seasonId: string; freezesAt: Date | null },
): Promise<void> {
  await enqueueJob(
    tx,
    { task: 'freeze-rosters', payload: { leagueId: tx.leagueId, seasonId: division.seasonId } },
    { key: `freeze:${division.seasonId}:${division.id}`, runAt: division.freezesAt },
  );
}
