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

  it('is null when nothing changed', () => {
    expect(listDifferences({ a: 1 }, { a: 1 })).toBeNull();
  });
});
