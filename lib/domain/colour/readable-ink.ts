import { contrastRatio } from './contrast-ratio';

const black = '#000000';
const white = '#ffffff';

/** Black or white, whichever stands out more from a ground of any colour; at least 4.5 to 1 for every ground. */
export const pickReadableInk = (ground: string): string =>
  contrastRatio(black, ground) >= contrastRatio(white, ground) ? black : white;
