import { foldForSearch, holdsEveryWord } from '@/components/ui/fold-for-search';
import { readNumber } from '@/lib/domain/numbers/label';
import type { RosterEntry } from '@/lib/domain/roster/edit';
import type { Sort } from './grid-head';

const collator = new Intl.Collator('en', { sensitivity: 'base', numeric: true });

/**
 * The players in the order of a column. Numbers that can't be read come last either way. What was sorted once stays
 * where it is while cells change: `sortRows` is asked again only when the reader sorts again.
 */
export function sortRows(players: readonly RosterEntry[], { field, down }: Sort): string[] {
  const value = (player: RosterEntry): number => {
    const reading = readNumber(player.number);
    return reading.ok ? Number(reading.label) : Infinity;
  };
  const sign = down ? -1 : 1;
  return [...players]
    .sort((a, b) => {
      if (field !== 'number') return sign * collator.compare(a.name, b.name);
      const [one, two] = [value(a), value(b)];
      if (one === two) return 0;
      return one === Infinity || two === Infinity ? one - two : sign * (one - two);
    })
    .map(({ id }) => id);
}

/** Players in a kept order of ids; those who joined since come after, in the order of the roster. */
export function arrange(players: readonly RosterEntry[], order: readonly string[] | null): RosterEntry[] {
  if (order === null) return [...players];
  const place = new Map(order.map((id, at) => [id, at]));
  return [...players].sort((a, b) => (place.get(a.id) ?? Infinity) - (place.get(b.id) ?? Infinity) || 0);
}

/** Whether any cell of a player holds every word that was typed. */
export const matchesPlayer = (player: RosterEntry, words: string): boolean =>
  holdsEveryWord(
    foldForSearch(
      [player.name, player.nameOnBack, player.number, player.role, ...Object.values(player.sizes)].join(' '),
    ),
    words,
  );
