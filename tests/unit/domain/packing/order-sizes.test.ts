import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { orderSizes } from '@/lib/domain/packing/order-sizes';

const whole = ['YXS', 'YS', 'YM', 'YL', 'AS', 'AM', 'AL'];

describe('one order for several size runs', () => {
  it('keeps the order of every run as long as the runs agree', () => {
    fc.assert(
      fc.property(fc.array(fc.subarray(whole), { maxLength: 5 }), (runs) => {
        const ordered = orderSizes(runs);
        for (const run of runs) {
          expect(ordered.filter((code) => run.includes(code))).toEqual(run);
        }
      }),
    );
  });

  it('names every code once, also when runs contradict each other or repeat a code', () => {
    fc.assert(
      fc.property(
        fc.array(fc.array(fc.constantFrom(...whole), { maxLength: 6 }), { maxLength: 4 }),
        (runs) => {
          expect([...orderSizes(runs)].sort()).toEqual([...new Set(runs.flat())].sort());
        },
      ),
    );
  });

  it('puts a size known to one run only between its neighbours', () => {
    expect(
      orderSizes([
        ['S', 'L'],
        ['S', 'M', 'L'],
      ]),
    ).toEqual(['S', 'M', 'L']);
  });
});
