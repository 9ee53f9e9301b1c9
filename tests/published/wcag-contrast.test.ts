import { describe, expect, it } from 'vitest';
import { contrastRatio } from '@/lib/domain/colour/contrast-ratio';

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
});
