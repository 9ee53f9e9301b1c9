import { sql, type Kysely } from 'kysely';

// Frozen: later changes go into a migration of their own.

const league = sql.raw(`nullif(current_setting('app.league_id', true), '')::uuid`);
const user = sql.raw(`nullif(current_setting('app.user_id', true), '')::uuid`);

export async function up(db: Kysely<unknown>): Promise<void> {
  await sql`set local lock_timeout = '5s'`.execute(db);

  await sql`
    create table stored_files (
      league_id uuid not null references leagues (id),
      id uuid not null,
      bytes bigint not null,
      sha256 text not null,
      created_at timestamptz not null,
      primary key (league_id, id)
    )`.execute(db);
  await sql`
    create table stored_chunks (
      league_id uuid not null,
      file_id uuid not null,
      seq int not null,
      data bytea not null,
      primary key (league_id, file_id, seq),
      foreign key (league_id, file_id) references stored_files (league_id, id) on delete cascade deferrable initially deferred
    )`.execute(db);
  // Already compressed; asking PostgreSQL to compress again only costs time, and external storage serves ranges.
  await sql`alter table stored_chunks alter column data set storage external`.execute(db);

  await sql`
    create table batches (
      league_id uuid not null references leagues (id),
      id uuid not null,
      number int not null check (number > 0),
      code text not null,
      season_id uuid not null,
      shop_id uuid not null,
      state text not null check (state in ('held', 'released', 'on press', 'packed', 'shipped', 'received')),
      promised_on date,
      snapshot jsonb,
      snapshot_sha256 text,
      created_at timestamptz not null,
      created_by uuid references users (id),
      released_at timestamptz,
      row_version int not null default 1,
      primary key (league_id, id),
      foreign key (league_id, season_id) references seasons (league_id, id),
      foreign key (league_id, shop_id) references shops (league_id, id),
      unique (league_id, number),
      unique (league_id, code),
      check ((state = 'held') = (snapshot is null)),
      check ((state = 'held') = (released_at is null))
    )`.execute(db);
  await sql`
    create function keep_batch_snapshot() returns trigger language plpgsql as $$
    begin
      if old.snapshot is not null and (new.snapshot is null or new.snapshot <> old.snapshot or new.snapshot_sha256 <> old.snapshot_sha256) then
        raise exception 'the contents of a released batch never change' using errcode = 'check_violation';
      end if;
      return new;
    end $$`.execute(db);
  await sql`create trigger keep_snapshot before update on batches for each row execute function keep_batch_snapshot()`.execute(
    db,
  );

  await sql`
    create table batch_teams (
      league_id uuid not null,
      batch_id uuid not null,
      roster_id uuid not null,
      primary key (league_id, batch_id, roster_id),
      foreign key (league_id, batch_id) references batches (league_id, id) on delete cascade,
      foreign key (league_id, roster_id) references rosters (league_id, id),
      unique (league_id, roster_id)
    )`.execute(db);

  await sql`
    create table batch_events (
      league_id uuid not null,
      id uuid not null,
      batch_id uuid not null,
      state text not null,
      at timestamptz not null,
      user_id uuid references users (id),
      note text not null default '',
      primary key (league_id, id),
      foreign key (league_id, batch_id) references batches (league_id, id) on delete cascade
    )`.execute(db);
  await sql`create index batch_events_by_batch on batch_events (league_id, batch_id, at)`.execute(db);

  await sql`
    create table bundles (
      league_id uuid not null,
      id uuid not null,
      batch_id uuid not null,
      state text not null check (state in ('queued', 'building', 'ready', 'failed')),
      done int not null default 0,
      total int not null default 0,
      doing text not null default '',
      failure text,
      zip_file_id uuid,
      queued_at timestamptz not null,
      started_at timestamptz,
      finished_at timestamptz,
      primary key (league_id, id),
      foreign key (league_id, batch_id) references batches (league_id, id),
      foreign key (league_id, zip_file_id) references stored_files (league_id, id),
      unique (league_id, batch_id),
      check ((state = 'ready') = (zip_file_id is not null))
    )`.execute(db);
  await sql`
    create table bundle_parts (
      league_id uuid not null,
      bundle_id uuid not null,
      path text not null,
      label text not null,
      media_type text not null,
      position int not null,
      file_id uuid not null,
      primary key (league_id, bundle_id, path),
      foreign key (league_id, bundle_id) references bundles (league_id, id) on delete cascade,
      foreign key (league_id, file_id) references stored_files (league_id, id)
    )`.execute(db);

  const tables = [
    'stored_files',
    'stored_chunks',
    'batches',
    'batch_teams',
    'batch_events',
    'bundles',
    'bundle_parts',
  ];
  for (const table of tables) {
    await sql`alter table ${sql.table(table)} enable row level security`.execute(db);
    await sql`alter table ${sql.table(table)} force row level security`.execute(db);
    await sql`create policy of_this_league on ${sql.table(table)} using (league_id = ${league}) with check (league_id = ${league})`.execute(
      db,
    );
    await sql`grant select, insert, update, delete on ${sql.table(table)} to raglan_app`.execute(db);
  }

  // A decorator's list reaches over leagues: released batches of the shops that person works for, and their bundles.
  await sql`
    create policy released_to_my_shop on batches for select using (state <> 'held' and exists (
      select 1 from memberships m
      where m.league_id = batches.league_id and m.shop_id = batches.shop_id and m.user_id = ${user} and m.ended_at is null
    ))`.execute(db);
  await sql`
    create policy bundles_of_my_shop on bundles for select using (exists (
      select 1 from batches b join memberships m on m.league_id = b.league_id and m.shop_id = b.shop_id
      where b.league_id = bundles.league_id and b.id = bundles.batch_id and b.state <> 'held'
        and m.user_id = ${user} and m.ended_at is null
    ))`.execute(db);

  // The runtime role has no rights on the job tables; this is its only door, and only for tasks that exist.
  await sql`
    create function enqueue_job(task text, payload json, job_key text, run_at timestamptz) returns void
      language plpgsql security definer set search_path = pg_catalog, pg_temp as $$
    begin
      if task not in ('send-email', 'build-bundle', 'freeze-rosters') then
        raise exception 'unknown task %', task using errcode = 'invalid_parameter_value';
      end if;
      perform graphile_worker.add_job(task, payload, run_at => coalesce(enqueue_job.run_at, now()),
        job_key => enqueue_job.job_key, max_attempts => 8);
    end $$`.execute(db);
  await sql`revoke all on function enqueue_job(text, json, text, timestamptz) from public`.execute(db);
  await sql`grant execute on function enqueue_job(text, json, text, timestamptz) to raglan_app`.execute(db);

  // What /api/ready may know of the queue: how many jobs wait and how long the oldest has been due.
  await sql`
    create function queue_status() returns table (waiting bigint, oldest_due_seconds double precision)
      language sql security definer set search_path = pg_catalog, pg_temp as $$
      select count(*), coalesce(extract(epoch from now() - min(run_at))::double precision, 0)
      from graphile_worker._private_jobs where run_at <= now() and locked_at is null and attempts < max_attempts
    $$`.execute(db);
  await sql`revoke all on function queue_status() from public`.execute(db);
  await sql`grant execute on function queue_status() to raglan_app`.execute(db);
}
