import { applyEdits, insistOn, type EditConflict } from './apply-edits';
import { listDifferentCells } from './cells';
import {
  invertEdit,
  playerOfEdit,
  toRosterEntry,
  type CellField,
  type RosterEdit,
  type RosterEntry,
} from './edit';
import { foldEdits } from './fold-edits';

/** A conflict that waits for the person at this screen; `lastKnown` is the player as they last saw them. */
export type OpenConflict = EditConflict & { lastKnown: RosterEntry | undefined };

/** A cell that somebody else changed while this screen was open. */
export type ChangeMark = { playerId: string; field: CellField; by: string | null; at: number };

/**
 * A roster open on one screen. `base` is what the server last said; what is seen is the base with the edits on the way
 * (`sending`) and those still here (`waiting`). Edits on the way stay as they are until an answer comes, because they
 * may have been done without our hearing of it.
 */
export type RosterDocument = {
  revision: number;
  base: readonly RosterEntry[];
  sending: readonly RosterEdit[];
  waiting: readonly RosterEdit[];
  conflicts: readonly OpenConflict[];
  /** Steps that can be taken back, each a group of edits made at once, the latest last. */
  done: readonly (readonly RosterEdit[])[];
  undone: readonly (readonly RosterEdit[])[];
  marks: readonly ChangeMark[];
};

/** What the server says of a roster: after a save, or when asked for news. */
export type RosterAnswer = {
  revision: number;
  players: readonly (RosterEntry & { changedBy: string | null })[];
  conflicts?: readonly EditConflict[];
};

/** When an answer came, and the name of the person at this screen, whose own changes are not marked. */
type Now = { at: number; me: string };

const mostUndo = 200;
const mostMarks = 100;

/** Opens a roster as the server gave it, with edits kept from an earlier visit if there were any. */
export function openDocument(
  roster: { revision: number; players: readonly RosterEntry[] },
  kept: { sending: readonly RosterEdit[]; waiting: readonly RosterEdit[] } = { sending: [], waiting: [] },
): RosterDocument {
  const document: RosterDocument = {
    revision: roster.revision,
    base: roster.players.map(toRosterEntry),
    sending: kept.sending,
    waiting: kept.waiting,
    conflicts: [],
    done: [],
    undone: [],
    marks: [],
  };
  return settleWaiting(document, []);
}

/** The players as this screen shows them. */
export const viewDocument = ({ base, sending, waiting }: RosterDocument): RosterEntry[] =>
  applyEdits(base, [...sending, ...waiting]).players;

/** How many edits the server has not confirmed. */
export const countUnsaved = ({ sending, waiting }: RosterDocument): number => sending.length + waiting.length;

/** Makes edits as one step that can be taken back. Whoever types into a cell in conflict has decided it. */
export function editDocument(document: RosterDocument, edits: readonly RosterEdit[]): RosterDocument {
  const { applied } = applyEdits(viewDocument(document), edits);
  if (applied.length === 0) return document;
  return {
    ...dropConflictsOf(document, applied),
    waiting: foldEdits([...document.waiting, ...applied]),
    done: [...document.done, applied].slice(-mostUndo),
    undone: [],
  };
}

function dropConflictsOf(document: RosterDocument, edits: readonly RosterEdit[]): RosterDocument {
  const touched = new Set(edits.map(cellOf));
  return {
    ...document,
    conflicts: document.conflicts.filter(({ edit }) => !touched.has(cellOf(edit))),
    marks: document.marks.filter(({ playerId, field }) => !touched.has(`${playerId} ${field}`)),
  };
}

const cellOf = (edit: RosterEdit): string =>
  `${playerOfEdit(edit)} ${edit.kind === 'set' ? edit.field : edit.kind}`;

/** Takes the latest step back, as far as nobody has changed its cells since; `skipped` says how many edits stayed. */
export const undoStep = (document: RosterDocument) => turnBack(document, 'done', 'undone');

/** Takes the latest step that was taken back again. */
export const redoStep = (document: RosterDocument) => turnBack(document, 'undone', 'done');

function turnBack(
  document: RosterDocument,
  from: 'done' | 'undone',
  to: 'done' | 'undone',
): { document: RosterDocument; skipped: number; edits: readonly RosterEdit[] } {
  const step = document[from].at(-1);
  if (step === undefined) return { document, skipped: 0, edits: [] };
  const inverse = [...step].reverse().map(invertEdit);
  const { applied, conflicts } = applyEdits(viewDocument(document), inverse);
  return {
    document: {
      ...dropConflictsOf(document, applied),
      waiting: foldEdits([...document.waiting, ...applied]),
      [from]: document[from].slice(0, -1),
      [to]: applied.length === 0 ? document[to] : [...document[to], applied],
    },
    skipped: conflicts.length,
    edits: applied,
  };
}

/** Puts up to `most` waiting edits on the way, unless some are on the way already. */
export function startSending(document: RosterDocument, most: number): RosterDocument {
  if (document.sending.length > 0 || document.waiting.length === 0) return document;
  return {
    ...document,
    sending: document.waiting.slice(0, most),
    waiting: document.waiting.slice(most),
  };
}

/** The server refused the edits on the way for good, so nothing of them was done: they wait here again. */
export const takeBackSending = (document: RosterDocument): RosterDocument => ({
  ...document,
  sending: [],
  waiting: foldEdits([...document.sending, ...document.waiting]),
});

/** The server has done the edits on the way: its answer is the new base, its conflicts wait for the person. */
export function acknowledge(document: RosterDocument, answer: RosterAnswer, now: Now): RosterDocument {
  const before = viewDocument(document);
  const rebased = {
    ...document,
    revision: answer.revision,
    base: answer.players.map(toRosterEntry),
    sending: [],
  };
  return markChanges(settleWaiting(rebased, answer.conflicts ?? [], before), before, answer, now);
}

/** Somebody else has changed the roster. Older news than what is known is ignored. */
export function receiveNews(document: RosterDocument, answer: RosterAnswer, now: Now): RosterDocument {
  if (answer.revision <= document.revision) return document;
  const before = viewDocument(document);
  const rebased = { ...document, revision: answer.revision, base: answer.players.map(toRosterEntry) };
  return markChanges(settleWaiting(rebased, [], before), before, answer, now);
}

/** Sets waiting edits that no longer fit the base aside as conflicts; of several on one cell the latest counts. */
function settleWaiting(
  document: RosterDocument,
  found: readonly EditConflict[],
  before: readonly RosterEntry[] = document.base,
): RosterDocument {
  const there = applyEdits(document.base, document.sending).players;
  const { applied, conflicts } = applyEdits(there, document.waiting);
  const known = new Map(before.map((player) => [player.id, player]));
  const open = new Map(document.conflicts.map((conflict) => [cellOf(conflict.edit), conflict]));
  for (const conflict of [...found, ...conflicts]) {
    const lastKnown = known.get(playerOfEdit(conflict.edit));
    open.set(cellOf(conflict.edit), { ...conflict, lastKnown });
  }
  return { ...document, waiting: applied, conflicts: [...open.values()] };
}

/** Marks the cells whose value on this screen has just changed under the person's eyes. */
function markChanges(
  document: RosterDocument,
  before: readonly RosterEntry[],
  answer: RosterAnswer,
  { at, me }: Now,
): RosterDocument {
  const known = new Map(before.map((player) => [player.id, player]));
  const names = new Map(answer.players.map(({ id, changedBy }) => [id, changedBy]));
  const fresh = viewDocument(document).flatMap((player) => {
    const seen = known.get(player.id) ?? {
      ...player,
      name: '',
      nameOnBack: '',
      number: '',
      role: '',
      sizes: {},
    };
    const by = names.get(player.id) ?? null;
    // What this person did in another tab needs no telling.
    if (by !== null && by === me) return [];
    return listDifferentCells(seen, player).map((field): ChangeMark => ({
      playerId: player.id,
      field,
      by,
      at,
    }));
  });
  if (fresh.length === 0) return document;
  const replaced = new Set(fresh.map(({ playerId, field }) => `${playerId} ${field}`));
  const kept = document.marks.filter(({ playerId, field }) => !replaced.has(`${playerId} ${field}`));
  return { ...document, marks: [...kept, ...fresh].slice(-mostMarks) };
}

/** Lets marks made before a time fade. */
export function dropMarks(document: RosterDocument, before: number): RosterDocument {
  const marks = document.marks.filter(({ at }) => at >= before);
  return marks.length === document.marks.length ? document : { ...document, marks };
}

/** Settles a conflict for this screen's value. A player who was removed comes back at the end of the list. */
export function keepMine(document: RosterDocument, conflict: OpenConflict): RosterDocument {
  const view = viewDocument(document);
  const present = view.find(({ id }) => id === playerOfEdit(conflict.edit));
  return editDocument(
    takeTheirs(document, conflict),
    insistOn(conflict, present, conflict.lastKnown, view.at(-1)?.id ?? null),
  );
}

/** Settles a conflict for what the other person did. */
export const takeTheirs = (document: RosterDocument, conflict: OpenConflict): RosterDocument => ({
  ...document,
  conflicts: document.conflicts.filter((other) => cellOf(other.edit) !== cellOf(conflict.edit)),
});
