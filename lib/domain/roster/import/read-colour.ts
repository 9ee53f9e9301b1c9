import { foldText, tidyText } from '../../text/normalise-text';

/** Plain colour names and their values. Source: W3C, CSS Color Module Level 4, section 6.1, named colours. */
// prettier-ignore
const namedColours: Record<string, string> = {
  black: '#000000', white: '#ffffff', red: '#ff0000', maroon: '#800000', crimson: '#dc143c', orange: '#ffa500',
  gold: '#ffd700', yellow: '#ffff00', olive: '#808000', lime: '#00ff00', green: '#008000', 'dark green': '#006400',
  teal: '#008080', turquoise: '#40e0d0', cyan: '#00ffff', aqua: '#00ffff', 'sky blue': '#87ceeb',
  'light blue': '#add8e6', 'royal blue': '#4169e1', blue: '#0000ff', 'dark blue': '#00008b', navy: '#000080',
  indigo: '#4b0082', purple: '#800080', violet: '#ee82ee', magenta: '#ff00ff', pink: '#ffc0cb', brown: '#a52a2a',
  beige: '#f5f5dc', ivory: '#fffff0', silver: '#c0c0c0', grey: '#808080', gray: '#808080',
  'dark grey': '#a9a9a9', 'dark gray': '#a9a9a9',
};

/** A colour as a person wrote it: `name` is what it is called (the hexadecimal digits when it has no other name). */
export type ReadColour = { name: string; hex: string };

/**
 * Reads a colour: "#14375e", "14375e", "Navy (#14375e)", or one of a few plain names such as "navy" or "royal blue".
 * `hex` is # and six lower-case digits. Null when the text is no such colour; names are kept up to 40 characters.
 */
export function readColour(text: string): ReadColour | null {
  const tidy = tidyText(text);
  const match = /(?:^|[^0-9a-z])#?([0-9a-f]{6})(?![0-9a-z])/i.exec(tidy);
  if (match) {
    const hex = `#${(match[1] ?? '').toLowerCase()}`;
    const name = tidy
      .replace(/#?[0-9a-f]{6}(?![0-9a-z])/i, ' ')
      .replace(/[()[\],;:/]/g, ' ')
      .replace(/ +/g, ' ')
      .trim();
    return name.length > 40 ? null : { name: name || hex, hex };
  }
  const words = foldText(tidy).replace(/[-_ ]+/g, ' ');
  const found = Object.keys(namedColours).find((name) => name === words || name.replace(' ', '') === words);
  const hex = found === undefined ? undefined : namedColours[found];
  return hex === undefined || found === undefined ? null : { name: tidy.toLowerCase(), hex };
}
