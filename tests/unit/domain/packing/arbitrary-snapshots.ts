import fc from 'fast-check';
import type { BatchSnapshot } from '@/lib/domain/batch/batch-snapshot';
import type { Kit } from '@/lib/domain/kit/kit';
import { makeGarment, makeSnapshotOf } from '@/tests/factories/snapshots';

const hex = fc.constantFrom('#ffffff', '#FFFFFF', '#14375e', '#000000');
const kits: fc.Arbitrary<Kit> = fc.record({
  name: fc.constantFrom('navy', 'Navy', 'white'),
  body: hex,
  sleeves: hex,
  number: hex,
  outline: fc.option(hex, { nil: null }),
});
const sizes = fc.constantFrom('YS', 'YM', 'YL', 'AS', '', 'XXL', ' YM ');
const garments = fc.uniqueArray(
  fc.record({
    code: fc.constantFrom('jersey', 'shorts', 'top'),
    name: fc.constantFrom('Jersey', 'Shorts'),
    worn: fc.constantFrom('home' as const, 'away' as const, 'home and away' as const),
    numbered: fc.boolean(),
    named: fc.boolean(),
    run: fc.constantFrom(['YS', 'YM', 'YL'], ['YM', 'YL', 'AS'], ['YS', 'AS']),
  }),
  { selector: (garment) => garment.code, maxLength: 3 },
);
const players = fc.array(
  fc.record({
    number: fc.constantFrom('', '7', '00', '10', 'GK', '1 2', '٧', '123'),
    nameOnBack: fc.constantFrom('', 'ADISA'),
    jersey: sizes,
    shorts: sizes,
  }),
  { maxLength: 8 },
);

/** Batches of up to three teams: with and without away kits, sizes and numbers, in and outside their runs. */
export const snapshots: fc.Arbitrary<BatchSnapshot> = fc
  .array(fc.record({ home: kits, away: fc.option(kits, { nil: null }), garments, players }), { maxLength: 3 })
  .map((teams) =>
    makeSnapshotOf(
      teams.map((team, at) => ({
        id: `team-${at}`,
        name: `Team ${at}`,
        slug: `team-${at}`,
        division: 'U12',
        kits: { home: team.home, away: team.away },
        garments: team.garments.map(({ run, ...garment }) =>
          makeGarment({ ...garment, sizes: run.map((code) => ({ code, label: `size ${code}` })) }),
        ),
        players: team.players.map((player, index) => ({
          id: `${at}-${index}`,
          bagCode: '',
          name: `Player ${index}`,
          nameOnBack: player.nameOnBack,
          number: player.number,
          role: '',
          sizes: { jersey: player.jersey, shorts: player.shorts },
        })),
      })),
    ),
  );
