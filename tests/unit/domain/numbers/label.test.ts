import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readNumber } from '@/lib/domain/numbers/label';
import { anyText } from '../../../support/arbitrary-rosters';

const labelOf = (text: string): string | null => {
  const reading = readNumber(text);
  return reading.ok ? reading.label : null;
};

describe('readNumber reads what people type for a number', () => {
  it.each([
    ['7', '7'],
    ['07', '07'],
    ['00', '00'],
    [' 7 ', '7'],
    ['7.0', '7'],
    ['12.00', '12'],
    ['7.', '7'],
    ['No. 7', '7'],
    ['no 7', '7'],
    ['NO.7', '7'],
    ['nº 7', '7'],
    ['n° 7', '7'],
    ['N.º 7', '7'],
    ['№ 7', '7'],
    ['Nr. 7', '7'],
    ['Number 7', '7'],
    ['#07', '07'],
    ['# 7', '7'],
    ["'07", '07'],
    ['’07', '07'],
    ['٧', '7'],
    ['١٠', '10'],
    ['٧٫٠', '7'],
    ['७', '7'],
    ['７', '7'],
    ['𝟕', '7'],
    ['\u200f7\u200e', '7'],
    ['\u00a07', '7'],
  ])('%j is %s', (text, label) => {
    expect(labelOf(text)).toBe(label);
  });

  it('says how it read a text that is not the label itself, and nothing when it is', () => {
    expect(readNumber('No. 7')).toEqual({ ok: true, label: '7', readAs: 'Read as 7.' });
    expect(readNumber('07')).toEqual({ ok: true, label: '07', readAs: null });
  });

  it('reads the digits of every script that Unicode calls decimal', () => {
    for (let code = 0; code <= 0x10ffff; code += 1) {
      const digit = String.fromCodePoint(code);
      if (/\p{Nd}/u.test(digit)) expect(labelOf(digit)).toMatch(/^[0-9]$/);
    }
  });
});

describe('readNumber never guesses', () => {
  it.each([
    ['7 or 9', 'holds more than one number'],
    ['7/8', 'holds more than one number'],
    ['1 2', 'holds more than one number'],
    ['1,5', 'is not a whole number'],
    ['7.5', 'is not a whole number'],
    ['-3', 'has a minus sign'],
    ['−3', 'has a minus sign'],
    ['seven', 'has no digits'],
    ['7a', 'holds more than a number'],
    ['7²', 'is not written in ordinary digits'],
    ['½', 'is not written in ordinary digits'],
    ['⑦', 'is not written in ordinary digits'],
    ['Ⅶ', 'is not written in ordinary digits'],
    ['123456789012345678901', 'is too long to be a number'],
  ])('%j is refused because it %s', (text, because) => {
    const reading = readNumber(text);
    expect(reading).toMatchObject({ ok: false, empty: false });
    expect(reading.ok ? '' : reading.reason).toContain(because);
  });

  it.each(['', ' ', '\t', '\u200b', '\ufeff'])('%j is a blank, not an unreadable number', (text) => {
    expect(readNumber(text)).toMatchObject({ ok: false, empty: true });
  });
});

describe('readNumber, for any text', () => {
  it('gives digits or a sentence, and never throws', () => {
    fc.assert(
      fc.property(anyText, (text) => {
        const reading = readNumber(text);
        if (reading.ok) expect(reading.label).toMatch(/^[0-9]{1,20}$/);
        else expect(reading.reason).toMatch(/\.$/);
      }),
    );
  });

  it('reads a label it has read as itself', () => {
    fc.assert(
      fc.property(fc.oneof(anyText, fc.stringMatching(/^(No\. |#|')?[0-9٠-٩]{1,4}(\.0)?$/)), (text) => {
        const label = labelOf(text);
        fc.pre(label !== null);
        expect(readNumber(label ?? '')).toEqual({ ok: true, label, readAs: null });
      }),
    );
  });
});
