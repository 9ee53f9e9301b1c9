import { describe, expect, it } from 'vitest';
import { numberContrast } from '@/lib/domain/kit/kit-clash';
import { contrastRatio, writeRatio } from '@/lib/domain/colour/contrast-ratio';

/**
 * Source: W3C, Web Content Accessibility Guidelines 2.2 (definition of contrast ratio), Understanding SC 1.4.11 and
 * Techniques G183 and G195. Ratios as printed there, some rounded and some cut, so each must hold one way or the other.
 */
const stated = [
  ['#000000', '#ffffff', '21'],
  ['#949494', '#ffffff', '3'],
  ['#e5e5e5', '#6221ea', '5.6'],
  ['#fff000', '#ffffff', '1.2'],
  ['#cccccc', '#ffffff', '1.6'],
  ['#ffffff', '#6e747b', '4.7'],
  ['#000000', '#dedede', '15'],
  ['#9d9d9d', '#ffffff', '2.7'],
  ['#aaaaaa', '#ffffff', '2.3'],
  ['#3366cc', '#000000', '3.9'],
  ['#ff3838', '#ffffff', '3.6'],
] as const;

describe('contrast ratio agrees with W3C', () => {
  it.each(stated)('%s on %s is printed as %s', (a, b, printed) => {
    const decimals = printed.split('.')[1]?.length ?? 0;
    const scale = 10 ** decimals;
    const ratio = contrastRatio(a, b);
    expect([ratio.toFixed(decimals), (Math.floor(ratio * scale) / scale).toFixed(decimals)]).toContain(
      printed,
    );
    expect(contrastRatio(b, a)).toBe(ratio);
  });

  it('puts the pairs that Understanding SC 1.4.11 calls failing below 3 and the passing one above', () => {
    expect(contrastRatio('#00c7fd', '#ffffff')).toBeLessThan(3);
    expect(contrastRatio('#b1262b', '#0d0f13')).toBeLessThan(3);
    expect(contrastRatio('#e3660e', '#ffffff')).toBeGreaterThan(3);
  });

  /**
   * Understanding SC 1.4.3 and SC 1.4.11: a ratio is not rounded before it is compared; 4.499 to 1 does not meet 4.5 to
   * 1, and 2.999 to 1 does not meet 3 to 1. The colours are our own.
   */
  it.each([
    ['#438540', 4.499, '4.5', '4.49 to 1', 'thin'],
    ['#52a750', 2.999, '3.0', '2.99 to 1', 'poor'],
  ] as const)(
    'never rounds before it compares: white on %s, at %d, fails %s',
    (body, stated, limit, says, verdict) => {
      const ratio = contrastRatio('#ffffff', body);
      expect(ratio.toFixed(3)).toBe(stated.toFixed(3));
      expect(ratio.toFixed(1)).toBe(limit);
      expect(writeRatio(ratio)).toBe(says);
      const kit = { name: 'trial', body, sleeves: body, number: '#ffffff', outline: null };
      expect(numberContrast(kit)).toMatchObject({ ratio, verdict });
    },
  );
});
