import fc from 'fast-check';
import { expect, it } from 'vitest';
import { contrastRatio } from '@/lib/domain/colour/contrast-ratio';
import { pickReadableInk } from '@/lib/domain/colour/readable-ink';

it('words on a team’s colour reach 4.5 to 1, whatever the colour', () => {
  fc.assert(
    fc.property(fc.integer({ min: 0, max: 0xffffff }), (value) => {
      const ground = `#${value.toString(16).padStart(6, '0')}`;
      expect(contrastRatio(pickReadableInk(ground), ground)).toBeGreaterThanOrEqual(4.5);
    }),
    { numRuns: 2000 },
  );
});
