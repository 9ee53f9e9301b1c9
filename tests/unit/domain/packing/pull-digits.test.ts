import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { listPieces } from '@/lib/domain/packing/list-pieces';
import { pullDigits } from '@/lib/domain/packing/pull-digits';
import { makePlayer, makeSnapshotOf, makeTeam } from '@/tests/factories/snapshots';
import { snapshots } from './arbitrary-snapshots';

const sum = (values: number[]): number => values.reduce((total, value) => total + value, 0);

describe('digits to pull', () => {
  it('add up to the length of all labels on numbered pieces', () => {
    fc.assert(
      fc.property(snapshots, (snapshot) => {
        const pieces = listPieces(snapshot).filter((piece) => piece.garment.numbered);
        const letters = sum(pieces.map((piece) => [...piece.number.replaceAll(' ', '')].length));
        const pulls = pullDigits(listPieces(snapshot));
        expect(sum(pulls.map((pull) => pull.total))).toBe(letters);
        for (const pull of pulls) {
          expect(sum([...pull.digits, ...pull.others].map((entry) => entry.count))).toBe(pull.total);
        }
        expect(sum(pulls.map((pull) => pull.pieces))).toBe(pieces.length);
        expect(sum(pulls.map((pull) => pull.withoutNumber))).toBe(
          pieces.filter((piece) => piece.number === '').length,
        );
      }),
    );
  });

  it('list all ten digits in order, 6 and 9 apart, with the letters after them', () => {
    const players = ['69', '6', 'GK', '00', ''].map((number, at) => makePlayer(at, { number }));
    const [home] = pullDigits(listPieces(makeSnapshotOf([makeTeam({ players })])));
    expect(home?.digits.map(({ character, count }) => `${character}:${count}`)).toEqual([
      '0:2',
      '1:0',
      '2:0',
      '3:0',
      '4:0',
      '5:0',
      '6:2',
      '7:0',
      '8:0',
      '9:1',
    ]);
    expect(home?.others).toEqual([
      { character: 'G', count: 1 },
      { character: 'K', count: 1 },
    ]);
    expect(home).toMatchObject({ pieces: 5, withoutNumber: 1, total: 7 });
  });

  it('keep number colours and outlines apart, however their hex is written', () => {
    const kit = { name: 'red', body: '#990000', sleeves: '#990000', number: '#FFFFFF', outline: null };
    const teams = [
      makeTeam({ players: [makePlayer(0, { number: '1' })] }),
      makeTeam({
        id: 'b',
        name: 'Herons',
        kits: { home: kit, away: { ...kit, outline: '#000000' } },
        players: [makePlayer(1, { number: '1' })],
      }),
    ];
    const pulls = pullDigits(listPieces(makeSnapshotOf(teams)));
    expect(pulls.map((pull) => [pull.number, pull.outline, pull.total])).toEqual([
      ['#ffffff', null, 2],
      ['#14375e', '#c9d6e2', 1],
      ['#ffffff', '#000000', 1],
    ]);
    expect(pulls[0]?.wornBy.map((wearer) => `${wearer.team} ${wearer.kitKind}`)).toEqual([
      'Otters home',
      'Herons home',
    ]);
  });
});
