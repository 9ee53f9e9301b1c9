import { describe, expect, it } from 'vitest';
import { insertAuditEvent } from '@/db/queries/audit';
import { lockSeason } from '@/db/queries/divisions';
import { lockCurrentSeason } from '@/db/queries/seasons';
import { withLeague } from '@/db/tenant';
import { buildWorld } from '../../factories/league';

/** A door that one side opens and the other waits at. */
function makeDoor() {
  let open: () => void = () => undefined;
  const opened = new Promise<void>((resolve) => {
    open = resolve;
  });
  return { open, opened };
}

describe('locks', () => {
  it('let two people change one season in opposite order: the history’s reference to the league waits for nobody', async () => {
    const [world] = await buildWorld();
    const { id } = world.league;
    const [seasonIsHeld, leagueIsHeld] = [makeDoor(), makeDoor()];
    const adding = withLeague(id, async (tx) => {
      await lockSeason(tx, world.season.id);
      seasonIsHeld.open();
      await leagueIsHeld.opened;
      await insertAuditEvent(
        tx,
        { ...world.admin, userId: world.admin.actor.userId },
        { type: 'shop added', subjectId: world.shop.id, data: { name: 'Quay Street press room' } },
      );
    });
    const changing = withLeague(id, async (tx) => {
      await seasonIsHeld.opened;
      await lockCurrentSeason(tx);
      leagueIsHeld.open();
      await lockSeason(tx, world.season.id);
    });
    await expect(Promise.all([adding, changing])).resolves.toBeDefined();
  });
});
