import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { countGraphemes, listGraphemes } from '@/lib/domain/text/graphemes';
import { isLatinText, keepLatin, listNonLatin } from '@/lib/domain/text/latin-letters';
import { foldText, tidyText } from '@/lib/domain/text/normalise-text';
import { anyText } from '../../../support/arbitrary-rosters';

describe('tidyText', () => {
  it('takes off what nobody sees and keeps what is read', () => {
    expect(tidyText('\ufeff  Pip\u00a0\t Dunmore\u200f ')).toBe('Pip Dunmore');
    expect(tidyText('e\u0301')).toBe('é');
    expect(tidyText('e\u200b\u0301')).toBe('é');
    expect(tidyText('👩‍👧')).toBe('👩‍👧');
  });

  it('changes nothing the second time, and neither does foldText', () => {
    fc.assert(
      fc.property(anyText, (text) => {
        expect(tidyText(tidyText(text))).toBe(tidyText(text));
        expect(foldText(foldText(text))).toBe(foldText(text));
      }),
    );
  });
});

describe('graphemes', () => {
  it('are what a reader counts', () => {
    expect(['e\u0301', '👩‍👩‍👧', 'Ñandú', 'ab c'].map(countGraphemes)).toEqual([1, 1, 5, 4]);
  });
  it('put together give the text again', () => {
    fc.assert(
      fc.property(anyText, (text) => {
        expect(listGraphemes(text).join('')).toBe(text);
      }),
    );
  });
});

describe('Latin letters', () => {
  it.each(['Ñandú', 'N\u0303andu', "O'Brook", 'O’Brook', 'Brook-Lane', 'St. Brook', 'Łącki', 'ß', ''])(
    '%j is',
    (text) => {
      expect(isLatinText(text)).toBe(true);
    },
  );
  it.each(['Brook1', 'Βrook', 'Броок', 'مريم', 'Brook_', '👧', '\u0301'])('%j is not', (text) => {
    expect(isLatinText(text)).toBe(false);
  });
  it('are kept, stand-ins put right, and the rest is listed', () => {
    expect(keepLatin('O`Brook‑Lane 7')).toBe("O'Brook-Lane");
    expect(listNonLatin('B7r7ö8')).toEqual(['7', '8']);
  });
  it('are all that is left of any text', () => {
    fc.assert(
      fc.property(anyText, (text) => {
        expect(isLatinText(keepLatin(text))).toBe(true);
        expect(isLatinText(text)).toBe(listNonLatin(text).length === 0);
      }),
    );
  });
});
