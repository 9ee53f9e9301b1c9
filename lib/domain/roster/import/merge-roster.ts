import { readNumber } from '../../numbers/label';
import type { Player, RosterLine } from '../player';
import { nameKey, nameWordsKey } from './name-key';

/** A line to bring in, as `readRoster` gives it. */
export type IncomingLine = { line: RosterLine; extra: Record<string, string> };

/**
 * How a file meets a roster that has players: `add` adds those who are new and leaves the others alone; `update
 * matching` also brings matching players up to date; `replace` does both and removes players the file doesn't name.
 */
export const mergeModes = ['add', 'update matching', 'replace'] as const;
export type MergeMode = (typeof mergeModes)[number];

/** A player the file would change. `after` keeps what the file leaves empty. */
export type PlayerChange = {
  player: Player;
  before: IncomingLine;
  after: IncomingLine;
};

/** A line that may be a player already there, with `row`, its place (from 0) among the incoming lines. */
export type AmbiguousLine = { row: number; incoming: IncomingLine; candidates: Player[]; reason: string };

/** What bringing the file in would do. Every incoming line is in `added`, `changed`, `unchanged` or `ambiguous` once. */
export type MergePlan = {
  added: { row: number; incoming: IncomingLine }[];
  changed: PlayerChange[];
  unchanged: Player[];
  /** Which player each line that found one is: `row` is its place (from 0) among the incoming lines. */
  matched: { row: number; id: string }[];
  ambiguous: AmbiguousLine[];
  /** Players that no line names, not even perhaps. Only `replace` removes them. */
  missing: Player[];
};

/** What a person said about ambiguous lines: by row, the id of the player it is, or `new`. */
export type MergeDecisions = ReadonlyMap<number, { as: 'new' } | { as: 'player'; id: string }>;

/** What the file says wins where it says something; what it leaves empty stays. */
function mergeLine(player: Player, { line, extra }: IncomingLine): IncomingLine {
  const sizes = Object.entries(line.sizes).filter(([, size]) => size !== '');
  return {
    line: {
      name: line.name || player.name,
      nameOnBack: line.nameOnBack || player.nameOnBack,
      number: line.number || player.number,
      role: line.role || player.role,
      sizes: Object.fromEntries([...Object.entries(player.sizes), ...sizes]),
    },
    extra: Object.fromEntries([...Object.entries(player.extra), ...Object.entries(extra)]),
  };
}

const linePart = ({ name, nameOnBack, number, role, sizes, extra }: Player): IncomingLine => ({
  line: { name, nameOnBack, number, role, sizes },
  extra,
});

const sameRecord = (one: Record<string, string>, other: Record<string, string>): boolean =>
  Object.keys(one).length === Object.keys(other).length &&
  Object.entries(one).every(([key, value]) => Object.hasOwn(other, key) && other[key] === value);

const sameLine = (one: IncomingLine, other: IncomingLine): boolean =>
  (['name', 'nameOnBack', 'number', 'role'] as const).every(
    (field) => one.line[field] === other.line[field],
  ) &&
  sameRecord(one.line.sizes, other.line.sizes) &&
  sameRecord(one.extra, other.extra);

function groupBy<Item>(items: readonly Item[], keyOf: (item: Item) => string): Map<string, Item[]> {
  const groups = new Map<string, Item[]>();
  for (const item of items) {
    const key = keyOf(item);
    if (key === '') continue;
    const group = groups.get(key);
    if (group) group.push(item);
    else groups.set(key, [item]);
  }
  return groups;
}

const label = (number: string): string => {
  const reading = readNumber(number);
  return reading.ok ? reading.label : '';
};

type Row = { row: number; incoming: IncomingLine };
type Verdict = { match: Player } | { candidates: Player[]; reason: string } | 'new';

/** Finds who each line is, from players of the same name; the number decides between two of one name. */
function judgeGroup(rows: readonly Row[], players: readonly Player[]): Map<number, Verdict> {
  const verdicts = new Map<number, Verdict>();
  const [row] = rows;
  const [player] = players;
  if (row && player && rows.length === 1 && players.length === 1)
    return new Map([[row.row, { match: player }]]);
  const sameNumber = ({ incoming }: Row, { number }: { number: string }): boolean =>
    label(number) !== '' && label(number) === label(incoming.line.number);
  for (const each of rows) {
    const found = players.filter((other) => sameNumber(each, other));
    const rivals = rows.filter((other) => sameNumber(other, each.incoming.line));
    const [only] = found;
    if (only && found.length === 1 && rivals.length === 1) verdicts.set(each.row, { match: only });
  }
  const matched = new Set(
    [...verdicts.values()].flatMap((verdict) =>
      typeof verdict === 'object' && 'match' in verdict ? [verdict.match.id] : [],
    ),
  );
  const left = players.filter(({ id }) => !matched.has(id));
  for (const each of rows) {
    if (verdicts.has(each.row)) continue;
    const reason =
      players.length > 1
        ? 'Several players of this name are in the roster, and the number does not tell them apart.'
        : 'Several rows have this name, and the number does not tell which of them is the player in the roster.';
    verdicts.set(each.row, left.length === 0 ? 'new' : { candidates: left, reason });
  }
  return verdicts;
}

/**
 * Plans how incoming lines meet a roster: matched by name whatever the case, accents, spaces and order ("Last, First"),
 * the number deciding between namesakes. What stays in doubt is `ambiguous` and waits for `decisions`; lines without a
 * name match nobody and are added. Nothing is removed by the plan; `missing` lists whom `replace` would remove.
 */
export function planMerge(
  existing: readonly Player[],
  incoming: readonly IncomingLine[],
  decisions: MergeDecisions = new Map(),
): MergePlan {
  const plan: MergePlan = { added: [], changed: [], unchanged: [], matched: [], ambiguous: [], missing: [] };
  const rows = incoming.map((each, row): Row => ({ row, incoming: each }));
  const byId = new Map(existing.map((player) => [player.id, player]));
  const verdicts = new Map<number, Verdict>();
  const claimed = new Set<string>();
  for (const { row } of rows) {
    const decision = decisions.get(row);
    const player = decision?.as === 'player' ? byId.get(decision.id) : undefined;
    if (decision?.as === 'new') verdicts.set(row, 'new');
    else if (player && !claimed.has(player.id)) {
      verdicts.set(row, { match: player });
      claimed.add(player.id);
    } else if (decision?.as === 'player') {
      verdicts.set(row, {
        candidates: player ? [player] : [],
        reason: player
          ? 'another line was said to be this player already'
          : 'the player chosen is not in the roster any more',
      });
    }
  }
  const open = (): Player[] => existing.filter(({ id }) => !claimed.has(id));
  const undecided = (): Row[] => rows.filter(({ row }) => !verdicts.has(row));

  const players = groupBy(open(), ({ name }) => nameKey(name));
  for (const [key, group] of groupBy(undecided(), (each) => nameKey(each.incoming.line.name))) {
    const namesakes = players.get(key);
    if (!namesakes) continue;
    for (const [row, verdict] of judgeGroup(group, namesakes)) {
      verdicts.set(row, verdict);
      if (verdict !== 'new' && 'match' in verdict) claimed.add(verdict.match.id);
    }
  }
  const turned = groupBy(open(), ({ name }) => nameWordsKey(name));
  for (const { row, incoming: each } of undecided()) {
    const candidates = turned.get(nameWordsKey(each.line.name)) ?? [];
    const reason = 'A player with the same names in another order is in the roster.';
    verdicts.set(row, candidates.length > 0 ? { candidates, reason } : 'new');
  }

  const doubted = new Set<string>();
  for (const each of rows) {
    const verdict = verdicts.get(each.row) ?? 'new';
    if (verdict === 'new') plan.added.push(each);
    else if ('candidates' in verdict) {
      plan.ambiguous.push({ ...each, ...verdict });
      for (const { id } of verdict.candidates) doubted.add(id);
    } else {
      plan.matched.push({ row: each.row, id: verdict.match.id });
      const before = linePart(verdict.match);
      const after = mergeLine(verdict.match, each.incoming);
      if (sameLine(before, after)) plan.unchanged.push(verdict.match);
      else plan.changed.push({ player: verdict.match, before, after });
    }
  }
  plan.missing = existing.filter(({ id }) => !claimed.has(id) && !doubted.has(id));
  return plan;
}

/** The steps a mode takes from a plan: lines to add, players to change, players to remove, and what it leaves alone. */
export type MergeSteps = {
  add: IncomingLine[];
  update: PlayerChange[];
  remove: Player[];
  /** Differences that `add` leaves alone, and lines in doubt: shown, never applied. */
  leftAlone: { changes: PlayerChange[]; ambiguous: AmbiguousLine[] };
};

/** Takes a plan's steps for one mode. Only `replace` removes, and never a player some line may be. */
export function listMergeSteps(plan: MergePlan, mode: MergeMode): MergeSteps {
  const updates = mode === 'add' ? [] : plan.changed;
  return {
    add: plan.added.map(({ incoming }) => incoming),
    update: updates,
    remove: mode === 'replace' ? plan.missing : [],
    leftAlone: { changes: mode === 'add' ? plan.changed : [], ambiguous: plan.ambiguous },
  };
}
