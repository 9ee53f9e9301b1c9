import { describe, expect, it } from 'vitest';
import { describeEvent, listChanges } from '@/lib/domain/audit/describe-event';
import { listDifferences, type AuditEvent } from '@/lib/domain/audit/event';
import { eventKinds, listTypesOfKind } from '@/lib/domain/audit/event-kinds';

const subjectId = '00000000-0000-4000-8000-000000000000';

describe('an event of the history', () => {
  it('is told with its figures in words', () => {
    const tell = (event: AuditEvent) => describeEvent(event);
    expect(
      tell({ type: 'batch released', subjectId, data: { code: 'B-07', teams: 19, players: 1, sha256: 'x' } }),
    ).toBe('released batch B-07 of 19 teams and 1 player');
    expect(
      tell({
        type: 'manager teams changed',
        subjectId,
        data: { person: 'Nia', added: ['Otters', 'Herons'], removed: ['Egrets'] },
      }),
    ).toBe('named Nia manager of Otters and Herons and took Egrets from Nia');
    expect(
      tell({
        type: 'season changed',
        subjectId,
        data: { name: 'Spring', changes: { freezesAt: { from: 'a', to: 'b' } } },
      }),
    ).toBe('changed the season Spring: freezes at');
    expect(
      tell({
        type: 'roster imported',
        subjectId,
        data: { team: 'Otters', added: 12, changed: 0, removed: 1, refused: 2 },
      }),
    ).toBe('imported players into the roster of Otters: 12 added, 0 changed, 1 removed and 2 refused');
    expect(
      tell({
        type: 'roster edited',
        subjectId,
        data: {
          team: 'Otters',
          changes: [
            { kind: 'cell', playerId: 'p', field: 'number', from: '7', to: '07' },
            { kind: 'added', playerId: 'q' },
          ],
        },
      }),
    ).toBe('edited the roster of Otters: 1 cell and 1 player added');
  });

  it('of a type from a later version is told by its type', () => {
    const event = { type: 'kite flown', subjectId, data: {} } as unknown as AuditEvent;
    expect(describeEvent(event)).toBe('kite flown');
    expect(listChanges(event)).toEqual([]);
  });

  it('shows each change with both values', () => {
    const changes = listDifferences(
      { name: 'A', unit: 'mm', extra: null },
      { name: 'B', unit: 'mm', extra: { a: 1 } },
    );
    expect(listChanges({ type: 'league changed', subjectId, data: { changes: changes ?? {} } })).toEqual([
      { what: 'name', from: 'A', to: 'B' },
      { what: 'extra', from: '', to: '{"a":1}' },
    ]);
    expect(
      listChanges({
        type: 'roster edited',
        subjectId,
        data: {
          team: 'Otters',
          changes: [{ kind: 'cell', playerId: 'p', field: 'size:jersey', from: '', to: 'YM' }],
        },
      }),
    ).toEqual([{ what: 'size of jersey', from: '', to: 'YM' }]);
  });

  it('belongs to exactly one kind', () => {
    const types = eventKinds.flatMap(listTypesOfKind);
    expect(new Set(types).size).toBe(types.length);
    for (const kind of eventKinds) expect(listTypesOfKind(kind)).not.toEqual([]);
  });
});
