import type { BatchSnapshot, SnapshotPlayer, SnapshotTeam } from '../batch/batch-snapshot';
import { kitKinds, type Kit, type KitKind } from '../kit/kit';
import type { Garment } from '../roster/player';

/** One garment for one player in one kit: what is pulled, pressed, checked and bagged as a unit. */
export type Piece = {
  team: SnapshotTeam;
  player: SnapshotPlayer;
  garment: Garment;
  kitKind: KitKind;
  kit: Kit;
  /** The size code, `''` when the player gave none. */
  size: string;
  /** The size in words, `no size` when the player gave none; a size that is not in the run stands as it was typed. */
  sizeLabel: string;
  /** The number to apply, `''` for a garment without one and for a player without one. */
  number: string;
  /** The name to apply, `''` for a garment without one and for a player without one. */
  nameOnBack: string;
};

export const noSize = 'no size';

/**
 * The kits a garment is made in for a team. A garment worn home and away is made once for each kit; a team without an
 * away kit gets its home pieces only, and nothing of a garment that is worn away only.
 */
export function listKitsOfGarment(team: SnapshotTeam, garment: Garment): { kind: KitKind; kit: Kit }[] {
  return kitKinds.flatMap((kind) => {
    const kit = team.kits[kind];
    const worn = garment.worn === 'home and away' || garment.worn === kind;
    return worn && kit ? [{ kind, kit }] : [];
  });
}

/** A player's size of a garment as code and words; both say so when there is none. */
export function findSize(player: SnapshotPlayer, garment: Garment): { size: string; sizeLabel: string } {
  // A garment may be called anything, `constructor` too.
  const own = Object.hasOwn(player.sizes, garment.code) ? player.sizes[garment.code] : undefined;
  const size = (own ?? '').trim();
  if (size === '') return { size, sizeLabel: noSize };
  return { size, sizeLabel: garment.sizes.find((entry) => entry.code === size)?.label ?? size };
}

/**
 * Every piece of a batch in a fixed order: teams and players as in the snapshot, garments as in the team's kit, home
 * before away. A player without a size or number has pieces all the same, so that nobody is left out of a count.
 */
export function listPieces(snapshot: BatchSnapshot): Piece[] {
  return snapshot.teams.flatMap((team) => team.players.flatMap((player) => listPlayerPieces(team, player)));
}

/** The pieces of one player, in the same order. */
export function listPlayerPieces(team: SnapshotTeam, player: SnapshotPlayer): Piece[] {
  return team.garments.flatMap((garment) =>
    listKitsOfGarment(team, garment).map(({ kind, kit }) => ({
      team,
      player,
      garment,
      kitKind: kind,
      kit,
      ...findSize(player, garment),
      number: garment.numbered ? player.number.trim() : '',
      nameOnBack: garment.named ? player.nameOnBack.trim() : '',
    })),
  );
}
