import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { tidyText } from '@/lib/domain/text/normalise-text';
import { typeStyles } from '@/lib/documents/text/font-faces';
import { splitRuns } from '@/lib/documents/text/split-runs';

const drawn = (text: string) => splitRuns('text', text).map((run) => run.text);
const faces = (text: string) => splitRuns('text', text).map((run) => run.face);

describe('runs of text', () => {
  it('lose no character and add none, for any text in any style', () => {
    const sorted = (text: string) => [...text.replace(/[()[\]{}<>«»]/g, '|')].sort().join('');
    fc.assert(
      fc.property(
        fc.string({ unit: 'grapheme', maxLength: 40 }),
        fc.constantFrom(...typeStyles),
        (text, style) => {
          const runs = splitRuns(style, text);
          expect(sorted(runs.map((run) => run.text).join(''))).toBe(sorted(tidyText(text)));
        },
      ),
      { numRuns: 400 },
    );
  });

  it('keep Latin names of every spelling in the house face', () => {
    for (const name of [
      'Adisa, Wren',
      'Đặng Thị Quỳnh-Như',
      'Şimşekoğlu',
      'Třebízská',
      'Łukasz Ødegård',
      'O’Dunnavan',
    ]) {
      expect(faces(name), name).toEqual(['archivo-400']);
    }
  });

  it('send Greek, Cyrillic, Hebrew and Arabic to faces that have them', () => {
    expect(faces('Ειρήνη')).toEqual(['noto-400']);
    expect(faces('Ольга')).toEqual(['noto-400']);
    expect(faces('עמית')).toEqual(['hebrew-400']);
    expect(faces('سهيل الوادي')).toEqual(['arabic-400']);
  });

  it('are in drawing order from left to right where directions mix', () => {
    // A right-to-left run is drawn from its end: its last character, here the space, stands leftmost.
    expect(drawn('עמית Levi')).toEqual(['Levi', 'עמית ']);
    expect(drawn('Levi עמית')).toEqual(['Levi ', 'עמית']);
    expect(drawn('עמית 42')).toEqual(['42', 'עמית ']);
    expect(drawn('עמית Team 7')).toEqual(['Team 7', 'עמית ']);
    expect(drawn('Team 7 עמית')).toEqual(['Team 7 ', 'עמית']);
    expect(drawn('Ana (עמית) Ruiz')).toEqual(['Ana (', 'עמית', ') Ruiz']);
  });

  it('mirror brackets in right-to-left text', () => {
    expect(drawn('(עמית)')).toEqual(['עמית(', ')']);
  });

  it('give a letter that no face draws a run of its own without a face', () => {
    const runs = splitRuns('strong', 'A🏀ქB');
    expect(runs.map((run) => [run.text, run.face])).toEqual([
      ['A', 'archivo-600'],
      ['🏀', null],
      ['ქ', null],
      ['B', 'archivo-600'],
    ]);
  });

  it('keep a letter and its marks together in one face', () => {
    expect(drawn('e\u0323\u0301')).toHaveLength(1);
    expect(drawn('q\u0323\u0301a')).toHaveLength(1);
  });
});
