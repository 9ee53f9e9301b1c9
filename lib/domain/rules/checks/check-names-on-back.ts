import { countGraphemes } from '../../text/graphemes';
import { isLatinText, keepLatin, listNonLatin } from '../../text/latin-letters';
import { foldText, tidyText } from '../../text/normalise-text';
import { splitPersonName } from '../../text/person-name';
import { joinWords, quoteText } from '../../text/sentence';
import { listInitialForms, listShorterNames } from '../../text/shorter-names';
import { type Finding, type FindingCode } from '../finding';
import { type RuleSet } from '../rule-set';
import { type Check, nameRows, type RosterContext } from './roster-context';

type NameRules = RuleSet['names'];
const mostSuggestions = 3;

/** The names on the backs keep to what the rules say: wanted or not, length, letters, and one surname worn twice. */
export const checkNamesOnBack: Check = (context, findings) => {
  const { rules, players } = context;
  const { names } = rules.ruleSet;
  const severity = names.weight;
  if (severity === 'off') return;
  const backs = players.map((player) => tidyText(player.nameOnBack));
  const sharers = names.sharedSurnameNeedsInitial ? groupRows(backs) : new Map<string, number[]>();
  const apart = listApartForms(context, sharers);
  const fits = (row: number) => (form: string) =>
    form !== '' && obeysForm(names, form) && isAlone(sharers, row, form);
  backs.forEach((back, row) => {
    const add = (code: FindingCode, message: string, forms: string[]): void => {
      const suggestions = [...new Set(forms)].filter(fits(row)).slice(0, mostSuggestions);
      findings.push({ code, severity, row, field: 'nameOnBack', message, suggestions } satisfies Finding);
    };
    const name = players[row]?.name ?? '';
    if (back === '') {
      if (names.onBack === 'wanted')
        add('name-on-back-missing', missing(name), listWornForms(names, name, fits(row)));
      return;
    }
    if (names.onBack === 'not allowed') {
      add('name-on-back-not-wanted', `No names are worn on the back here. Take ${quoteText(back)} off.`, []);
      return;
    }
    checkForm(names, back, add);
    const rows = sharers.get(foldText(back)) ?? [];
    if (rows.length > 1) checkShared(context, row, rows, apart.get(row) ?? [], add);
  });
};

type Add = (code: FindingCode, message: string, forms: string[]) => void;

function checkForm(names: NameRules, back: string, add: Add): void {
  const letters = countGraphemes(back);
  if (letters > names.mostLetters) {
    const counted = back.includes(' ') ? ' with its spaces' : '';
    const message = `${quoteText(back)} is ${letters} letters long${counted}, and at most ${names.mostLetters} may be worn.`;
    add('name-too-long', message, listShorterNames(repairLetters(names, back), names.mostLetters));
  }
  if (names.letters === 'latin' && !isLatinText(back)) {
    const wrong = listNonLatin(back)
      .slice(0, mostSuggestions)
      .map((mark) => quoteText(mark));
    const message = `${quoteText(back)} holds ${joinWords(wrong)}. Only Latin letters, spaces, hyphens, apostrophes and full stops may be worn.`;
    const kept = keepLatin(back);
    add('name-letters', message, [kept, ...listShorterNames(kept, names.mostLetters)]);
  }
}

/** For every row whose name on the back others wear too: ways to write it with an initial that none of them shares. */
function listApartForms(
  context: RosterContext,
  sharers: ReadonlyMap<string, number[]>,
): Map<number, string[]> {
  const apart = new Map<number, string[]>();
  for (const rows of sharers.values()) {
    if (rows.length < 2) continue;
    const forms = rows.map((row) => {
      const player = context.players[row];
      const { given, surname } = splitPersonName(player?.name ?? '');
      return listInitialForms(player?.nameOnBack ?? '', given, surname);
    });
    const counts = new Map<string, number>();
    for (const form of forms.flat()) counts.set(foldText(form), (counts.get(foldText(form)) ?? 0) + 1);
    rows.forEach((row, at) => {
      apart.set(row, forms[at]?.filter((form) => counts.get(foldText(form)) === 1) ?? []);
    });
  }
  return apart;
}

function checkShared(
  context: RosterContext,
  row: number,
  rows: readonly number[],
  apart: string[],
  add: Add,
): void {
  const { mostLetters } = context.rules.ruleSet.names;
  const back = tidyText(context.players[row]?.nameOnBack ?? '');
  const others = nameRows(
    context,
    rows.filter((other) => other !== row),
  );
  const shorter = apart.slice(0, 1).flatMap((form) => shortenAfterInitial(form, mostLetters));
  const message = `${quoteText(back)} is also worn by ${others}. Each needs an initial.`;
  add('surname-needs-initial', message, [...apart, ...shorter]);
}

/** "A BROOKHOLLOW" with its surname cut to fit; the initial stays, because it tells the two apart. */
function shortenAfterInitial(form: string, most: number): string[] {
  const [initial = '', ...rest] = form.split(' ');
  const room = most - countGraphemes(initial) - 1;
  return listShorterNames(rest.join(' '), room).map((shorter) => `${initial} ${shorter}`);
}

const missing = (name: string): string =>
  tidyText(name) === ''
    ? 'A name on the back is wanted.'
    : `A name on the back is wanted for ${tidyText(name)}.`;

/** The surname in capitals, which most teams print (common practice, no source), or else what comes nearest to it. */
function listWornForms(names: NameRules, name: string, fits: (form: string) => boolean): string[] {
  const { given, surname } = splitPersonName(name);
  const back = repairLetters(names, surname).toUpperCase();
  if (fits(back)) return [back];
  return [...listInitialForms(back, given, back), ...listShorterNames(back, names.mostLetters)];
}

const repairLetters = (names: NameRules, text: string): string =>
  names.letters === 'latin' ? keepLatin(text) : text;

const obeysForm = (names: NameRules, form: string): boolean =>
  countGraphemes(form) <= names.mostLetters &&
  (names.letters === 'any' || (isLatinText(form) && /\p{L}/u.test(form)));

function groupRows(backs: readonly string[]): Map<string, number[]> {
  const rows = new Map<string, number[]>();
  backs.forEach((back, row) => {
    if (back === '') return;
    const key = foldText(back);
    const known = rows.get(key);
    if (known === undefined) rows.set(key, [row]);
    else known.push(row);
  });
  return rows;
}

const isAlone = (sharers: ReadonlyMap<string, number[]>, row: number, form: string): boolean =>
  (sharers.get(foldText(form)) ?? []).every((other) => other === row);
