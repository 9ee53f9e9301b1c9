import { insertAuditEvent } from '@/db/queries/audit';
import { freezeRosters, listShopAddresses, lockBatchRosters, updateBatchState } from '@/db/queries/batches';
import { insertBundle } from '@/db/queries/bundles';
import { listDivisionViews } from '@/db/queries/division-view';
import { enqueueJob, queueEmail } from '@/db/queries/jobs';
import { listSeasons } from '@/db/queries/season-view';
import { listPlayersByRoster, listTeamViews } from '@/db/queries/team-view';
import { withLeague } from '@/db/tenant';
import { batchSnapshotSchema } from '@/lib/domain/batch/batch-snapshot';
import { writeCanonicalJson } from '@/lib/domain/batch/canonical-json';
import { makeSnapshot } from '@/lib/domain/batch/make-snapshot';
import { checkRoster } from '@/lib/domain/rules/check-roster';
import { AppError } from '@/lib/platform/errors';
import { sha256, sha256Bytes } from '@/lib/platform/ids';
import { lockHeldBatch } from '../batch-guards';
import { assertCan, type ActorContext } from '../context';
import { links } from '../links';

/**
 * Releases a held batch: freezes its rosters, keeps everything the shop needs as one unchangeable snapshot, queues
 * the bundle and tells the shop. Nothing of it happens unless all of it does.
 */
export async function releaseBatch(ctx: ActorContext, input: { batchId: string }): Promise<{ code: string }> {
  assertCan(ctx.actor, 'batch.make');
  return withLeague(ctx.league.id, async (tx) => {
    const batch = await lockHeldBatch(tx, input.batchId);
    const held = await lockBatchRosters(tx, batch.id);
    if (held.length === 0)
      throw new AppError('conflict', `Batch ${batch.code} has no teams. Add one, or discard it.`);
    const teams = await listTeamViews(
      tx,
      batch.seasonId,
      held.map((roster) => roster.teamId),
    );
    const divisions = await listDivisionViews(tx, batch.seasonId);
    const players = await listPlayersByRoster(
      tx,
      teams.map((team) => team.roster.id),
    );
    const season = (await listSeasons(tx)).find((entry) => entry.id === batch.seasonId);

    const entries = teams.map((team) => {
      const division = divisions.find((entry) => entry.id === team.divisionId);
      if (!division || !season) throw new Error('a team without its division or season');
      return { team, division, players: players.get(team.roster.id) ?? [] };
    });
    const problems = entries.flatMap(({ team, division, players: list }) => {
      if (team.roster.state !== 'signed off' && team.roster.state !== 'frozen')
        return [`${team.name} is ${team.roster.state}`];
      // Rules may have changed since the sign-off; what is pressed must pass the ones in force now.
      if (division.rules === null) return [`${division.name} has no number rules in force`];
      const { blockers } = checkRoster(division.rules.ruleSet, list, division.garments).summary;
      return blockers > 0
        ? [
            `${team.name} has ${blockers} ${blockers === 1 ? 'blocker' : 'blockers'} under the rules now in force`,
          ]
        : [];
    });
    if (problems.length > 0)
      throw new AppError(
        'conflict',
        `${problems.join('; ')}. Take them out of the batch, or put them right first.`,
      );

    const snapshot = batchSnapshotSchema.parse(
      makeSnapshot({
        batch: {
          id: batch.id,
          code: batch.code,
          league: ctx.league.name,
          season: season?.name ?? '',
          shop: batch.shop.name,
          promisedOn: batch.promisedOn,
          releasedAt: ctx.now.toISOString(),
          timeZone: ctx.league.timeZone,
          paper: ctx.league.paper,
        },
        entries: entries.map(({ team, division, players: list }) => ({ team, division, players: list })),
        hashOf: sha256Bytes,
      }),
    );
    const snapshotJson = writeCanonicalJson(snapshot);
    const digest = sha256(snapshotJson);

    await freezeRosters(
      tx,
      held.map((roster) => roster.rosterId),
      ctx.now,
    );
    await updateBatchState(tx, {
      batchId: batch.id,
      eventId: ctx.newId(),
      state: 'released',
      now: ctx.now,
      userId: ctx.actor.userId,
      note: '',
      release: { snapshotJson, sha256: digest },
    });
    await insertBundle(tx, { id: ctx.newId(), batchId: batch.id, now: ctx.now });
    await enqueueJob(
      tx,
      { task: 'build-bundle', payload: { leagueId: ctx.league.id, batchId: batch.id } },
      { key: `bundle:${batch.id}`, runAt: null },
    );

    const stamp = { ...ctx, userId: ctx.actor.userId };
    for (const { team } of entries.filter((entry) => entry.team.roster.state === 'signed off')) {
      await insertAuditEvent(tx, stamp, {
        type: 'roster frozen',
        subjectId: team.roster.id,
        data: { team: team.name, because: 'batch' },
      });
    }
    const count = snapshot.teams.reduce((sum, team) => sum + team.players.length, 0);
    await insertAuditEvent(tx, stamp, {
      type: 'batch released',
      subjectId: batch.id,
      data: { code: batch.code, teams: teams.length, players: count, sha256: digest },
    });
    const link = links.shopBatch(ctx.league.slug, batch.code);
    for (const { email } of await listShopAddresses(tx, batch.shop.id)) {
      const params = { league: ctx.league.name, batch: batch.code, teams: String(teams.length), link };
      await queueEmail(tx, ctx, email, { template: 'batch-released', params });
    }
    return { code: batch.code };
  });
}
