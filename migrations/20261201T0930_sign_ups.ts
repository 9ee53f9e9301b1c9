import { sql, type Kysely } from 'kysely';

// Frozen: later changes go into a migration of their own.

const token = sql.raw(`nullif(current_setting('app.token_hash', true), '')`);

export async function up(db: Kysely<unknown>): Promise<void> {
  await sql`set local lock_timeout = '5s'`.execute(db);

  // Somebody who asked for an account and has not followed the link yet. No password waits here: it is chosen
  // once the address is known to be theirs.
  await sql`
    create table sign_ups (
      id uuid primary key,
      email text not null check (email = lower(email) and length(email) between 3 and 254),
      name text not null check (length(name) between 1 and 120),
      token_hash text not null unique,
      created_at timestamptz not null,
      expires_at timestamptz not null,
      used_at timestamptz
    )`.execute(db);
  await sql`alter table sign_ups enable row level security`.execute(db);
  await sql`alter table sign_ups force row level security`.execute(db);
  await sql`create policy by_token on sign_ups using (token_hash = ${token}) with check (token_hash = ${token})`.execute(
    db,
  );
  await sql`grant select, insert, update on sign_ups to raglan_app`.execute(db);

  // Links that can no longer be followed are of no use to anybody but a thief of the table. The runtime role sees
  // only one at a time, so it asks for the whole broom.
  await sql`create policy broom on sign_ups to current_user using (true)`.execute(db);
  await sql`create policy broom on password_resets to current_user using (true)`.execute(db);
  await sql`create policy broom on emails to current_user using (true) with check (true)`.execute(db);
  await sql`
    create function tidy_expired(at timestamptz) returns table (sign_ups bigint, password_resets bigint, emails bigint)
      language plpgsql security definer set search_path = public, pg_temp as $$
    begin
      delete from public.sign_ups s where s.expires_at < at - interval '7 days';
      get diagnostics sign_ups = row_count;
      delete from public.password_resets p where p.expires_at < at - interval '7 days';
      get diagnostics password_resets = row_count;
      -- A letter that no try could deliver keeps its place in the list, but not the link it carried.
      update public.emails e set params = '{}', failure = coalesce(e.failure, 'gave up')
        where e.sent_at is null and e.created_at < at - interval '3 days' and e.params <> '{}';
      get diagnostics emails = row_count;
      return next;
    end $$`.execute(db);
  await sql`revoke all on function tidy_expired(timestamptz) from public`.execute(db);
  await sql`grant execute on function tidy_expired(timestamptz) to raglan_app`.execute(db);

  // So that /api/ready can tell whether this code and this database belong together.
  await sql`
    do $$ begin
      if to_regclass('public.kysely_migration') is not null then
        grant select on kysely_migration to raglan_app;
      end if;
    end $$`.execute(db);
}
