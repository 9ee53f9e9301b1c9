import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { batchStates, nextBatchState, previousBatchState } from '@/lib/domain/batch/batch-state';
import { writeCanonicalJson } from '@/lib/domain/batch/canonical-json';

describe('the states of a batch', () => {
  it('follow each other one by one and end with received', () => {
    expect(batchStates.map(nextBatchState)).toEqual([...batchStates.slice(1), null]);
  });

  it('can be taken back by one, but never to held: a release is for good', () => {
    expect(batchStates.map(previousBatchState)).toEqual([
      null,
      null,
      'released',
      'on press',
      'packed',
      'shipped',
    ]);
  });
});

describe('canonical JSON', () => {
  it('is the same text for equal values whatever the order of their keys, and reads back as the same value', () => {
    fc.assert(
      fc.property(fc.dictionary(fc.string(), fc.jsonValue()), (value) => {
        const turned = Object.fromEntries(Object.entries(value).reverse());
        expect(writeCanonicalJson(turned)).toBe(writeCanonicalJson(value));
        expect(JSON.parse(writeCanonicalJson(value))).toEqual(JSON.parse(JSON.stringify(value)));
      }),
    );
  });
});
