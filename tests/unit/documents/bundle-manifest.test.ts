import { describe, expect, it } from 'vitest';
import { buildManifest } from '@/lib/documents/bundle-manifest';
import { makeHostileBatch, makeTwoTeams } from '@/tests/factories/snapshots';

const file = (path: string) => ({
  path,
  label: 'Bag labels',
  mediaType: 'application/pdf',
  bytes: 12,
  sha256: 'ab',
});
const read = (bytes: Uint8Array) => JSON.parse(new TextDecoder().decode(bytes));

describe('the manifest', () => {
  it('states size and SHA-256 of every file, what the batch is, and the hash of the snapshot', () => {
    const manifest = buildManifest(makeTwoTeams(), 'cafe', [file('bag-labels.pdf')]);
    expect(manifest.path).toBe('manifest.json');
    expect(read(manifest.bytes)).toMatchObject({
      format: 'raglan-bundle',
      formatVersion: 1,
      batch: { code: 'B-07', releasedAt: '2027-09-17T08:12:00.000Z' },
      snapshotSha256: 'cafe',
      counts: { teams: 2, players: 24, pieces: 60 },
      files: [file('bag-labels.pdf')],
    });
  });

  it('is the same whether or not an earlier manifest lies among the files', () => {
    const files = [file('bag-labels.pdf')];
    const first = buildManifest(makeTwoTeams(), 'cafe', files);
    expect(buildManifest(makeTwoTeams(), 'cafe', [...files, file('manifest.json')]).bytes).toEqual(
      first.bytes,
    );
  });

  it('notes each missing size and number, and each name our fonts cannot draw, without naming a player', () => {
    const snapshot = makeHostileBatch();
    const { notes } = read(buildManifest(snapshot, 'cafe', []).bytes) as { notes: string[] };
    const bag = (at: number) => snapshot.teams[0]?.players[at]?.bagCode ?? '?';
    expect(notes.some((note) => note.includes(bag(1)) && note.includes('no size for “Shorts”'))).toBe(true);
    expect(notes.some((note) => note.includes(bag(2)) && note.endsWith('no number.'))).toBe(true);
    const undrawn = notes.filter((note) => note.includes('can’t draw'));
    expect(undrawn.map((note) => /bag (\S+): (.*) holds/.exec(note)?.slice(1).join(' '))).toEqual([
      `${bag(14)} the name`,
      `${bag(15)} the name`,
      `${bag(15)} the name on the back`,
    ]);
    for (const player of snapshot.teams[0]?.players ?? [])
      expect(notes.join('\n')).not.toContain(player.name);
  });
});
