import { differenceCiede2000 } from 'culori/fn';
import { parseHex } from './parse-hex';

/** A colour in CIELAB under daylight D65: lightness 0–100, a and b about −128 to 127. */
export type Lab = { l: number; a: number; b: number };

const ciede2000 = differenceCiede2000();

/**
 * The CIEDE2000 difference of two CIELAB colours with kL = kC = kH = 1, after Sharma, Wu and Dalal, "The CIEDE2000
 * color-difference formula", Color Research and Application 30(1), 2005, 21–30. 0 is the same, about 100 black and white.
 */
export const labDifference = (a: Lab, b: Lab): number =>
  ciede2000({ mode: 'lab65', ...a }, { mode: 'lab65', ...b });

/**
 * The CIEDE2000 difference of two sRGB colours, taken through CIELAB under D65. A hexadecimal value only estimates dyed
 * cloth. The formula was made for small differences: above about 30 it tells that colours differ, not by how much.
 */
export const colourDifference = (a: string, b: string): number => ciede2000(parseHex(a), parseHex(b));
