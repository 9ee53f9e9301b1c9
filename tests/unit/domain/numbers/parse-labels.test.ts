import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { compareLabels, parseAllowedLabels, writeLabels } from '@/lib/domain/numbers/parse-labels';

const read = (text: string): string[] | string => {
  const parsed = parseAllowedLabels(text);
  return parsed.ok ? parsed.value : parsed.error;
};

describe('parseAllowedLabels', () => {
  it.each([
    ['0, 00, 1–5, 10-15', ['00', '0', '1', '2', '3', '4', '5', '10', '11', '12', '13', '14', '15']],
    ['3;2 1', ['1', '2', '3']],
    ['1 - 3', ['1', '2', '3']],
    ['01-03', ['01', '02', '03']],
    ['07, 7', ['07', '7']],
    ['5, 5, 4-6', ['4', '5', '6']],
    ['١-٣', ['1', '2', '3']],
  ])('reads %j in wearing order without repeats', (text, labels) => {
    expect(read(text)).toEqual(labels);
  });

  it.each([
    ['9-3', '“9-3” runs backwards. Write 3-9.'],
    ['1-x', '“1-x” is neither a number nor a range. Write it like 7, 00 or 10-15.'],
    ['1-2-3', '“1-2-3” is neither a number nor a range. Write it like 7, 00 or 10-15.'],
    ['1000', '“1000” has more than three digits.'],
    ['00-99', '“00-99” starts at 00. Write 00, 0-99 instead.'],
    ['01-120', '“01-120” mixes leading zeros. Write both ends with the same number of digits.'],
    [' , ', 'Name at least one number, such as 0, 00, 1-99.'],
    ['1,'.repeat(201), 'Write the numbers in at most 400 characters.'],
  ])('refuses %j with a sentence', (text, sentence) => {
    expect(read(text)).toBe(sentence);
  });

  it('never throws and never gives more than the 1,110 labels there are', () => {
    fc.assert(
      fc.property(fc.oneof(fc.string(), fc.stringMatching(/^[0-9,; –-]{0,40}$/)), (text) => {
        const parsed = parseAllowedLabels(text);
        if (parsed.ok) expect(parsed.value.length).toBeLessThanOrEqual(1110);
      }),
    );
  });

  it('reads what writeLabels writes back as the same labels', () => {
    const label = fc.oneof(fc.integer({ min: 0, max: 999 }).map(String), fc.constantFrom('00', '07', '01'));
    fc.assert(
      fc.property(fc.uniqueArray(label, { minLength: 1, maxLength: 40 }), (labels) => {
        const sorted = [...labels].sort(compareLabels);
        expect(read(writeLabels(sorted))).toEqual(sorted);
      }),
    );
  });
});

it('writeLabels joins runs and puts 0 before 00', () => {
  expect(writeLabels(['00', '0', '1', '2', '3', '7', '8', '10'])).toBe('0, 00, 1–3, 7, 8, 10');
  expect(writeLabels(['0', '1', '2'])).toBe('0–2');
});
