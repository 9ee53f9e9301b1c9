import pg from 'pg';
import type { DatabaseUrls } from '../../scripts/database.mjs';

const read = (name: string): string => {
  const value = process.env[name];
  if (value === undefined)
    throw new Error(`${name} is not set: does this file belong to a database project?`);
  return value;
};

/** The addresses of this test file's own database, by role. */
export const getTestUrls = (): DatabaseUrls => ({
  appUrl: read('RAGLAN_DATABASE_URL'),
  ownerUrl: read('RAGLAN_OWNER_URL'),
  adminUrl: read('RAGLAN_TEST_ADMIN_URL'),
});

/** Runs one statement on a connection of its own and answers the rows. */
export async function queryAt<Row extends pg.QueryResultRow>(
  url: string,
  text: string,
  values: unknown[] = [],
): Promise<Row[]> {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    return (await client.query<Row>(text, values)).rows;
  } finally {
    await client.end();
  }
}

/** Asks this file's database as the superuser, whom row-level security does not hold: to look behind the curtain. */
export const queryAsAdmin = <Row extends pg.QueryResultRow>(
  text: string,
  values: unknown[] = [],
): Promise<Row[]> => queryAt<Row>(getTestUrls().adminUrl, text, values);
