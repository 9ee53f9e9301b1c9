import { sql, type Kysely } from 'kysely';

// Frozen: later changes go into a migration of their own.

const league = sql.raw(`nullif(current_setting('app.league_id', true), '')::uuid`);
const user = sql.raw(`nullif(current_setting('app.user_id', true), '')::uuid`);
const token = sql.raw(`nullif(current_setting('app.token_hash', true), '')`);
const email = sql.raw(`nullif(current_setting('app.email', true), '')`);

export async function up(db: Kysely<unknown>): Promise<void> {
  await sql`set local lock_timeout = '5s'`.execute(db);

  await sql`
    create table users (
      id uuid primary key,
      email text not null unique check (email = lower(email) and length(email) between 3 and 254),
      name text not null check (length(name) between 1 and 120),
      password_hash text not null,
      session_version int not null default 1,
      created_at timestamptz not null
    )`.execute(db);

  await sql`
    create table leagues (
      id uuid primary key,
      slug text not null unique check (slug ~ '^[a-z0-9]+(-[a-z0-9]+)*$'),
      name text not null check (length(name) between 1 and 120),
      time_zone text not null,
      unit text not null check (unit in ('in', 'mm')),
      paper text not null check (paper in ('A4', 'Letter')),
      currency text not null check (currency ~ '^[A-Z]{3}$'),
      contact_email text,
      ship_to text not null default '',
      current_season_id uuid,
      created_at timestamptz not null,
      row_version int not null default 1
    )`.execute(db);

  await sql`
    create table shops (
      league_id uuid not null references leagues (id),
      id uuid not null,
      name text not null check (length(name) between 1 and 120),
      created_at timestamptz not null,
      primary key (league_id, id),
      unique (league_id, name)
    )`.execute(db);

  await sql`
    create table memberships (
      league_id uuid not null references leagues (id),
      id uuid not null,
      user_id uuid not null references users (id),
      role text not null check (role in ('league admin', 'team manager', 'decorator', 'referee')),
      shop_id uuid,
      created_at timestamptz not null,
      ended_at timestamptz,
      primary key (league_id, id),
      foreign key (league_id, shop_id) references shops (league_id, id),
      check ((role = 'decorator') = (shop_id is not null))
    )`.execute(db);
  await sql`
    create unique index memberships_one_of_a_kind on memberships
      (league_id, user_id, role, coalesce(shop_id, '00000000-0000-0000-0000-000000000000'::uuid))
      where ended_at is null`.execute(db);
  await sql`create index memberships_by_user on memberships (user_id) where ended_at is null`.execute(db);

  await sql`
    create table invitations (
      league_id uuid not null references leagues (id),
      id uuid not null,
      email text not null check (email = lower(email)),
      role text not null check (role in ('league admin', 'team manager', 'decorator', 'referee')),
      shop_id uuid,
      token_hash text not null unique,
      invited_by uuid not null references users (id),
      created_at timestamptz not null,
      expires_at timestamptz not null,
      accepted_at timestamptz,
      revoked_at timestamptz,
      primary key (league_id, id),
      foreign key (league_id, shop_id) references shops (league_id, id),
      check ((role = 'decorator') = (shop_id is not null))
    )`.execute(db);

  await sql`
    create table password_resets (
      id uuid primary key,
      user_id uuid not null references users (id),
      token_hash text not null unique,
      created_at timestamptz not null,
      expires_at timestamptz not null,
      used_at timestamptz
    )`.execute(db);

  // Mail waits here until a worker has sent it; parameters may hold a link, so they are wiped once it has gone.
  await sql`
    create table emails (
      id uuid primary key,
      to_address text not null,
      template text not null,
      params jsonb not null,
      created_at timestamptz not null,
      sent_at timestamptz,
      failure text
    )`.execute(db);

  await sql`
    create table rate_limits (
      key varchar(255) primary key,
      points int not null default 0,
      expire bigint
    )`.execute(db);

  await sql`
    create table audit_events (
      league_id uuid not null references leagues (id),
      id uuid not null,
      at timestamptz not null,
      user_id uuid references users (id),
      type text not null,
      subject_id uuid,
      data jsonb not null,
      request_id text not null,
      primary key (league_id, id)
    )`.execute(db);
  await sql`create index audit_events_by_time on audit_events (league_id, at desc, id)`.execute(db);
  await sql`create index audit_events_by_subject on audit_events (league_id, subject_id, at desc)`.execute(
    db,
  );

  // What belongs to a person or to the whole installation, not to one league.
  await sql`
    create table system_events (
      id uuid primary key,
      at timestamptz not null,
      user_id uuid,
      type text not null,
      data jsonb not null,
      request_id text not null
    )`.execute(db);

  // A membership that ends also ends the sessions of that person: the next request must sign in again.
  await sql`
    create function end_sessions_with_membership() returns trigger language plpgsql security definer
      set search_path = public, pg_temp as $$
    begin
      if new.ended_at is not null and old.ended_at is null then
        update users set session_version = session_version + 1 where id = new.user_id;
      end if;
      return new;
    end $$`.execute(db);
  await sql`
    create trigger end_sessions after update of ended_at on memberships
      for each row execute function end_sessions_with_membership()`.execute(db);

  for (const table of [
    'users',
    'leagues',
    'password_resets',
    'emails',
    'system_events',
    'shops',
    'memberships',
    'invitations',
    'audit_events',
  ]) {
    await sql`alter table ${sql.table(table)} enable row level security`.execute(db);
    await sql`alter table ${sql.table(table)} force row level security`.execute(db);
  }
  for (const table of ['shops', 'memberships', 'invitations', 'audit_events']) {
    await sql`create policy of_this_league on ${sql.table(table)} using (league_id = ${league}) with check (league_id = ${league})`.execute(
      db,
    );
  }

  await sql`create policy own_memberships on memberships for select using (user_id = ${user})`.execute(db);
  await sql`create policy by_token on invitations for select using (token_hash = ${token})`.execute(db);

  await sql`create policy this_league on leagues using (id = ${league}) with check (id = ${league})`.execute(
    db,
  );
  await sql`
    create policy leagues_i_belong_to on leagues for select using (exists (
      select 1 from memberships m where m.league_id = leagues.id and m.user_id = ${user} and m.ended_at is null
    ))`.execute(db);

  await sql`create policy myself on users using (id = ${user}) with check (id = ${user})`.execute(db);
  await sql`create policy by_email on users for select using (email = ${email})`.execute(db);
  await sql`
    create policy people_of_this_league on users for select using (exists (
      select 1 from memberships m where m.user_id = users.id and m.league_id = ${league}
    ))`.execute(db);
  // For the trigger above, which runs as the owner.
  await sql`create policy session_ends on users to current_user using (true) with check (true)`.execute(db);

  await sql`create policy my_resets on password_resets using (user_id = ${user}) with check (user_id = ${user})`.execute(
    db,
  );
  await sql`create policy by_token on password_resets for select using (token_hash = ${token})`.execute(db);

  await sql`create policy anyone_may_queue on emails for insert with check (sent_at is null)`.execute(db);
  const thisEmail = sql.raw(`id = nullif(current_setting('app.email_id', true), '')::uuid`);
  await sql`create policy the_one_being_sent on emails using (${thisEmail}) with check (${thisEmail})`.execute(
    db,
  );
  await sql`create policy append_only on system_events for insert with check (true)`.execute(db);

  await sql`grant select, insert, update on users, leagues, shops, memberships, invitations, password_resets, emails to raglan_app`.execute(
    db,
  );
  await sql`grant select, insert on audit_events to raglan_app`.execute(db);
  await sql`grant insert on system_events to raglan_app`.execute(db);
  await sql`grant select, insert, update, delete on rate_limits to raglan_app`.execute(db);
}
