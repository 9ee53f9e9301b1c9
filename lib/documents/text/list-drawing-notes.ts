import type { BatchSnapshot } from '@/lib/domain/batch/batch-snapshot';
import { splitRuns } from './split-runs';

/**
 * A sentence for each text of a batch with letters that our fonts can't draw: on paper they stand as crossed boxes. A
 * player is named by bag code. In the order of the batch; empty when every letter can be drawn.
 */
export function listDrawingNotes(snapshot: BatchSnapshot): string[] {
  const note = (what: string, text: string): string[] => {
    const letters = [...new Set(splitRuns('text', text).flatMap((run) => (run.face ? [] : [run.text])))];
    if (letters.length === 0) return [];
    return [`${what} holds letters our fonts can’t draw (${letters.map(writeCodePoints).join(', ')}).`];
  };
  const { league, season, shop } = snapshot.batch;
  return [
    ...note('The name of the league', league),
    ...note('The name of the season', season),
    ...note('The name of the shop', shop),
    ...snapshot.teams.flatMap((team, at) => [
      ...note(`The name of team ${at + 1}`, team.name),
      ...note(`The division of team ${at + 1}`, team.division),
      ...[team.kits.home, ...(team.kits.away ? [team.kits.away] : [])].flatMap((kit) =>
        note(`${team.name}: the kit “${kit.name}”`, kit.name),
      ),
      ...team.garments.flatMap((garment) =>
        note(`${team.name}: the garment “${garment.name}”`, garment.name),
      ),
      ...team.players.flatMap((player) => {
        const who = `${team.name}, bag ${player.bagCode}`;
        return [
          ...note(`${who}: the name`, player.name),
          ...note(`${who}: the name on the back`, player.nameOnBack),
          ...note(`${who}: the number`, player.number),
          ...note(`${who}: a size`, Object.values(player.sizes).sort().join(' ')),
        ];
      }),
    ]),
  ];
}

/** The code points of a letter as Unicode writes them, "U+10E5", to look a letter up that can't be printed. */
export const writeCodePoints = (letter: string): string =>
  [...letter]
    .map((c) => `U+${(c.codePointAt(0) ?? 0).toString(16).toUpperCase().padStart(4, '0')}`)
    .join(' ');
