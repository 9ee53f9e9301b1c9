import { listGraphemes } from './graphemes';
import { tidyText } from './normalise-text';

const initialOf = (part: string): string => listGraphemes(part)[0] ?? '';

/**
 * Shorter ways to write a name for a back, all within `most` letters, best first: a double name with the first or the
 * other part as an initial, one part alone, the name cut with a full stop (BROOKH.), the initials. Never a first name
 * that is not in the text. May be empty when `most` leaves no room.
 */
export function listShorterNames(name: string, most: number): string[] {
  const tidy = tidyText(name);
  const parts = tidy.split(/[ -]+/).filter((part) => part !== '');
  const last = parts.at(-1) ?? '';
  const first = parts[0] ?? '';
  const double = parts.length > 1;
  const forms = double
    ? [`${initialOf(first)} ${last}`, `${first} ${initialOf(last)}.`, last, first, cut(last, most)]
    : [];
  forms.push(cut(tidy, most), ...(double ? [parts.map((part) => `${initialOf(part)}.`).join('')] : []));
  return [...new Set(forms)].filter((form) => {
    const length = listGraphemes(form).length;
    return length > 0 && length <= most && form !== tidy;
  });
}

/** The beginning of a name with a full stop, within `most` letters; '' when fewer than two letters would be left. */
function cut(name: string, most: number): string {
  const letters = listGraphemes(name);
  if (letters.length <= most || most < 3) return '';
  return `${letters
    .slice(0, most - 1)
    .join('')
    .replace(/[ .'’-]+$/, '')}.`;
}

/**
 * Ways to tell two players of one surname apart by an initial, shortest first: "A BROOK", "AL BROOK" … up to the whole
 * first given name, in capitals when the name on the back is. Empty when no given name is known.
 */
export function listInitialForms(nameOnBack: string, given: string, surname: string): string[] {
  const back = tidyText(nameOnBack);
  const capitals = back === back.toUpperCase();
  const first = tidyText(given).split(' ')[0] ?? '';
  const letters = listGraphemes(first.replace(/\.$/, ''));
  const base = withoutInitial(back, surname);
  return letters.map((_, i) => {
    const initial = letters.slice(0, i + 1).join('');
    return `${capitals ? initial.toUpperCase() : initial} ${base}`;
  });
}

/** The name on the back without the initials somebody put before the surname already. */
function withoutInitial(back: string, surname: string): string {
  const folded = surname.toLowerCase();
  if (folded !== '' && back.toLowerCase().endsWith(` ${folded}`)) return back.slice(-surname.length);
  return back.replace(/^(?:\p{L}\p{M}*\.? )+(?=\S{2})/u, '');
}
