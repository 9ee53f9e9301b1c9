import { canonicalLabel } from '../../numbers/label-rules';
import { readNumber, type NumberReading } from '../../numbers/label';
import { type Garment, type RosterLine } from '../../roster/player';
import { countOf } from '../../text/count-of';
import { foldText } from '../../text/normalise-text';
import { splitPersonName } from '../../text/person-name';
import { joinWords } from '../../text/sentence';
import { type CompiledRuleSet } from '../compile-rule-set';
import { type Finding } from '../finding';

/** What every check is handed: the rules, the roster, and each number read once. Rows count from 0. */
export type RosterContext = {
  rules: CompiledRuleSet;
  players: readonly RosterLine[];
  garments: readonly Garment[];
  readings: readonly NumberReading[];
  /** For each row the label its number counts as, null when there is none. */
  keys: readonly (string | null)[];
  /** The rows that wear each such label, in order. */
  rowsByKey: ReadonlyMap<string, readonly number[]>;
  /** How a sentence names the player of a row. */
  nameOf: (row: number) => string;
};

/** One family of rules: looks at the roster and adds what it has to say. */
export type Check = (context: RosterContext, findings: Finding[]) => void;

/** Reads every number once and groups the rows by the label their numbers count as. */
export function readRoster(
  rules: CompiledRuleSet,
  players: readonly RosterLine[],
  garments: readonly Garment[],
): RosterContext {
  const readings = players.map((player) => readNumber(player.number));
  const keys = readings.map((reading) =>
    reading.ok ? canonicalLabel(rules.ruleSet.labels, reading.label) : null,
  );
  const rowsByKey = new Map<string, number[]>();
  keys.forEach((key, row) => {
    if (key === null) return;
    const rows = rowsByKey.get(key);
    if (rows === undefined) rowsByKey.set(key, [row]);
    else rows.push(row);
  });
  return { rules, players, garments, readings, keys, rowsByKey, nameOf: makeNames(players) };
}

/**
 * How sentences name the players, made when first asked for: by surname, by given name and surname when another player
 * has the same surname, by row (counted from 1) when there is no name.
 */
function makeNames(players: readonly RosterLine[]): (row: number) => string {
  let names: string[] | null = null;
  return (row) => {
    names ??= listNames(players);
    return names[row] ?? `row ${row + 1}`;
  };
}

function listNames(players: readonly RosterLine[]): string[] {
  const split = players.map((player) => splitPersonName(player.name));
  const counts = new Map<string, number>();
  for (const { surname } of split) counts.set(foldText(surname), (counts.get(foldText(surname)) ?? 0) + 1);
  return split.map(({ given, surname }, row) => {
    if (surname === '') return `row ${row + 1}`;
    const shared = (counts.get(foldText(surname)) ?? 0) > 1;
    return shared && given !== '' ? `${given} ${surname}` : surname;
  });
}

const mostNamed = 3;

/** The players of some rows in a sentence, three by name at most: "Dunmore", "Dunmore and Ellery", "… and 16 others". */
export function nameRows(context: RosterContext, rows: readonly number[], ending = ''): string {
  const names = rows.slice(0, mostNamed).map((row) => `${context.nameOf(row)}${ending}`);
  const left = rows.length - names.length;
  return joinWords(left === 0 ? names : [...names, countOf(left, 'other')]);
}
