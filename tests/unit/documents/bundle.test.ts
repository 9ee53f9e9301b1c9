import { execFileSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { listBundleParts } from '@/lib/documents/bundle';
import { makeHostileBatch, makeSnapshotOf, makeTeam, makeTwoTeams } from '@/tests/factories/snapshots';
import { hashBundles } from '@/tests/support/documents/print-bundle-hashes';

const paths = (snapshot: Parameters<typeof listBundleParts>[0]) =>
  listBundleParts(snapshot).map((part) => part.path);

describe('the files of a bundle', () => {
  it('are one packing list a team, labels, both pull lists, their data and a read-me', () => {
    expect(paths(makeTwoTeams())).toEqual([
      'packing-lists/otters.pdf',
      'packing-lists/herons.pdf',
      'bag-labels.pdf',
      'pull-list-garments.pdf',
      'pull-list-digits.pdf',
      'packing-lists/otters.csv',
      'packing-lists/herons.csv',
      'data/pieces.csv',
      'data/pieces.json',
      'data/garments.csv',
      'data/garments.json',
      'data/digits.csv',
      'data/digits.json',
      'read-me.txt',
    ]);
  });

  it('have names that stay in their folder and differ, whatever the slugs are', () => {
    const slugs = ['../../etc/passwd', '', 'otters', 'Otters', 'CON', 'ö', '.', 'a'.repeat(300)];
    const teams = slugs.map((slug, at) => makeTeam({ id: `team-${at}`, slug }));
    const found = paths(makeSnapshotOf(teams));
    expect(new Set(found).size).toBe(found.length);
    for (const path of found)
      expect(path).toMatch(/^([a-z0-9-]{1,70}\/)?[a-z0-9-]{1,70}\.(pdf|csv|json|txt)$/);
    // Windows opens a device under this name, whatever stands behind the dot.
    expect(paths(makeSnapshotOf(teams))).toContain('packing-lists/con-team.pdf');
  });

  it('are the same bytes when built again, in another process, time zone and locale', async () => {
    const here = await hashBundles();
    expect(await hashBundles()).toEqual(here);
    const program = ['--import', 'tsx', 'tests/support/documents/print-bundle-hashes.ts'];
    const env = { ...process.env, TZ: 'Pacific/Kiritimati', LANG: 'tr_TR.UTF-8', LC_ALL: 'tr_TR.UTF-8' };
    const elsewhere = execFileSync(process.execPath, program, { env, encoding: 'utf8' });
    expect(JSON.parse(elsewhere)).toEqual(here);
    expect(Object.keys(here).length).toBe(30);
  }, 120_000);

  it('are the same bytes when the snapshot comes back from storage with its keys in another order', async () => {
    const turn = (value: unknown): unknown => {
      if (Array.isArray(value)) return value.map(turn);
      if (value === null || typeof value !== 'object') return value;
      return Object.fromEntries(
        Object.entries(value)
          .reverse()
          .map(([key, entry]) => [key, turn(entry)]),
      );
    };
    const hash = async (snapshot: ReturnType<typeof makeTwoTeams>) => {
      const sums = [];
      for (const part of listBundleParts(snapshot)) {
        sums.push(
          createHash('sha256')
            .update(await part.build())
            .digest('hex'),
        );
      }
      return sums;
    };
    const snapshot = makeHostileBatch();
    expect(await hash(turn(snapshot) as typeof snapshot)).toEqual(await hash(snapshot));
  });

  it('can each be built alone, in any order, to the same bytes', async () => {
    const snapshot = makeTwoTeams();
    const whole = listBundleParts(snapshot);
    for (const [at, part] of [...listBundleParts(snapshot).entries()].reverse()) {
      const [alone, inTurn] = [await part.build(), await whole[at]?.build()];
      expect(Buffer.from(alone).equals(Buffer.from(inTurn ?? [])), part.path).toBe(true);
    }
  });

  it('report progress by the label, up to the units they promised, and wait for the listener', async () => {
    for (const part of listBundleParts(makeTwoTeams())) {
      const heard: string[] = [];
      let busy = false;
      await part.build(async (done, total) => {
        expect(busy).toBe(false);
        busy = true;
        await Promise.resolve();
        busy = false;
        heard.push(`${done} of ${total}`);
      });
      expect(heard).toEqual(Array.from({ length: part.units }, (_, at) => `${at + 1} of ${part.units}`));
    }
    expect(listBundleParts(makeTwoTeams()).find((part) => part.path === 'bag-labels.pdf')?.units).toBe(24);
  });

  it('can be built for a batch without teams', async () => {
    for (const part of listBundleParts(makeSnapshotOf([]))) {
      expect((await part.build()).byteLength, part.path).toBeGreaterThan(0);
    }
  });

  it('stop when the listener fails, so that a job that lost its place builds nothing further', async () => {
    const labels = listBundleParts(makeTwoTeams()).find((part) => part.path === 'bag-labels.pdf');
    let heard = 0;
    const building = labels?.build(() => {
      heard += 1;
      if (heard === 3) throw new Error('the job was taken over');
    });
    await expect(building).rejects.toThrow('taken over');
    expect(heard).toBe(3);
  });
});
