import type { Garment } from '@/lib/domain/roster/player';
import type { LeagueTx } from '../tenant';

/** Makes these the garments of a division, in this order; rosters keep sizes of garments that are no longer there. */
export async function replaceGarments(
  tx: LeagueTx,
  divisionId: string,
  garments: readonly Garment[],
  newId: () => string,
): Promise<void> {
  await tx
    .deleteFrom('garments')
    .where('league_id', '=', tx.leagueId)
    .where('division_id', '=', divisionId)
    .execute();
  if (garments.length === 0) return;
  await tx
    .insertInto('garments')
    .values(
      garments.map((garment, position) => ({
        league_id: tx.leagueId,
        id: newId(),
        division_id: divisionId,
        code: garment.code,
        name: garment.name,
        worn: garment.worn,
        numbered: garment.numbered,
        named: garment.named,
        sizes: JSON.stringify(garment.sizes),
        position,
      })),
    )
    .execute();
}
