import type { Garment, RosterLine } from '@/lib/domain/roster/player';
import { inventPlayer, pickNumber } from './invent';
import type { DemoDivision, DemoTeam } from './scenario';

const withoutHighDigits = [...Array(56).keys()].filter((n) => n % 10 <= 5).map(String);

/** The labels a demo team picks from, in an order of its own. */
function shuffleLabels(team: string, ruleSet: string): string[] {
  const labels =
    ruleSet === 'digits'
      ? withoutHighDigits
      : [...Array(ruleSet === 'squad' ? 30 : 99).keys()].map((n) => String(n + 1));
  const free = ruleSet === 'squad' ? labels.filter((label) => label !== '1') : labels;
  return [...free].sort((a, b) => pickNumber(1e9, team, 'label', a) - pickNumber(1e9, team, 'label', b));
}

const pickSize = (garment: Garment, team: string, index: number): string => {
  // Two rolls added up: most players stand in the middle of the size run.
  const spread = garment.sizes.length - 1;
  const roll = pickNumber(100, team, index, 'a') + pickNumber(100, team, index, 'b');
  return garment.sizes[Math.round((roll / 198) * spread)]?.code ?? '';
};

/** The players of a demo team, with the mistakes its story is there to show. */
export function makePlayers(team: DemoTeam, division: DemoDivision): RosterLine[] {
  if (team.name === 'Herons') return makeHerons();
  const labels = shuffleLabels(team.name, division.ruleSet);
  const lines = Array.from({ length: team.players }, (_, index): RosterLine => {
    const { family, given } = inventPlayer(team.name, index);
    const keeper = division.ruleSet === 'squad' && index === 0;
    return {
      name: `${family}, ${given}`,
      nameOnBack: family.toLocaleUpperCase('en'),
      number: keeper ? '1' : (labels[index] ?? ''),
      role: keeper ? 'goalkeeper' : '',
      sizes: Object.fromEntries(
        division.garments.map((garment) => [garment.code, pickSize(garment, team.name, index)]),
      ),
    };
  });
  return lines.map((line, index) => spoilLine(line, index, team, division));
}

function spoilLine(line: RosterLine, index: number, team: DemoTeam, division: DemoDivision): RosterLine {
  const first = division.garments[0]?.code ?? 'jersey';
  switch (team.story) {
    case 'collecting':
      return index >= team.players - 2 ? { ...line, number: '', sizes: {} } : line;
    case 'sizes missing':
      return index % 4 === 1 ? { ...line, sizes: { ...line.sizes, [first]: '' } } : line;
    case 'two share a number':
      return index === 3 ? { ...line, number: '7' } : index === 5 ? { ...line, number: '7' } : line;
    case 'digit above five':
      return index === 4 ? { ...line, number: '26' } : line;
    case 'name too long':
      return index === 2
        ? { ...line, name: 'Brackenthwaite-Osgodby, Wilhelmina', nameOnBack: 'BRACKENTHWAITE-OSGODBY' }
        : line;
    case 'zero and double zero':
      return index === 1 ? { ...line, number: '0' } : index === 2 ? { ...line, number: '00' } : line;
    case 'cautions':
      return index === 6 ? { ...line, sizes: { ...line.sizes, [first]: '' } } : line;
    case 'returned':
      return index === 7 ? { ...line, number: '' } : line;
    default:
      return line;
  }
}

function makeHerons(): RosterLine[] {
  const line = (name: string, number: string, jersey: string, shorts: string): RosterLine => ({
    name,
    nameOnBack: (name.split(',')[0] ?? '').toUpperCase(),
    number,
    role: '',
    sizes: { jersey, shorts },
  });
  return [
    line('Adisa, Wren', '4', 'YM', 'YM'),
    line('Brookhollow, Tam', '10', 'YL', 'YM'),
    line('Calloway, Ines', '14', 'YS', 'YS'),
    line('Dunmore, Pip', '14', 'YM', 'YM'),
    line('Ellery, Jonah', '26', 'YM', 'YS'),
    line('Farrow, Lumi', '0', 'YS', 'YS'),
    line('Grantley, Osei', '33', 'YL', 'YL'),
    line('Hollin, Mara', '5', '', 'YM'),
    line('Ivers, Kit', '21', 'YM', 'YM'),
    line('Jessop, Ana', '11', 'YM', 'YM'),
    line('Kirrane, Seb', '52', 'YL', 'YL'),
  ];
}
