import { describe, expect, it } from 'vitest';
import { GET as getHealth } from '@/app/api/health/route';
import { GET as getReady } from '@/app/api/ready/route';
import { getDatabase } from '@/db/client';
import { queryAsAdmin } from '../../support/database';

type Answer = { status: string; parts: Record<string, { ok: boolean; says: string }> };
const ask = async () => {
  const response = await getReady();
  return { status: response.status, body: (await response.json()) as Answer };
};

describe('readiness', () => {
  it('is given when the database answers, has every migration and no job is left lying', async () => {
    const { status, body } = await ask();
    expect(status).toBe(200);
    expect(body.status).toBe('ready');
    expect(Object.values(body.parts).every((part) => part.ok)).toBe(true);
  });

  it('is refused, and the migration named, when the database is behind this code', async () => {
    const [last] = await queryAsAdmin<{ name: string; timestamp: string }>(
      'delete from kysely_migration where name = (select max(name) from kysely_migration) returning *',
    );
    const { status, body } = await ask();
    expect(status).toBe(503);
    expect(body.parts['migrations']).toEqual({
      ok: false,
      says: `1 not applied, the first is ${last?.name}`,
    });
    await queryAsAdmin('insert into kysely_migration (name, timestamp) values ($1, $2)', [
      last?.name,
      last?.timestamp,
    ]);
    expect((await ask()).status).toBe(200);
  });

  it('is refused when a due job has found no worker for minutes, and not for one that is due later', async () => {
    await queryAsAdmin(
      `select graphile_worker.add_job('build-bundle', '{}', run_at => now() + interval '1 day')`,
    );
    expect((await ask()).status).toBe(200);
    // Letters wait for a mail server as long as they must; that is no reason to take the pages away.
    await queryAsAdmin(
      `select graphile_worker.add_job('send-email', '{}', run_at => now() - interval '1 hour')`,
    );
    expect((await ask()).status).toBe(200);
    await queryAsAdmin(
      `select graphile_worker.add_job('build-bundle', '{}', run_at => now() - interval '1 hour')`,
    );
    const { status, body } = await ask();
    expect(status).toBe(503);
    expect(body.parts['queue']?.says).toContain('is a worker running');
    await queryAsAdmin('delete from graphile_worker._private_jobs');
  });

  // Last: this pool does not come back.
  it('is refused without a word on addresses when the database does not answer, while health is still given', async () => {
    await getDatabase().pool.end();
    const { status, body } = await ask();
    expect(status).toBe(503);
    expect(body.parts['database']?.ok).toBe(false);
    expect(JSON.stringify(body)).not.toMatch(/postgres|127\.0\.0\.1|pool/i);
    expect(getHealth().status).toBe(200);
  });
});
