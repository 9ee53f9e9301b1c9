import { sql, type Kysely } from 'kysely';

// Frozen: later changes go into a migration of their own.

// The first guards compared with <>, which answers null, and so lets through, when the new value is null: a released
// batch could lose its hash, and rules in force could go back to being a draft. Nor did they mind a removal.
export async function up(db: Kysely<unknown>): Promise<void> {
  await sql`set local lock_timeout = '5s'`.execute(db);

  await sql`
    create or replace function keep_rule_set_version() returns trigger language plpgsql as $$
    begin
      if old.state = 'draft' then
        return case when tg_op = 'DELETE' then old else new end;
      end if;
      if tg_op = 'DELETE' or new.state = 'draft'
        or (new.rule_set_id, new.body, new.version, new.in_force_from)
          is distinct from (old.rule_set_id, old.body, old.version, old.in_force_from) then
        raise exception 'a rule set version that is in force or superseded never changes' using errcode = 'check_violation';
      end if;
      if old.state = 'superseded' and new.state <> 'superseded' then
        raise exception 'a superseded rule set version stays superseded' using errcode = 'check_violation';
      end if;
      return new;
    end $$`.execute(db);
  await sql`create trigger keep_version_from_removal before delete on rule_set_versions for each row execute function keep_rule_set_version()`.execute(
    db,
  );

  await sql`
    create or replace function keep_batch_snapshot() returns trigger language plpgsql as $$
    begin
      if old.snapshot is null then
        return case when tg_op = 'DELETE' then old else new end;
      end if;
      if tg_op = 'DELETE'
        or (new.snapshot, new.snapshot_sha256, new.code, new.shop_id, new.season_id, new.released_at)
          is distinct from (old.snapshot, old.snapshot_sha256, old.code, old.shop_id, old.season_id, old.released_at) then
        raise exception 'the contents of a released batch never change' using errcode = 'check_violation';
      end if;
      return new;
    end $$`.execute(db);
  await sql`create trigger keep_snapshot_from_removal before delete on batches for each row execute function keep_batch_snapshot()`.execute(
    db,
  );
}
