import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { listPieces } from '@/lib/domain/packing/list-pieces';
import { pullGarments } from '@/lib/domain/packing/pull-garments';
import { makePlayer, makeSnapshotOf, makeTeam, makeTwoTeams } from '@/tests/factories/snapshots';
import { snapshots } from './arbitrary-snapshots';

const sum = (values: number[]): number => values.reduce((total, value) => total + value, 0);

describe('garments to pull', () => {
  it('add up to the pieces by size, by colour and by style, whatever is missing', () => {
    fc.assert(
      fc.property(snapshots, (snapshot) => {
        const pieces = listPieces(snapshot);
        const pulls = pullGarments(pieces);
        expect(sum(pulls.map((pull) => pull.total))).toBe(pieces.length);
        for (const pull of pulls) {
          expect(sum(pull.colours.map((colour) => colour.total))).toBe(pull.total);
          for (const colour of pull.colours) {
            expect(sum(colour.sizes.map((size) => size.count))).toBe(colour.total);
          }
        }
      }),
    );
  });

  it('name a style, and a colour of a style, once', () => {
    fc.assert(
      fc.property(snapshots, (snapshot) => {
        const pulls = pullGarments(listPieces(snapshot));
        expect(new Set(pulls.map((pull) => pull.style)).size).toBe(pulls.length);
        for (const { colours } of pulls) {
          const keys = colours.map(({ colour, body, sleeves }) =>
            `${colour} ${body} ${sleeves}`.toLowerCase(),
          );
          expect(new Set(keys).size).toBe(keys.length);
        }
      }),
    );
  });

  it('stand in the order of the size run, other sizes next and "no size" last', () => {
    const sizes = ['AM', 'YXS', '', 'huge', 'YL'];
    const players = sizes.map((jersey, at) => makePlayer(at, { sizes: { jersey, shorts: 'YM' } }));
    const [jersey] = pullGarments(listPieces(makeSnapshotOf([makeTeam({ players })])));
    expect(jersey?.sizes.map((size) => size.label)).toEqual([
      'Youth extra small',
      'Youth large',
      'Adult medium',
      'huge',
      'no size',
    ]);
    expect(jersey?.sizes.map((size) => size.known)).toEqual([true, true, true, false, false]);
  });

  it('keep colours apart that share a name but not a colour', () => {
    const other = { name: 'navy', body: '#000033', sleeves: '#000033', number: '#ffffff', outline: null };
    const teams = [
      makeTeam({ players: [makePlayer(0)] }),
      makeTeam({ id: 'team-b', kits: { home: other, away: null }, players: [makePlayer(1)] }),
    ];
    const [jersey] = pullGarments(listPieces(makeSnapshotOf(teams)));
    expect(jersey?.colours.map(({ colour, body }) => `${colour} ${body}`)).toEqual([
      'navy #000033',
      'navy #14375e',
      'white #ffffff',
    ]);
  });

  it('count two teams as one order', () => {
    const [jersey, shorts] = pullGarments(listPieces(makeTwoTeams()));
    expect(jersey).toMatchObject({ style: 'Jersey', total: 36 });
    expect(shorts).toMatchObject({ style: 'Shorts', total: 24 });
    expect(jersey?.colours.map((colour) => [colour.colour, colour.total])).toEqual([
      ['navy', 12],
      ['silver and teal', 12],
      ['white', 12],
    ]);
  });
});
