import type { AuditEvent } from './event';

/** What the history can be narrowed to. */
export const eventKinds = [
  'league and people',
  'season',
  'teams',
  'number rules',
  'rosters',
  'batches',
] as const;
export type EventKind = (typeof eventKinds)[number];

const kindOf: Record<AuditEvent['type'], EventKind> = {
  'league created': 'league and people',
  'league changed': 'league and people',
  'person invited': 'league and people',
  'invitation sent again': 'league and people',
  'invitation withdrawn': 'league and people',
  'invitation accepted': 'league and people',
  'manager teams changed': 'league and people',
  'membership ended': 'league and people',
  'shop added': 'league and people',
  'season opened': 'season',
  'season changed': 'season',
  'division added': 'season',
  'division changed': 'season',
  'division removed': 'season',
  'team added': 'teams',
  'team changed': 'teams',
  'team removed': 'teams',
  'teams imported': 'teams',
  'rule set started': 'number rules',
  'rule set drafted': 'number rules',
  'rule set draft discarded': 'number rules',
  'rule set put in force': 'number rules',
  'roster edited': 'rosters',
  'roster imported': 'rosters',
  'roster submitted': 'rosters',
  'roster withdrawn': 'rosters',
  'roster returned': 'rosters',
  'roster signed off': 'rosters',
  'roster reopened': 'rosters',
  'roster frozen': 'rosters',
  'managers reminded': 'rosters',
  'batch held': 'batches',
  'batch changed': 'batches',
  'batch discarded': 'batches',
  'batch released': 'batches',
  'batch marked': 'batches',
  'bundle built': 'batches',
  'bundle queued again': 'batches',
  'bundle downloaded': 'batches',
};

/** The types of event that belong to a kind. */
export const listTypesOfKind = (kind: EventKind): string[] =>
  Object.entries(kindOf).flatMap(([type, of]) => (of === kind ? [type] : []));
