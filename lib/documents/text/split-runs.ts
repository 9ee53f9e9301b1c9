import { listGraphemes } from '@/lib/domain/text/graphemes';
import { tidyText } from '@/lib/domain/text/normalise-text';
import { covers, styleFaces, type FaceName, type TypeStyle } from './font-faces';

/** A stretch of text in one face and one direction; `face` is null for a letter that no face draws. */
export type TextRun = { text: string; face: FaceName | null; rightToLeft: boolean };

type Letter = { text: string; face: FaceName | null; level: number };

const rightToLeft = /\p{Script=Hebrew}|\p{Script=Arabic}|\p{Script=Syriac}|\p{Script=Thaana}|\p{Script=Nko}/u;
const common = /^[\p{Script=Common}\p{Script=Inherited}]+$/u;
const mirrored: Record<string, string> = {
  '(': ')',
  ')': '(',
  '[': ']',
  ']': '[',
  '{': '}',
  '}': '{',
  '<': '>',
  '>': '<',
  '«': '»',
  '»': '«',
};

/**
 * Cuts a text into runs in the order in which they are drawn, left to right. Directions follow the Unicode
 * Bidirectional Algorithm (UAX 9) as far as names need it: the first letter with a direction sets that of the line,
 * numbers read left to right and belong to left-to-right text before them, spaces and marks take the direction of both neighbours or else that of the line, and
 * brackets are mirrored; nested embeddings are not.
 */
export function splitRuns(style: TypeStyle, text: string): TextRun[] {
  const letters = findLevels(listGraphemes(tidyText(text))).map(({ text: letter, level }) => ({
    text: level % 2 === 1 ? (mirrored[letter] ?? letter) : letter,
    level,
    face: null,
  }));
  chooseFaces(style, letters);
  return orderForDrawing(joinLetters(letters)).map(({ text: run, face, level }) => ({
    text: run,
    face,
    rightToLeft: level % 2 === 1,
  }));
}

/** Embedding levels: even reads left to right, odd right to left. */
function findLevels(letters: readonly string[]): { text: string; level: number }[] {
  const kinds = letters.map((letter) =>
    /^\p{N}/u.test(letter)
      ? 'number'
      : rightToLeft.test(letter)
        ? 'right'
        : /^\p{L}/u.test(letter)
          ? 'left'
          : 'neutral',
  );
  const base = kinds.find((kind) => kind === 'left' || kind === 'right') === 'right' ? 1 : 0;
  // Behind a left-to-right letter a number belongs to its text (UAX 9, rule W7).
  let strong = base === 1 ? 'right' : 'left';
  const resolved = kinds.map((kind) => {
    if (kind === 'left' || kind === 'right') strong = kind;
    return kind === 'number' && strong === 'left' ? 'left' : kind;
  });
  const levels = resolved.map((kind): number | null => {
    if (kind === 'neutral') return null;
    if (kind === 'right') return 1;
    return kind === 'left' && base === 0 ? 0 : 2;
  });
  // For what lies between, a number counts as part of the text around it (UAX 9, rule N1).
  const sideOf = (at: number, step: 1 | -1): number => {
    for (let i = at + step; i >= 0 && i < levels.length; i += step) {
      const level = levels[i];
      if (level != null) return resolved[i] === 'number' ? 1 : level;
    }
    return base;
  };
  return letters.map((text, at) => {
    const level = levels[at];
    if (level != null) return { text, level };
    const before = sideOf(at, -1);
    return { text, level: before === sideOf(at, 1) ? before : base };
  });
}

/** A mark or a space stays in the face of the letter it is read with, so that words are shaped in one piece. */
function chooseFaces(style: TypeStyle, letters: Letter[]): void {
  let last: Letter | undefined;
  for (const letter of letters) {
    const before: FaceName | null = last?.level === letter.level ? last.face : null;
    const stays: boolean = before !== null && common.test(letter.text) && covers(before, letter.text);
    letter.face = stays ? before : (styleFaces[style].find((face) => covers(face, letter.text)) ?? null);
    last = letter;
  }
}

function joinLetters(letters: readonly Letter[]): Letter[] {
  const runs: Letter[] = [];
  for (const letter of letters) {
    const run = runs.at(-1);
    // Letters without a face stay apart: each is drawn as a box of its own.
    if (run && run.face !== null && run.face === letter.face && run.level === letter.level) {
      run.text += letter.text;
    } else runs.push({ ...letter });
  }
  return runs;
}

/** UAX 9, rule L2: from the highest level down to 1, turn round every stretch at that level or above. */
function orderForDrawing(runs: readonly Letter[]): Letter[] {
  const ordered = [...runs];
  for (let level = Math.max(0, ...runs.map((run) => run.level)); level >= 1; level -= 1) {
    for (let from = 0; from < ordered.length; from += 1) {
      let to = from;
      while ((ordered[to]?.level ?? -1) >= level) to += 1;
      if (to > from) ordered.splice(from, to - from, ...ordered.slice(from, to).reverse());
      from = to;
    }
  }
  return ordered;
}
