/** Characters that never join their neighbours: ASCII and the ready-made Latin letters. */
const single = /^[\x20-\x7e\u00c0-\u02af]*$/;
const segmenter = new Intl.Segmenter('en', { granularity: 'grapheme' });

/** The letters of a text as a person would count them (grapheme clusters, Unicode UAX 29): é and an emoji are one. */
export const listGraphemes = (text: string): string[] =>
  single.test(text) ? text.split('') : Array.from(segmenter.segment(text), (part) => part.segment);

/** How many letters, spaces and marks a person would count in a text; 0 for an empty one. */
export const countGraphemes = (text: string): number =>
  single.test(text) ? text.length : listGraphemes(text).length;
