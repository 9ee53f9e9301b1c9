import type { TeamKits } from '../kit/kit';
import type { Garment, Player } from '../roster/player';
import { assignBagCodes } from './bag-code';
import type { BatchSnapshot } from './batch-snapshot';

type Entry = {
  team: { id: string; name: string; slug: string; kits: TeamKits };
  division: { name: string; position: number; garments: readonly Garment[] };
  players: readonly Player[];
};

/**
 * Everything a decorator needs of a batch, in a fixed order: teams by division then name, players by their place.
 * `hashOf` gives 32 bytes for a text; bag codes come from it, so the same batch always has the same codes. Contacts,
 * notes and cells that were mapped to nothing stay behind.
 */
export function makeSnapshot(input: {
  batch: BatchSnapshot['batch'] & { id: string };
  entries: readonly Entry[];
  hashOf: (text: string) => Uint8Array;
}): BatchSnapshot {
  const { id: batchId, ...batch } = input.batch;
  const entries = [...input.entries].sort(
    (a, b) =>
      a.division.position - b.division.position ||
      compareText(a.division.name, b.division.name) ||
      compareText(a.team.name, b.team.name),
  );
  const playerIds = entries.flatMap((entry) => entry.players.map((player) => player.id));
  const bagCodes = assignBagCodes(playerIds, (text) => input.hashOf(`${batchId}/${text}`));
  return {
    format: 'raglan-batch',
    formatVersion: 1,
    batch,
    teams: entries.map(({ team, division, players }) => ({
      id: team.id,
      name: team.name,
      slug: team.slug,
      division: division.name,
      kits: team.kits,
      garments: [...division.garments],
      players: [...players]
        .sort((a, b) => a.position - b.position || compareText(a.id, b.id))
        .map((player) => ({
          id: player.id,
          bagCode: bagCodes.get(player.id) ?? '',
          name: player.name,
          nameOnBack: player.nameOnBack,
          number: player.number,
          role: player.role,
          sizes: player.sizes,
        })),
    })),
  };
}

// By code unit, not by a locale: the order must be the same on every machine.
const compareText = (a: string, b: string): number => (a < b ? -1 : a > b ? 1 : 0);
