import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { colourDifference } from '@/lib/domain/colour/colour-difference';
import { contrastRatio, writeRatio } from '@/lib/domain/colour/contrast-ratio';
import { parseHex } from '@/lib/domain/colour/parse-hex';

const hex = fc.integer({ min: 0, max: 0xffffff }).map((value) => `#${value.toString(16).padStart(6, '0')}`);

describe('the difference of two colours', () => {
  it('is nought for a colour and itself, the same both ways, and never negative', () => {
    fc.assert(
      fc.property(hex, hex, (a, b) => {
        expect(colourDifference(a, a)).toBe(0);
        expect(colourDifference(a, b)).toBeCloseTo(colourDifference(b, a), 9);
        expect(colourDifference(a, b)).toBeGreaterThanOrEqual(0);
      }),
    );
  });

  it('is 100 for black and white', () => {
    expect(colourDifference('#000000', '#ffffff')).toBeCloseTo(100, 3);
  });
});

describe('the contrast of two colours', () => {
  it('is from 1 to 21 and the same both ways, whatever the colours', () => {
    fc.assert(
      fc.property(hex, hex, (a, b) => {
        const ratio = contrastRatio(a, b);
        expect(ratio).toBeGreaterThanOrEqual(1);
        expect(ratio).toBeLessThanOrEqual(21 + 1e-9);
        expect(contrastRatio(b, a)).toBe(ratio);
      }),
    );
  });

  it('is never written larger than it is', () => {
    fc.assert(
      fc.property(hex, hex, (a, b) => {
        const ratio = contrastRatio(a, b);
        const written = Number(writeRatio(ratio).replace(' to 1', ''));
        expect(written).toBeLessThanOrEqual(ratio);
        expect(ratio - written).toBeLessThan(0.01 + 1e-9);
      }),
    );
  });
});

describe('a colour that is none', () => {
  it.each(['', 'navy blue', '#12345', 'url(#a)'])('throws instead of passing for black: %j', (text) => {
    expect(() => parseHex(text)).toThrow('Not a colour');
  });
});
