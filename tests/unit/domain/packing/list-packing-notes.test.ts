import { describe, expect, it } from 'vitest';
import { listPackingNotes } from '@/lib/domain/packing/list-packing-notes';
import { makeGarment, makePlayer, makeSnapshotOf, makeTeam } from '@/tests/factories/snapshots';

describe('notes on what is missing in a batch', () => {
  it('are none when every player has sizes and a number', () => {
    expect(listPackingNotes(makeSnapshotOf([makeTeam({ players: [makePlayer(1)] })]))).toEqual([]);
  });

  it('name the bag, never the player, and say what is wrong with it', () => {
    const player = makePlayer(1, { number: '', sizes: { jersey: 'huge', cap: 'M', hat: ' ' } });
    const snapshot = makeSnapshotOf([makeTeam({ players: [player] })]);
    const bag = snapshot.teams[0]?.players[0]?.bagCode;
    const notes = listPackingNotes(snapshot);
    expect(notes).toEqual([
      `Otters, bag ${bag}: size “huge” is not in the run of “Jersey” (YXS, YS, YM, YL, AS, AM).`,
      `Otters, bag ${bag}: no size for “Shorts”.`,
      `Otters, bag ${bag}: size “M” is for “cap”, which this team does not wear.`,
      `Otters, bag ${bag}: no number.`,
    ]);
    expect(notes.join()).not.toContain(player.name);
  });

  it('say what a team without an away kit does not get', () => {
    const { home } = makeTeam().kits;
    const garments = [makeGarment(), makeGarment({ code: 'alt', name: 'Alternate top', worn: 'away' })];
    const sizes = { jersey: 'YM', alt: 'YM' };
    const team = makeTeam({ kits: { home, away: null }, garments, players: [makePlayer(1, { sizes })] });
    expect(listPackingNotes(makeSnapshotOf([team]))).toEqual([
      'Otters have no away kit, so “Jersey” is made in the home kit only.',
      'Otters have no away kit, so “Alternate top”, worn away only, is not made for them.',
    ]);
  });
});
