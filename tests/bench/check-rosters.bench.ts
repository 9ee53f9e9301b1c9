import { Bench } from 'tinybench';
import { guessMapping } from '@/lib/domain/roster/import/column-mapping';
import { parseTable } from '@/lib/domain/roster/import/parse-table';
import { readRoster } from '@/lib/domain/roster/import/read-roster';
import type { Garment, RosterLine } from '@/lib/domain/roster/player';
import { findCataloguePreset } from '@/lib/domain/rules/catalogue/catalogue';
import { checkRoster } from '@/lib/domain/rules/check-roster';

// Figures are read as ratios to the small case of the same run, never against a clock of another machine.

const garments: Garment[] = [
  {
    code: 'jersey',
    name: 'Jersey',
    worn: 'home',
    numbered: true,
    named: true,
    sizes: ['YS', 'YM', 'YL'].map((code) => ({ code, label: code })),
  },
];

const makeRoster = (roster: number, players: number): RosterLine[] =>
  Array.from({ length: players }, (_, index) => ({
    name: `Surname${roster}x${index}, Given${index}`,
    nameOnBack: `SURNAME${index}`,
    // A few of each: allowed, repeated, with a digit above five, missing.
    number: index % 9 === 0 ? '' : String((roster * 7 + index * 3) % 60),
    role: '',
    sizes: { jersey: ['YS', 'YM', 'YL', ''][index % 4] ?? '' },
  }));

const rules = findCataloguePreset('basketball-nfhs')?.ruleSet;
if (!rules) throw new Error('the catalogue has no basketball-nfhs');
const one = makeRoster(1, 20);
const thousand = Array.from({ length: 1000 }, (_, roster) => makeRoster(roster, 20));
const csv = [
  'Player,Name on back,No.,Jersey size',
  ...makeRoster(1, 2000).map((line, index) => `"${line.name}",${line.nameOnBack},${index % 56},YM`),
].join('\r\n');

const bench = new Bench({ time: 2000, warmupTime: 300 });
bench
  .add('check one roster of 20 players', () => {
    checkRoster(rules, one, garments);
  })
  .add('check 1,000 rosters, 20,000 players', () => {
    for (const roster of thousand) checkRoster(rules, roster, garments);
  })
  .add('parse a CSV of 2,000 rows, map it and check it', () => {
    const parsed = parseTable(csv);
    if (!parsed.ok) throw new Error(parsed.message);
    const reading = readRoster(parsed.table.rows, guessMapping(parsed.table.rows, garments), garments);
    checkRoster(
      rules,
      reading.lines.map(({ line }) => line),
      garments,
    );
  });
await bench.run();
console.table(bench.table());
