import type { DatabaseUrls } from '../../scripts/database.mjs';

/** The settings of a process under test on that database; nothing listens at the address. */
export function makeTestEnvironment(urls: DatabaseUrls): Record<string, string> {
  return {
    RAGLAN_DATABASE_URL: urls.appUrl,
    RAGLAN_OWNER_URL: urls.ownerUrl,
    RAGLAN_SECRET: 'a secret for tests, and for nothing else',
    RAGLAN_BASE_URL: 'http://localhost:3000',
    RAGLAN_DEMO: '0',
    RAGLAN_DB_POOL: '6',
    NEXTAUTH_URL: 'http://localhost:3000',
    NEXTAUTH_SECRET: 'a secret for tests, and for nothing else',
    NEXT_TELEMETRY_DISABLED: '1',
    LOG_LEVEL: 'silent',
  };
}
