import { describe, expect, it } from 'vitest';
import { colourDifference, labDifference } from '@/lib/domain/colour/colour-difference';

/**
 * Source: G. Sharma, W. Wu, E. N. Dalal, "The CIEDE2000 color-difference formula: implementation notes, supplementary
 * test data, and mathematical observations", Color Research and Application 30(1), 2005, 21–30, Table 1. Thirteen of its
 * 34 pairs, retyped: pair, L a b of the first colour, L a b of the second, printed difference.
 */
const pairs = [
  [1, [50, 2.6772, -79.7751], [50, 0, -82.7485], 2.0425],
  [2, [50, 3.1571, -77.2803], [50, 0, -82.7485], 2.8615],
  [4, [50, -1.3802, -84.2814], [50, 0, -82.7485], 1.0],
  [7, [50, 0, 0], [50, -1, 2], 2.3669],
  [16, [50, 2.5, 0], [50, 0, -2.5], 4.3065],
  [17, [50, 2.5, 0], [73, 25, -18], 27.1492],
  [18, [50, 2.5, 0], [61, -5, 29], 22.8977],
  [19, [50, 2.5, 0], [56, -27, -3], 31.903],
  [20, [50, 2.5, 0], [58, 24, 15], 19.4535],
  [25, [60.2574, -34.0099, 36.2677], [60.4626, -34.1751, 39.4387], 1.2644],
  [28, [35.0831, -44.1164, 3.7933], [35.0232, -40.0716, 1.5901], 1.8645],
  [31, [90.8027, -2.0831, 1.441], [91.1528, -1.6435, 0.0447], 1.4441],
  [34, [2.0776, 0.0795, -1.135], [0.9033, -0.0636, -0.5514], 0.9082],
] as const;
const lab = ([l, a, b]: readonly [number, number, number]) => ({ l, a, b });

describe('CIEDE2000 agrees with Sharma, Wu and Dalal 2005, Table 1, to four decimals', () => {
  it.each(pairs)('pair %i', (_, first, second, printed) => {
    expect(labDifference(lab(first), lab(second)).toFixed(4)).toBe(printed.toFixed(4));
    expect(labDifference(lab(second), lab(first)).toFixed(4)).toBe(printed.toFixed(4));
  });

  /**
   * Lab of pure blue under D65 (32.30, 79.19, −107.86) and D50 (29.57, 68.30, −112.03), from memory of widely printed
   * values: the difference must be taken under D65, or verdicts near a limit turn.
   */
  it('takes hexadecimal colours through CIELAB under D65, not D50', () => {
    const underD65 = labDifference({ l: 32.3, a: 79.19, b: -107.86 }, { l: 100, a: 0, b: 0 });
    const underD50 = labDifference({ l: 29.57, a: 68.3, b: -112.03 }, { l: 100, a: 0, b: 0 });
    expect(colourDifference('#0000ff', '#ffffff')).toBeCloseTo(underD65, 1);
    expect(Math.abs(underD65 - underD50)).toBeGreaterThan(1);
  });
});
