import { describe, expect, it } from 'vitest';
import { applyEdits } from '@/lib/domain/roster/apply-edits';
import { makeEmptyEntry } from '@/lib/domain/roster/cells';
import { isBlock, planPaste, readBlock } from '@/lib/domain/roster/paste-block';
import type { RosterColumn } from '@/lib/domain/roster/roster-columns';

const jersey = {
  code: 'jersey',
  name: 'Jersey',
  worn: 'home and away' as const,
  numbered: true,
  named: true,
  sizes: [
    { code: 'YM', label: 'Youth medium' },
    { code: 'YL', label: 'Youth large' },
  ],
};
const columns: RosterColumn[] = [
  { field: 'name', header: 'Player' },
  { field: 'number', header: 'No.' },
  { field: 'size:jersey', header: 'Jersey', garment: jersey },
];
const players = [
  { ...makeEmptyEntry('a'), name: 'Adisa', number: '4', sizes: { jersey: 'YM' } },
  { ...makeEmptyEntry('b'), name: 'Brook', number: '5' },
];
let next = 0;
const paste = (text: string, row = 0, column = 0, shown = players) => {
  const newId = () => `new ${(next += 1)}`;
  const plan = planPaste({ players, shown, columns, anchor: { row, column }, block: readBlock(text), newId });
  const { players: after, conflicts } = applyEdits(players, plan.edits);
  expect(conflicts).toEqual([]);
  return { ...plan, after: after.map(({ name, number, sizes }) => [name, number, sizes['jersey'] ?? '']) };
};

describe('a block pasted into a roster', () => {
  it('goes over the cells from the anchor on, and makes players of the rows below the last', () => {
    const { after, problems } = paste('5\tYL\n6\tYM\n7\tYL\n', 0, 1);
    expect(after).toEqual([
      ['Adisa', '5', 'YL'],
      ['Brook', '6', 'YM'],
      ['', '7', 'YL'],
    ]);
    expect(problems).toEqual([]);
  });

  it('is a block as soon as there is a tab, also before or behind an empty cell', () => {
    expect(isBlock('\t7\r\n')).toBe(true);
    expect(isBlock('A\t')).toBe(true);
    expect(isBlock('Adisa, Wren\r\n')).toBe(false);
    expect(paste('\t7').after[0]).toEqual(['', '7', 'YM']);
  });

  it('makes no player of a row whose only text found no place', () => {
    const { edits, problems } = paste('\tx', 2, 2);
    expect(edits).toEqual([]);
    expect(problems[0]).toContain('beyond the last column');
  });

  it('is read as a file is: numbers as labels, sizes by their names, guarded formulas as they were', () => {
    expect(paste("'=Wren\tNo. 07\tyouth large").after[0]).toEqual(['=Wren', '07', 'YL']);
    expect(paste('Wren\t７\tXXL').after[0]).toEqual(['Wren', '7', 'XXL']);
  });

  it('follows the order on screen', () => {
    expect(paste('One\nTwo', 0, 0, [...players].reverse()).after.map(([name]) => name)).toEqual([
      'Two',
      'One',
    ]);
  });

  it('says what lay beyond the last column or was too long, and puts in the rest', () => {
    const { after, problems } = paste(`Wren\t1\tYM\tx\ty\n${'n'.repeat(121)}\t2`);
    expect(after.map(([, number]) => number)).toEqual(['1', '2']);
    expect(after[1]?.[0]).toBe('Brook');
    expect(problems).toEqual([
      'Row 2: A name has at most 120 characters; this one has 121.',
      '2 cells lay beyond the last column and found no place.',
    ]);
  });

  it('makes no players of blank rows and never more than 200', () => {
    expect(paste('\n\t\t\n', 2).after).toHaveLength(2);
    const { after, problems } = paste(Array.from({ length: 300 }, (_, at) => `P${at}`).join('\n'), 2);
    expect(after).toHaveLength(200);
    expect(problems).toEqual(['102 rows found no place: a roster holds at most 200.']);
  });

  it('keeps line ends inside quoted cells together', () => {
    expect(readBlock('"a\nb"\tc\r\nd\te\r\n')).toEqual([
      ['a\nb', 'c'],
      ['d', 'e'],
    ]);
    expect(isBlock('one cell ')).toBe(false);
    expect(isBlock('two\tcells')).toBe(true);
  });
});
