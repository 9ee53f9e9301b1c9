import type { BatchSnapshot, SnapshotPlayer, SnapshotTeam } from '../batch/batch-snapshot';
import { findSize } from './list-pieces';

/**
 * Sentences about everything in a batch that a shop would stumble over: no size, a size outside the run or for a
 * garment the team has not, no number where one belongs, a missing away kit. In the order of the batch; empty when
 * there is nothing to say. A player is named by bag code and number, not by name.
 */
export function listPackingNotes(snapshot: BatchSnapshot): string[] {
  return snapshot.teams.flatMap((team) => [
    ...listKitNotes(team),
    ...team.players.flatMap((player) => listPlayerNotes(team, player)),
  ]);
}

function listKitNotes(team: SnapshotTeam): string[] {
  if (team.kits.away) return [];
  return team.garments.flatMap((garment) => {
    if (garment.worn === 'home') return [];
    return garment.worn === 'away'
      ? [`${team.name} have no away kit, so “${garment.name}”, worn away only, is not made for them.`]
      : [`${team.name} have no away kit, so “${garment.name}” is made in the home kit only.`];
  });
}

function listPlayerNotes(team: SnapshotTeam, player: SnapshotPlayer): string[] {
  const number = player.number.trim();
  const who = `${team.name}, bag ${player.bagCode}${number === '' ? '' : `, number ${number}`}`;
  const notes = team.garments.flatMap((garment) => {
    const { size } = findSize(player, garment);
    if (size === '') return [`${who}: no size for “${garment.name}”.`];
    if (garment.sizes.some((entry) => entry.code === size)) return [];
    const run = garment.sizes.map((entry) => entry.code).join(', ');
    return [`${who}: size “${size}” is not in the run of “${garment.name}” (${run}).`];
  });
  const codes = new Set(team.garments.map((garment) => garment.code));
  const strays = Object.keys(player.sizes)
    .filter((code) => !codes.has(code) && (player.sizes[code] ?? '').trim() !== '')
    .sort()
    .map((code) => `${who}: size “${player.sizes[code]}” is for “${code}”, which this team does not wear.`);
  const unnumbered =
    number === '' && team.garments.some((garment) => garment.numbered) ? [`${who}: no number.`] : [];
  return [...notes, ...strays, ...unnumbered];
}
