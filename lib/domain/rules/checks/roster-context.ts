import { canonicalLabel } from '../../numbers/label-rules';
import { readNumber, type NumberReading } from '../../numbers/label';
import { type Garment, type RosterLine } from '../../roster/player';
import { foldText, tidyText } from '../../text/normalise-text';
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
  return { rules, players, garments, readings, keys, rowsByKey };
}

/**
 * How a sentence names a player: by surname, by given name and surname when another player has the same surname, by row
 * (counted from 1) when there is no name.
 */
export function nameInSentence(players: readonly RosterLine[], row: number): string {
  const name = tidyText(players[row]?.name ?? '');
  if (name === '') return `row ${row + 1}`;
  const { given, surname } = splitPersonName(name);
  const folded = foldText(surname);
  const shared = players.some(
    (other, at) => at !== row && foldText(splitPersonName(other.name).surname) === folded,
  );
  return shared && given !== '' ? `${given} ${surname}` : surname;
}

/** The other players as owners at the end of a sentence: "Dunmore's", "Dunmore's and row 4's". */
export const possessives = (players: readonly RosterLine[], rows: readonly number[]): string =>
  joinWords(rows.map((row) => `${nameInSentence(players, row)}'s`));
