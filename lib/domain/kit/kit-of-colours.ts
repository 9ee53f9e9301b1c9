import { pickReadableInk } from '../colour/readable-ink';
import type { Kit } from './kit';

type NamedColour = { name: string; hex: string };

/** A whole kit from one colour: sleeves like the body, and black or white for the number unless another was named. */
export const makeKitOfColours = (body: NamedColour, number: NamedColour | null): Kit => ({
  name: body.name.slice(0, 40),
  body: body.hex,
  sleeves: body.hex,
  number: number?.hex ?? pickReadableInk(body.hex),
  outline: null,
});

/** What a team wears until its colours are known. */
export const undecidedKit: Kit = {
  name: 'not chosen yet',
  body: '#ffffff',
  sleeves: '#ffffff',
  number: '#000000',
  outline: null,
};
