import Papa from 'papaparse';
import { describe, expect, it } from 'vitest';
import { listBundleParts } from '@/lib/documents/bundle';
import type { BatchSnapshot } from '@/lib/domain/batch/batch-snapshot';
import { hostileNames, makeHostileBatch, makeTwoTeams } from '@/tests/factories/snapshots';

const read = async (snapshot: BatchSnapshot, path: string): Promise<string> => {
  const part = listBundleParts(snapshot).find((entry) => entry.path === path);
  if (!part) throw new Error(`no ${path}`);
  return new TextDecoder('utf-8', { ignoreBOM: true }).decode(await part.build());
};
const readRows = async (snapshot: BatchSnapshot, path: string) =>
  Papa.parse<Record<string, string>>((await read(snapshot, path)).replace(/^\uFEFF/, ''), {
    header: true,
    skipEmptyLines: true,
  });

describe('data files of a bundle', () => {
  it('hold every piece with its bag code, the number as text and the size as entered', async () => {
    const { data, errors } = await readRows(makeTwoTeams(), 'data/pieces.csv');
    expect(errors).toEqual([]);
    expect(data).toHaveLength(60);
    expect(data[12]).toMatchObject({
      piece: '13',
      team: 'Otters',
      player: 'Ellery, Kit',
      garment: 'Jersey',
      kit: 'home',
      colour: 'navy',
      number: '00',
      name_on_back: 'ELLERY',
    });
    expect(data.filter((row) => row.size_label === 'no size')).toHaveLength(2);
  });

  it('hold the same rows as CSV and as JSON, with the meaning of every column', async () => {
    for (const name of ['pieces', 'garments', 'digits']) {
      const { data } = await readRows(makeTwoTeams(), `data/${name}.csv`);
      const json = JSON.parse(await read(makeTwoTeams(), `data/${name}.json`));
      expect(json.formatVersion).toBe(1);
      const rows = json.rows.map((row: Record<string, unknown>) =>
        Object.fromEntries(Object.entries(row).map(([key, value]) => [key, String(value)])),
      );
      expect(rows).toEqual(data);
      expect(json.columns.map((column: { name: string }) => column.name)).toEqual(Object.keys(data[0] ?? {}));
      for (const column of json.columns) expect(column.meaning.length).toBeGreaterThan(3);
    }
  });

  it('never hand a spreadsheet a formula, while the JSON keeps every name exactly', async () => {
    const snapshot = makeHostileBatch();
    for (const part of listBundleParts(snapshot).filter((entry) => entry.path.endsWith('.csv'))) {
      const text = (await read(snapshot, part.path)).replace(/^\uFEFF/, '');
      for (const cell of Papa.parse<string[]>(text).data.flat()) expect(cell).not.toMatch(/^[=+@\t\r-]/);
    }
    const json = JSON.parse(await read(snapshot, 'data/pieces.json'));
    const names = new Set(json.rows.map((row: { player: string }) => row.player));
    expect([...names]).toEqual([...hostileNames]);
  });

  it('start with a byte order mark as CSV and without one as JSON', async () => {
    expect(await read(makeTwoTeams(), 'data/pieces.csv')).toMatch(/^\uFEFFpiece,/);
    expect(await read(makeTwoTeams(), 'data/pieces.json')).toMatch(/^\{/);
  });

  it('have a packing list with a row a player and a column a piece', async () => {
    const { data } = await readRows(makeTwoTeams(), 'packing-lists/otters.csv');
    expect(Object.keys(data[0] ?? {})).toEqual([
      'number',
      'player',
      'name_on_back',
      'bag_code',
      'Jersey, home',
      'Jersey, away',
      'Shorts, home',
    ]);
    expect(data).toHaveLength(12);
  });

  it('are all named and explained in the read-me', async () => {
    const readMe = await read(makeTwoTeams(), 'read-me.txt');
    for (const part of listBundleParts(makeTwoTeams())) {
      if (part.path !== 'read-me.txt') expect(readMe).toContain(part.path);
    }
    expect(readMe).toContain('children’s names');
  });
});
