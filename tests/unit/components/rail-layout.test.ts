import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { layOutRail, stepOnRail } from '@/components/number-rail/rail-layout';

const numbers = (from: number, to: number) =>
  Array.from({ length: to - from + 1 }, (_, index) => String(from + index));

describe('the layout of the number rail', () => {
  it('puts ten numbers on a line, each under the one ten less', () => {
    const places = layOutRail(numbers(0, 39));
    expect(places.get('4')).toEqual({ line: 0, column: 4 });
    expect(places.get('14')).toEqual({ line: 1, column: 4 });
    expect(places.get('39')).toEqual({ line: 3, column: 9 });
  });

  it('puts 00 before 0 and moves the rest one column on', () => {
    const places = layOutRail(['00', ...numbers(0, 19)]);
    expect(places.get('00')).toEqual({ line: 0, column: 0 });
    expect(places.get('0')).toEqual({ line: 0, column: 1 });
    expect(places.get('10')).toEqual({ line: 1, column: 1 });
  });

  it('keeps 07 apart from 7', () => {
    const places = layOutRail(['07', ...numbers(0, 9)]);
    expect(places.get('07')).toEqual({ line: 0, column: 7 });
    expect(places.get('7')).toEqual({ line: 1, column: 7 });
  });

  it('leaves out lines that hold nothing', () => {
    expect(layOutRail(['3', '93']).get('93')).toEqual({ line: 1, column: 3 });
  });

  it('never puts two labels in one place, whatever the labels are', () => {
    const label = fc.oneof(
      fc.integer({ min: 0, max: 999 }).map(String),
      fc.constantFrom('00', '000', '01', '07', '007', '09', '10', 'A', 'B1', ''),
    );
    fc.assert(
      fc.property(fc.uniqueArray(label, { maxLength: 120 }), (labels) => {
        const places = [...layOutRail(labels).values()].map(({ line, column }) => `${line}/${column}`);
        expect(places).toHaveLength(labels.length);
        expect(new Set(places).size).toBe(labels.length);
      }),
    );
  });
});

describe('the arrow keys on the number rail', () => {
  const labels = ['00', ...numbers(0, 29)];
  const step = (from: string, key: string) => stepOnRail(labels, layOutRail(labels), from, key);

  it('go along the numbers, over the ends of lines', () => {
    expect(step('9', 'ArrowRight')).toBe('10');
    expect(step('10', 'ArrowLeft')).toBe('9');
  });

  it('go up and down by ten', () => {
    expect(step('14', 'ArrowDown')).toBe('24');
    expect(step('14', 'ArrowUp')).toBe('4');
  });

  it('stay at the edges, and 00 has nothing below it', () => {
    expect(step('00', 'ArrowLeft')).toBe('00');
    expect(step('00', 'ArrowDown')).toBe('00');
    expect(step('29', 'ArrowRight')).toBe('29');
    expect(step('5', 'ArrowUp')).toBe('5');
  });

  it('skip lines without a number in the column', () => {
    const gaps = ['4', '15', '24'];
    expect(stepOnRail(gaps, layOutRail(gaps), '4', 'ArrowDown')).toBe('24');
  });

  it('leave other keys alone', () => {
    expect(step('14', 'x')).toBe('14');
  });
});
