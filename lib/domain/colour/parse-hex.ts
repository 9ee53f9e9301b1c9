import { modeLab65, modeLrgb, modeRgb, useMode as registerMode, type Rgb } from 'culori/fn';

registerMode(modeLrgb);
registerMode(modeLab65);
const toRgb = registerMode(modeRgb);

/** A colour of `hexSchema` as sRGB; anything else is a fault of the caller and throws. */
export function parseHex(hex: string): Rgb {
  const colour = toRgb(hex);
  if (colour === undefined) throw new Error(`Not a colour: ${hex}`);
  return colour;
}
