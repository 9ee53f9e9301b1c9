import { readdir, readFile } from 'node:fs/promises';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { guessMapping } from '@/lib/domain/roster/import/column-mapping';
import { readRoster } from '@/lib/domain/roster/import/read-roster';
import { readTeams } from '@/lib/domain/roster/import/read-teams';
import { sampleFiles } from '@/lib/domain/roster/import/samples';
import { guessTeamMapping } from '@/lib/domain/roster/import/team-mapping';
import { starterKits } from '@/lib/domain/kit/starter-kits';
import { readUpload } from '@/lib/platform/files/read-upload';

const folder = path.join(import.meta.dirname, '../../../../../public/samples');
const garments = starterKits[0]?.garments ?? [];

async function open(name: string) {
  const result = await readUpload({ bytes: new Uint8Array(await readFile(path.join(folder, name))), name });
  if (!result.ok) throw new Error(result.message);
  const rows = result.tables[0]?.rows ?? [];
  return { ...result, rows, problems: result.tables[0]?.problems ?? [] };
}
async function readSample(name: string) {
  const { rows } = await open(name);
  return readRoster(rows, guessMapping(rows, garments), garments);
}
const namesAndNumbers = async (name: string) =>
  (await readSample(name)).lines.map(({ line }) => `${line.name} ${line.number}`);

describe('the sample files', () => {
  it('are all listed, and all there', async () => {
    expect((await readdir(folder)).sort()).toEqual(sampleFiles.map(({ file }) => file).sort());
  });

  it.each(sampleFiles.filter(({ kind }) => kind === 'roster'))(
    'can be brought in: $file',
    async ({ file }) => {
      const { lines, counts } = await readSample(file);
      expect(lines.length).toBeGreaterThan(3);
      expect(counts.rows).toBe(
        counts.lines + counts.refused + counts.blank + counts.headings + counts.aboveHeadings,
      );
      for (const { line } of lines) expect(line.name).not.toBe('');
    },
  );

  it('give the same roster as CSV and as workbook, with 0, 00 and 07', async () => {
    const [csv, workbook] = [await readSample('clean-roster.csv'), await readSample('clean-roster.xlsx')];
    expect(workbook.lines).toEqual(csv.lines);
    expect(csv.lines.map(({ line }) => line.number)).toEqual(expect.arrayContaining(['0', '00', '07', '7']));
    expect(csv.lines.every(({ notes }) => notes.length === 0)).toBe(true);
  });

  it('show old encodings and tabs', async () => {
    expect((await open('semicolon-windows-1252.csv')).text).toMatchObject({
      encoding: 'Windows-1252',
      delimiter: ';',
    });
    expect(await namesAndNumbers('semicolon-windows-1252.csv')).toContain('O’Carrow, Siân 00');
    expect((await open('utf16-tabs.txt')).text).toMatchObject({ encoding: 'UTF-16 LE', delimiter: '\t' });
    expect(await namesAndNumbers('utf16-tabs.txt')).toContain('Ćilovac, Đurđa 00');
  });

  it('show titles, repeated headings and totals', async () => {
    const { lines, refused, counts } = await readSample('two-headings-and-totals.csv');
    expect(lines).toHaveLength(4);
    expect(refused.map(({ rowNumber }) => rowNumber)).toEqual([7, 9, 12]);
    expect(counts).toMatchObject({ aboveHeadings: 2, headings: 1, blank: 2 });
  });

  it('show numbers as people type them', async () => {
    const { lines } = await readSample('numbers-as-people-type-them.csv');
    expect(lines.map(({ line }) => line.number)).toEqual([
      '7',
      '8',
      '07',
      '9',
      '12',
      '00',
      '0',
      '14 or 15',
      'twenty',
      '',
      '3.5',
    ]);
    expect(lines.map(({ line }) => line.sizes.jersey)).toEqual([
      'YM',
      'YM',
      'YM',
      'YM',
      'YL',
      'YS',
      'YS',
      'YM',
      'YL',
      'YL',
      'enormous',
    ]);
  });

  it('show formulas kept as text', async () => {
    const { lines } = await readSample('formulas.csv');
    expect(lines.map(({ line }) => line.number)).toContain('=3+4');
    expect(lines[4]?.extra.Note).toBe('=1+1');
    expect(lines.find(({ line }) => line.name === '-Tarn, Bo')).toBeDefined();
  });

  it('show names from right to left, with their own digits', async () => {
    expect((await readSample('right-to-left.csv')).lines.map(({ line }) => line.number)).toEqual([
      '7',
      '10',
      '11',
      '12',
      '00',
    ]);
  });

  it('show a team list with a colour and a division to put right', async () => {
    const { rows } = await open('team-list.csv');
    const { lines, refused } = readTeams(rows, guessTeamMapping(rows), [{ id: 'd', name: 'U12 Mixed' }]);
    expect(lines).toHaveLength(7);
    expect(refused.map(({ reason }) => reason)).toEqual([
      'There is no division “U13 Mixed”. Write one of these: U12 Mixed.',
    ]);
    expect(lines.filter(({ line }) => line.home === null).map(({ line }) => line.name)).toEqual([
      'Sanderlings',
    ]);
    expect(lines.find(({ line }) => line.name === 'Whimbrels')?.line.managers).toEqual([
      'one@tern.example',
      'two@tern.example',
    ]);
  });
});
