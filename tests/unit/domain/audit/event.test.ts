import { describe, expect, it } from 'vitest';
import { listDifferences } from '@/lib/domain/audit/event';

describe('the difference kept in the history', () => {
  it('holds the changed fields with both values and nothing else', () => {
    expect(
      listDifferences({ name: 'Otters', kit: { body: '#fff' } }, { name: 'Otters', kit: { body: '#000' } }),
    ).toEqual({
      kit: { from: { body: '#fff' }, to: { body: '#000' } },
    });
  });

  it('is null when only the order of keys changed, and tells two instants apart', () => {
    expect(
      listDifferences({ kit: { a: 1, b: [{ c: 1, d: 2 }] } }, { kit: { b: [{ d: 2, c: 1 }], a: 1 } }),
    ).toBeNull();
    expect(listDifferences({ at: new Date(0) }, { at: new Date(0) })).toBeNull();
    expect(listDifferences({ at: new Date(0) }, { at: new Date(1) })).not.toBeNull();
  });

  it('is null when nothing changed', () => {
    expect(listDifferences({ a: 1 }, { a: 1 })).toBeNull();
  });
});
