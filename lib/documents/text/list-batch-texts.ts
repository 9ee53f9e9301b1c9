import type { BatchSnapshot, SnapshotTeam } from '@/lib/domain/batch/batch-snapshot';

/** Every text of a batch that a document may print: what its fonts must be able to draw. */
export function listBatchTexts(snapshot: BatchSnapshot): string[] {
  const { code, league, season, shop } = snapshot.batch;
  return [code, league, season, shop, ...snapshot.teams.flatMap(listTeamTexts)];
}

const listTeamTexts = (team: SnapshotTeam): string[] => [
  team.name,
  team.division,
  team.kits.home.name,
  team.kits.away?.name ?? '',
  ...team.garments.flatMap((garment) => [
    garment.name,
    ...garment.sizes.flatMap((size) => [size.code, size.label]),
  ]),
  ...team.players.flatMap((player) => [
    player.bagCode,
    player.name,
    player.nameOnBack,
    player.number,
    ...Object.values(player.sizes),
  ]),
];
