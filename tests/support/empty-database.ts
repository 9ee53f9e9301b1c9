import { randomUUID } from 'node:crypto';
import { inject } from 'vitest';
import { ensureDatabase, type DatabaseUrls } from '../../scripts/database.mjs';

/** A database of the test cluster without any table. */
export const createEmptyDatabase = (): Promise<DatabaseUrls> =>
  ensureDatabase(inject('cluster'), `empty_${randomUUID().replaceAll('-', '')}`);
