import type { BatchSnapshot } from '@/lib/domain/batch/batch-snapshot';
import { makeSlug, makeUniqueSlug } from '@/lib/domain/league/slug';
import { writeTableCsv, writeTableJson } from './machine/data-table';
import { writeReadMe } from './machine/read-me';
import { tabulateDigits, tabulateGarments, tabulatePackingList, tabulatePieces } from './machine/tables';
import { buildBagLabels, countBagLabels } from './pdf/bag-labels';
import { buildDigitPullList } from './pdf/digit-pull-list';
import { buildGarmentPullList } from './pdf/garment-pull-list';
import { buildPackingList } from './pdf/packing-list';
import { listBatchTexts } from './text/list-batch-texts';
import { makeTypeCase, type TypeCase } from './text/type-case';

/** Told after every unit of work how many of the part's units are done; it is waited for. */
type OnProgress = (done: number, total: number) => void | Promise<void>;

/** A file of the bundle that can be built by itself; `units` says how much work it is next to the others. */
export type BundlePart = {
  path: string;
  mediaType: string;
  label: string;
  units: number;
  build: (onProgress?: OnProgress) => Promise<Uint8Array>;
};

const pdf = 'application/pdf';
const csv = 'text/csv; charset=utf-8';
const json = 'application/json';

/** Other work gets its turn after this many labels or rows. */
const breathAfter = 16;

/**
 * The files of a batch's bundle in their order, all but the manifest. Each is built on demand, alone or in any order,
 * and always to the same bytes: nothing is read but the snapshot and the fonts that lie with the program. The fonts
 * are cut once for all parts.
 */
export function listBundleParts(snapshot: BatchSnapshot): BundlePart[] {
  let typeCase: Promise<TypeCase> | undefined;
  const getType = () => (typeCase ??= makeTypeCase(listBatchTexts(snapshot)));
  const slugs = makeSlugs(snapshot);
  const parts = [
    ...snapshot.teams.map((team, at) => ({
      path: `packing-lists/${slugs[at]}.pdf`,
      mediaType: pdf,
      label: `Packing list, ${team.name}`,
      units: Math.max(1, team.players.length),
      make: async (onUnit: OnUnit) => buildPackingList(snapshot, team, await getType(), onUnit),
    })),
    {
      path: 'bag-labels.pdf',
      mediaType: pdf,
      label: 'Bag labels',
      units: Math.max(1, countBagLabels(snapshot)),
      make: async (onUnit: OnUnit) => buildBagLabels(snapshot, await getType(), onUnit),
    },
    makeSheetPart('pull-list-garments.pdf', 'Garments to pull', async () =>
      buildGarmentPullList(snapshot, await getType()),
    ),
    makeSheetPart('pull-list-digits.pdf', 'Digits to pull', async () =>
      buildDigitPullList(snapshot, await getType()),
    ),
    ...snapshot.teams.map((team, at) =>
      makeDataPart(`packing-lists/${slugs[at]}.csv`, csv, `Packing list, ${team.name}`, () =>
        writeTableCsv(tabulatePackingList(team)),
      ),
    ),
    makeDataPart('data/pieces.csv', csv, 'Every piece', () => writeTableCsv(tabulatePieces(snapshot))),
    makeDataPart('data/pieces.json', json, 'Every piece', () =>
      writeTableJson(snapshot, tabulatePieces(snapshot)),
    ),
    makeDataPart('data/garments.csv', csv, 'Garments to pull', () =>
      writeTableCsv(tabulateGarments(snapshot)),
    ),
    makeDataPart('data/garments.json', json, 'Garments to pull', () =>
      writeTableJson(snapshot, tabulateGarments(snapshot)),
    ),
    makeDataPart('data/digits.csv', csv, 'Digits to pull', () => writeTableCsv(tabulateDigits(snapshot))),
    makeDataPart('data/digits.json', json, 'Digits to pull', () =>
      writeTableJson(snapshot, tabulateDigits(snapshot)),
    ),
  ];
  const readMe = makeDataPart('read-me.txt', 'text/plain; charset=utf-8', 'What is in this bundle', () =>
    writeReadMe(snapshot, parts),
  );
  return [...parts, readMe].map(finishPart);
}

type OnUnit = (done: number) => Promise<void>;
type Making = Omit<BundlePart, 'build'> & { make: (onUnit: OnUnit) => Promise<Uint8Array> };

const makeSheetPart = (path: string, label: string, make: () => Promise<Uint8Array>): Making => ({
  path,
  mediaType: pdf,
  label,
  units: 1,
  make,
});

const makeDataPart = (path: string, mediaType: string, label: string, write: () => Uint8Array): Making => ({
  path,
  mediaType,
  label,
  units: 1,
  make: () => Promise.resolve(write()),
});

function finishPart({ make, ...part }: Making): BundlePart {
  return {
    ...part,
    async build(onProgress) {
      let told = 0;
      const bytes = await make(async (done) => {
        told = done;
        if (done % breathAfter === 0) await new Promise((resolve) => setImmediate(resolve));
        await onProgress?.(done, part.units);
      });
      if (told < part.units) await onProgress?.(part.units, part.units);
      return bytes;
    },
  };
}

/** Names that Windows keeps for devices, whatever follows the dot (naming rules of its file systems; from memory). */
const deviceName = /^(?:con|prn|aux|nul|com\d|lpt\d)$/;

/**
 * A file name for each team, from its slug: small letters, digits and hyphens only, so that no name leaves its folder or
 * fails on another system, and no two alike.
 */
function makeSlugs(snapshot: BatchSnapshot): string[] {
  const taken = new Set<string>();
  return snapshot.teams.map((team, at) => {
    const plain = makeSlug(team.slug, `team-${at + 1}`);
    const slug = makeUniqueSlug(deviceName.test(plain) ? `${plain}-team` : plain, plain, taken);
    taken.add(slug);
    return slug;
  });
}
