import { sql, type Kysely } from 'kysely';

// Frozen: later changes go into a migration of their own.

const league = sql.raw(`nullif(current_setting('app.league_id', true), '')::uuid`);
const user = sql.raw(`nullif(current_setting('app.user_id', true), '')::uuid`);

export async function up(db: Kysely<unknown>): Promise<void> {
  await sql`set local lock_timeout = '5s'`.execute(db);

  await sql`
    create table seasons (
      league_id uuid not null references leagues (id),
      id uuid not null,
      slug text not null check (slug ~ '^[a-z0-9]+(-[a-z0-9]+)*$'),
      name text not null check (length(name) between 1 and 80),
      sport text not null check (length(sport) between 1 and 60),
      roster_opens_on date not null,
      freezes_at timestamptz not null,
      release_on date,
      hand_out_on date not null,
      first_match_on date not null,
      created_at timestamptz not null,
      row_version int not null default 1,
      primary key (league_id, id),
      unique (league_id, slug)
    )`.execute(db);
  await sql`alter table leagues add foreign key (id, current_season_id) references seasons (league_id, id)`.execute(
    db,
  );

  await sql`
    create table rule_sets (
      league_id uuid not null references leagues (id),
      id uuid not null,
      name text not null check (length(name) between 1 and 80),
      preset_id text,
      created_at timestamptz not null,
      primary key (league_id, id),
      unique (league_id, name)
    )`.execute(db);
  await sql`
    create table rule_set_versions (
      league_id uuid not null,
      id uuid not null,
      rule_set_id uuid not null,
      version int not null check (version > 0),
      state text not null check (state in ('draft', 'in force', 'superseded')),
      in_force_from date,
      body jsonb not null,
      created_by uuid references users (id),
      created_at timestamptz not null,
      row_version int not null default 1,
      primary key (league_id, id),
      foreign key (league_id, rule_set_id) references rule_sets (league_id, id),
      unique (league_id, rule_set_id, version),
      check ((state = 'draft') = (in_force_from is null))
    )`.execute(db);
  for (const state of ['draft', 'in force']) {
    const name = `one_${state.replace(' ', '_')}_version`;
    await sql`create unique index ${sql.ref(name)} on rule_set_versions (league_id, rule_set_id) where state = ${sql.lit(state)}`.execute(
      db,
    );
  }
  await sql`
    create function keep_rule_set_version() returns trigger language plpgsql as $$
    begin
      if old.state <> 'draft' and (new.body <> old.body or new.version <> old.version or new.in_force_from <> old.in_force_from) then
        raise exception 'a rule set version that is in force or superseded never changes' using errcode = 'check_violation';
      end if;
      if old.state = 'superseded' and new.state <> 'superseded' then
        raise exception 'a superseded rule set version stays superseded' using errcode = 'check_violation';
      end if;
      return new;
    end $$`.execute(db);
  await sql`create trigger keep_version before update on rule_set_versions for each row execute function keep_rule_set_version()`.execute(
    db,
  );

  await sql`
    create table divisions (
      league_id uuid not null,
      id uuid not null,
      season_id uuid not null,
      slug text not null check (slug ~ '^[a-z0-9]+(-[a-z0-9]+)*$'),
      name text not null check (length(name) between 1 and 80),
      age_band text not null default '',
      level text not null default '',
      rule_set_id uuid not null,
      least_players int not null check (least_players >= 0),
      most_players int not null check (most_players between 1 and 200 and most_players >= least_players),
      freezes_at timestamptz,
      position int not null,
      created_at timestamptz not null,
      row_version int not null default 1,
      primary key (league_id, id),
      foreign key (league_id, season_id) references seasons (league_id, id),
      foreign key (league_id, rule_set_id) references rule_sets (league_id, id),
      unique (league_id, season_id, id),
      unique (league_id, season_id, slug),
      unique (league_id, season_id, name)
    )`.execute(db);

  await sql`
    create table garments (
      league_id uuid not null,
      id uuid not null,
      division_id uuid not null,
      code text not null check (code ~ '^[a-z][a-z0-9-]{0,38}$'),
      name text not null check (length(name) between 1 and 60),
      worn text not null check (worn in ('home', 'away', 'home and away')),
      numbered boolean not null,
      named boolean not null,
      sizes jsonb not null,
      position int not null,
      primary key (league_id, id),
      foreign key (league_id, division_id) references divisions (league_id, id) on delete cascade,
      unique (league_id, division_id, code)
    )`.execute(db);

  await sql`
    create table teams (
      league_id uuid not null,
      id uuid not null,
      season_id uuid not null,
      division_id uuid not null,
      slug text not null check (slug ~ '^[a-z0-9]+(-[a-z0-9]+)*$'),
      name text not null check (length(name) between 1 and 80),
      home_kit jsonb not null,
      away_kit jsonb,
      created_at timestamptz not null,
      row_version int not null default 1,
      primary key (league_id, id),
      foreign key (league_id, season_id) references seasons (league_id, id),
      foreign key (league_id, season_id, division_id) references divisions (league_id, season_id, id),
      unique (league_id, season_id, slug)
    )`.execute(db);
  await sql`create unique index teams_one_name_per_division on teams (league_id, division_id, lower(name))`.execute(
    db,
  );

  for (const owner of ['membership', 'invitation']) {
    await sql`
      create table ${sql.table(`${owner}_teams`)} (
        league_id uuid not null,
        ${sql.ref(`${owner}_id`)} uuid not null,
        team_id uuid not null,
        primary key (league_id, ${sql.ref(`${owner}_id`)}, team_id),
        foreign key (league_id, ${sql.ref(`${owner}_id`)}) references ${sql.table(`${owner}s`)} (league_id, id),
        foreign key (league_id, team_id) references teams (league_id, id) on delete cascade
      )`.execute(db);
    await sql`create index ${sql.ref(`${owner}_teams_by_team`)} on ${sql.table(`${owner}_teams`)} (league_id, team_id)`.execute(
      db,
    );
  }

  await sql`
    create table rosters (
      league_id uuid not null,
      id uuid not null,
      team_id uuid not null,
      state text not null check (state in ('open', 'submitted', 'returned', 'signed off', 'frozen')),
      revision int not null default 1,
      return_reason text,
      rule_set_version_id uuid,
      submitted_at timestamptz,
      submitted_by uuid references users (id),
      signed_off_at timestamptz,
      signed_off_by uuid references users (id),
      frozen_at timestamptz,
      updated_at timestamptz not null,
      updated_by uuid references users (id),
      primary key (league_id, id),
      foreign key (league_id, team_id) references teams (league_id, id) on delete cascade,
      foreign key (league_id, rule_set_version_id) references rule_set_versions (league_id, id),
      unique (league_id, team_id)
    )`.execute(db);

  await sql`
    create table players (
      league_id uuid not null,
      id uuid not null,
      roster_id uuid not null,
      position int not null,
      name text not null check (length(name) <= 120),
      name_on_back text not null check (length(name_on_back) <= 60),
      number text not null check (length(number) <= 20),
      role text not null check (length(role) <= 40),
      sizes jsonb not null,
      extra jsonb not null default '{}',
      number_key text,
      sealed boolean not null default false,
      updated_at timestamptz not null,
      updated_by uuid references users (id),
      primary key (league_id, id),
      foreign key (league_id, roster_id) references rosters (league_id, id) on delete cascade
    )`.execute(db);
  await sql`create index players_by_roster on players (league_id, roster_id, position)`.execute(db);
  // The promise of the product: two players of a signed-off roster can't hold one number, whatever the race.
  await sql`
    create unique index one_number_once_signed_off on players (league_id, roster_id, number_key)
      where sealed and number_key is not null`.execute(db);

  await sql`
    create function seal_players_with_roster() returns trigger language plpgsql as $$
    declare sealed_now boolean := new.state in ('signed off', 'frozen');
    begin
      if sealed_now <> (old.state in ('signed off', 'frozen')) then
        update players set sealed = sealed_now where league_id = new.league_id and roster_id = new.id;
      end if;
      return null;
    end $$`.execute(db);
  await sql`create trigger seal_players after update of state on rosters for each row execute function seal_players_with_roster()`.execute(
    db,
  );

  // Locks the roster row, so that an edit and a sign-off at the same moment wait for each other.
  await sql`
    create function guard_sealed_players() returns trigger language plpgsql as $$
    declare line players; roster_state text;
    begin
      line := case when tg_op = 'DELETE' then old else new end;
      select state into roster_state from rosters where league_id = line.league_id and id = line.roster_id for share;
      if roster_state in ('signed off', 'frozen') and not (
        tg_op = 'UPDATE' and (to_jsonb(new) - 'sealed') = (to_jsonb(old) - 'sealed') and new.sealed
      ) then
        raise exception 'this roster is %: its players do not change', roster_state using errcode = 'check_violation', constraint = 'roster_is_sealed';
      end if;
      if roster_state is not null then
        if tg_op <> 'DELETE' then new.sealed := roster_state in ('signed off', 'frozen'); end if;
      end if;
      return line;
    end $$`.execute(db);
  await sql`create trigger guard_sealed before insert or update or delete on players for each row execute function guard_sealed_players()`.execute(
    db,
  );

  await sql`
    create table column_mappings (
      league_id uuid not null,
      team_id uuid not null,
      signature text not null check (length(signature) <= 2000),
      mapping jsonb not null,
      used_at timestamptz not null,
      primary key (league_id, team_id, signature),
      foreign key (league_id, team_id) references teams (league_id, id) on delete cascade
    )`.execute(db);

  const tables = [
    'seasons',
    'rule_sets',
    'rule_set_versions',
    'divisions',
    'garments',
    'teams',
    'membership_teams',
    'invitation_teams',
    'rosters',
    'players',
    'column_mappings',
  ];
  for (const table of tables) {
    await sql`alter table ${sql.table(table)} enable row level security`.execute(db);
    await sql`alter table ${sql.table(table)} force row level security`.execute(db);
    await sql`create policy of_this_league on ${sql.table(table)} using (league_id = ${league}) with check (league_id = ${league})`.execute(
      db,
    );
    await sql`grant select, insert, update, delete on ${sql.table(table)} to raglan_app`.execute(db);
  }
  await sql`
    create policy teams_i_manage on membership_teams for select using (exists (
      select 1 from memberships m
      where m.league_id = membership_teams.league_id and m.id = membership_teams.membership_id and m.user_id = ${user}
    ))`.execute(db);
  await sql`
    create policy seasons_of_my_leagues on seasons for select using (exists (
      select 1 from memberships m where m.league_id = seasons.league_id and m.user_id = ${user} and m.ended_at is null
    ))`.execute(db);
}
