import { writeCanonicalJson } from '../batch/canonical-json';

/** A difference as it is kept in the history: the fields that changed, each with both values. */
export type Difference = Record<string, { from: unknown; to: unknown }>;

/**
 * Everything the history of a league can say. `subjectId` is the thing it happened to; `data` never holds a password,
 * a token or a family's contact details.
 */
export type AuditEvent =
  | { type: 'league created'; subjectId: string; data: { name: string } }
  | { type: 'league changed'; subjectId: string; data: { changes: Difference } }
  | { type: 'person invited'; subjectId: string; data: { role: string; email: string } }
  | { type: 'invitation sent again'; subjectId: string; data: { role: string; email: string } }
  | { type: 'invitation withdrawn'; subjectId: string; data: { role: string; email: string } }
  | { type: 'invitation accepted'; subjectId: string; data: { role: string } }
  | {
      type: 'manager teams changed';
      subjectId: string;
      data: { person: string; added: string[]; removed: string[] };
    }
  | { type: 'membership ended'; subjectId: string; data: { role: string; person: string } }
  | { type: 'shop added'; subjectId: string; data: { name: string } }
  | { type: 'season opened'; subjectId: string; data: { name: string } }
  | { type: 'season changed'; subjectId: string; data: { name: string; changes: Difference } }
  | { type: 'division added'; subjectId: string; data: { name: string } }
  | { type: 'division changed'; subjectId: string; data: { name: string; changes: Difference } }
  | { type: 'division removed'; subjectId: string; data: { name: string } }
  | { type: 'team added'; subjectId: string; data: { name: string } }
  | { type: 'team changed'; subjectId: string; data: { name: string; changes: Difference } }
  | { type: 'team removed'; subjectId: string; data: { name: string; players: number } }
  | { type: 'teams imported'; subjectId: string; data: { added: number; changed: number; refused: number } }
  | { type: 'rule set started'; subjectId: string; data: { name: string; preset: string | null } }
  | {
      type: 'rule set drafted';
      subjectId: string;
      data: { name: string; version: number; changes: Difference };
    }
  | { type: 'rule set draft discarded'; subjectId: string; data: { name: string; version: number } }
  | { type: 'rule set put in force'; subjectId: string; data: { name: string; version: number } }
  | { type: 'roster edited'; subjectId: string; data: { team: string; changes: RosterChange[] } }
  | {
      type: 'roster imported';
      subjectId: string;
      data: { team: string; added: number; changed: number; removed: number; refused: number };
    }
  | { type: 'roster submitted'; subjectId: string; data: { team: string; players: number } }
  | { type: 'roster withdrawn'; subjectId: string; data: { team: string } }
  | { type: 'roster returned'; subjectId: string; data: { team: string; reason: string } }
  | { type: 'roster signed off'; subjectId: string; data: { team: string; players: number } }
  | { type: 'roster reopened'; subjectId: string; data: { team: string; reason: string } }
  | { type: 'roster frozen'; subjectId: string; data: { team: string; because: 'date' | 'batch' | 'person' } }
  | { type: 'managers reminded'; subjectId: string; data: { teams: number; people: number } }
  | { type: 'batch held'; subjectId: string; data: { code: string; teams: number } }
  | { type: 'batch changed'; subjectId: string; data: { code: string; changes: Difference } }
  | { type: 'batch discarded'; subjectId: string; data: { code: string } }
  | {
      type: 'batch released';
      subjectId: string;
      data: { code: string; teams: number; players: number; sha256: string };
    }
  | { type: 'batch marked'; subjectId: string; data: { code: string; from: string; to: string } }
  | { type: 'bundle built'; subjectId: string; data: { code: string; files: number; bytes: number } }
  | { type: 'bundle queued again'; subjectId: string; data: { code: string } }
  | { type: 'bundle downloaded'; subjectId: string; data: { code: string; file: string } };

/** One edit of a roster: a cell with both values, or a player added, removed or moved. */
export type RosterChange =
  | { kind: 'cell'; playerId: string; field: string; from: string; to: string }
  | { kind: 'added'; playerId: string }
  | { kind: 'removed'; playerId: string; was: string }
  | { kind: 'moved'; playerId: string };

/** What happens outside any one league: to an account, or a decorator's view over several leagues. */
export type SystemEvent =
  | { type: 'account made'; data: Record<string, never> }
  | { type: 'signed in'; data: Record<string, never> }
  | { type: 'sign-in refused'; data: { because: 'wrong' | 'throttled' } }
  | { type: 'signed out everywhere'; data: Record<string, never> }
  | { type: 'password reset asked for'; data: Record<string, never> }
  | { type: 'password changed'; data: { how: 'reset' | 'settings' } }
  | { type: 'batches listed over leagues'; data: { batches: number } };

/**
 * The fields of `before` and `after` that differ, compared as JSON; null when nothing does. The order of keys counts for
 * nothing, because the database keeps its own.
 */
export function listDifferences<T extends Record<string, unknown>>(before: T, after: T): Difference | null {
  const changed = Object.keys(after).filter((key) => writePlain(before[key]) !== writePlain(after[key]));
  if (changed.length === 0) return null;
  return Object.fromEntries(
    changed.map((key) => [key, { from: before[key] ?? null, to: after[key] ?? null }]),
  );
}

/** As canonical JSON, after JSON itself has made a date a text. */
const writePlain = (value: unknown): string => writeCanonicalJson(JSON.parse(JSON.stringify(value ?? null)));
