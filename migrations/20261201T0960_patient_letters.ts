import { sql, type Kysely } from 'kysely';

// Frozen: later changes go into a migration of their own.

// Letters wait nearly three days for a mail server (with the queue's own pauses), as long as they are kept at all; and
// those that wait for it do not count when a load balancer asks whether anybody works.
export async function up(db: Kysely<unknown>): Promise<void> {
  await sql`set local lock_timeout = '5s'`.execute(db);
  await sql`
    create or replace function enqueue_job(task text, payload json, job_key text, run_at timestamptz) returns void
      language plpgsql security definer set search_path = pg_catalog, pg_temp as $$
    begin
      if task not in ('send-email', 'build-bundle', 'freeze-rosters') then
        raise exception 'unknown task %', task using errcode = 'invalid_parameter_value';
      end if;
      perform graphile_worker.add_job(task, payload, run_at => coalesce(enqueue_job.run_at, now()),
        job_key => enqueue_job.job_key, max_attempts => case task when 'send-email' then 20 else 8 end);
    end $$`.execute(db);
  await sql`
    create or replace function queue_status() returns table (waiting bigint, oldest_due_seconds double precision)
      language sql security definer set search_path = pg_catalog, pg_temp as $$
      select count(*),
        coalesce(extract(epoch from now() - min(j.run_at) filter (where t.identifier <> 'send-email'))::double precision, 0)
      from graphile_worker._private_jobs j join graphile_worker._private_tasks t on t.id = j.task_id
      where j.run_at <= now() and j.locked_at is null and j.attempts < j.max_attempts
    $$`.execute(db);
}
