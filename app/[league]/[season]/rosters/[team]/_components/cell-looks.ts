import type { Tone } from '@/components/ui/status-mark';
import type { CellField } from '@/lib/domain/roster/edit';

// On a phone a row of players is a card: the number beside the name, below them tiles with their headings, then what
// to do. The classes are written out, because the style sheet holds only names that stand in the source.

export const cardRow =
  'max-sm:border-hem max-sm:flex max-sm:flex-wrap max-sm:gap-2 max-sm:border-t max-sm:p-3';
export const cardCell = 'max-sm:block max-sm:h-auto max-sm:min-w-0 max-sm:rounded-control';

const tile =
  'max-sm:border-hem max-sm:min-w-20 max-sm:flex-1 max-sm:border max-sm:before:content-[attr(data-label)] ' +
  'max-sm:before:block max-sm:before:px-2 max-sm:before:pt-1 max-sm:before:text-[0.6875rem] max-sm:before:font-[560] max-sm:before:text-dusk';

/** Where a cell stands in the card of its player. */
export function cardPlace(field: CellField): string {
  switch (field) {
    case 'name':
      return 'max-sm:order-2 max-sm:basis-40 max-sm:grow';
    case 'number':
      return 'max-sm:order-1 max-sm:w-14 max-sm:border max-sm:border-hem';
    case 'nameOnBack':
      return `max-sm:order-4 max-sm:basis-32 ${tile}`;
    default:
      return `max-sm:order-5 ${tile}`;
  }
}

/** On paper a list is only a list. */
const flat = 'true-colour print:bg-transparent print:shadow-none';

/** A bar at the left and a wash, so that the colour is not the only sign. */
export const severityLook: Record<Tone, string> = {
  stop: `${flat} bg-stop-wash shadow-[inset_3px_0_0_var(--stop)]`,
  care: `${flat} bg-care-wash shadow-[inset_3px_0_0_var(--care)]`,
  note: `${flat} bg-note-wash shadow-[inset_3px_0_0_var(--note)]`,
  set: '',
  wait: '',
};
