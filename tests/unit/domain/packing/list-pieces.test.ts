import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { listPieces } from '@/lib/domain/packing/list-pieces';
import { makeGarment, makePlayer, makeSnapshotOf, makeTeam, makeTwoTeams } from '@/tests/factories/snapshots';
import { snapshots } from './arbitrary-snapshots';

const describePiece = (piece: ReturnType<typeof listPieces>[number]) =>
  [piece.player.id, piece.garment.code, piece.kitKind, piece.size, piece.number, piece.nameOnBack].join(' ');

describe('pieces of a batch', () => {
  it('come once for each kit a garment is worn with, home before away', () => {
    const player = makePlayer(1, { number: '07', sizes: { jersey: 'YM', shorts: 'YL' } });
    const team = makeTeam({ players: [player] });
    expect(listPieces(makeSnapshotOf([team])).map(describePiece)).toEqual([
      'player-0001 jersey home YM 07 BROOKHOLLOW',
      'player-0001 jersey away YM 07 BROOKHOLLOW',
      'player-0001 shorts home YL  ',
    ]);
  });

  it('have no size when none was given, also of a garment called like a property of every object', () => {
    const garments = [makeGarment({ code: 'constructor', name: 'Constructor' })];
    const team = makeTeam({ garments, players: [makePlayer(1, { sizes: {} })] });
    expect(listPieces(makeSnapshotOf([team])).map(({ size }) => size)).toEqual(['', '']);
  });

  it('are home pieces only for a team without an away kit', () => {
    const { home } = makeTeam().kits;
    const garments = [makeGarment(), makeGarment({ code: 'bag', name: 'Bag', worn: 'away' })];
    const team = makeTeam({ kits: { home, away: null }, garments, players: [makePlayer(1)] });
    const pieces = listPieces(makeSnapshotOf([team]));
    expect(pieces.map((piece) => `${piece.garment.code} ${piece.kitKind}`)).toEqual(['jersey home']);
  });

  it('are kept for a player without a size or number, and say so', () => {
    const team = makeTeam({ players: [makePlayer(1, { number: ' ', sizes: { jersey: '' } })] });
    const pieces = listPieces(makeSnapshotOf([team]));
    expect(pieces).toHaveLength(3);
    expect(pieces.every((piece) => piece.size === '' && piece.sizeLabel === 'no size')).toBe(true);
    expect(pieces.every((piece) => piece.number === '')).toBe(true);
  });

  it('give a size outside the run as it was typed', () => {
    const team = makeTeam({ players: [makePlayer(1, { sizes: { jersey: 'huge' } })] });
    expect(listPieces(makeSnapshotOf([team]))[0]).toMatchObject({ size: 'huge', sizeLabel: 'huge' });
  });

  it('are as many as players times the kits their garments are worn with, in any batch', () => {
    fc.assert(
      fc.property(snapshots, (snapshot) => {
        const expected = snapshot.teams.reduce((sum, team) => {
          const each = team.garments.reduce((n, garment) => {
            const home = garment.worn === 'away' ? 0 : 1;
            const away = garment.worn === 'home' || team.kits.away === null ? 0 : 1;
            return n + home + away;
          }, 0);
          return sum + each * team.players.length;
        }, 0);
        expect(listPieces(snapshot)).toHaveLength(expected);
      }),
    );
  });

  it('stand in the order of the batch', () => {
    const pieces = listPieces(makeTwoTeams());
    expect(pieces).toHaveLength(60);
    expect(new Set(pieces.slice(0, 36).map((piece) => piece.team.name))).toEqual(new Set(['Otters']));
    expect(new Set(pieces.slice(36).map((piece) => piece.team.name))).toEqual(new Set(['Herons']));
  });
});
