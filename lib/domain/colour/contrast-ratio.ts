import { wcagContrast } from 'culori/fn';
import { parseHex } from './parse-hex';

/**
 * The contrast ratio of two colours, from 1 (the same) to 21 (black on white), whichever comes first. Computed from
 * relative luminance as in W3C, Web Content Accessibility Guidelines 2.2. Not rounded: 4.499 is less than 4.5.
 */
export const contrastRatio = (a: string, b: string): number => wcagContrast(parseHex(a), parseHex(b));

/** A ratio as a person reads it, cut to two decimals, never rounded up over a threshold: "4.49 to 1". */
export const writeRatio = (ratio: number): string => `${Math.floor(ratio * 100) / 100} to 1`;
