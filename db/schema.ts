import type { ColumnType, Generated } from 'kysely';
import type { Role } from '@/lib/domain/access/permissions';
import type { BatchState } from '@/lib/domain/batch/batch-state';
import type { BatchSnapshot } from '@/lib/domain/batch/batch-snapshot';
import type { Kit } from '@/lib/domain/kit/kit';
import type { Garment } from '@/lib/domain/roster/player';
import type { RosterState } from '@/lib/domain/roster/roster-state';
import type { RuleSet } from '@/lib/domain/rules/rule-set';

// One interface per table, snake_case as in SQL. Dates without a time stay text (YYYY-MM-DD, see client.ts).

/** A jsonb column: read as its type, written as JSON text. */
type Json<T> = ColumnType<T, string, string>;
type Time = ColumnType<Date, Date, Date>;
type NullableTime = ColumnType<Date | null, Date | null | undefined, Date | null>;

interface UsersTable {
  id: string;
  email: string;
  name: string;
  password_hash: string;
  session_version: Generated<number>;
  created_at: Time;
}
interface LeaguesTable {
  id: string;
  slug: string;
  name: string;
  time_zone: string;
  unit: 'in' | 'mm';
  paper: 'A4' | 'Letter';
  currency: string;
  contact_email: string | null;
  ship_to: Generated<string>;
  current_season_id: string | null;
  last_batch_number: Generated<number>;
  created_at: Time;
  row_version: Generated<number>;
}
interface ShopsTable {
  league_id: string;
  id: string;
  name: string;
  created_at: Time;
}
interface MembershipsTable {
  league_id: string;
  id: string;
  user_id: string;
  role: Role;
  shop_id: string | null;
  created_at: Time;
  ended_at: NullableTime;
}
interface InvitationsTable {
  league_id: string;
  id: string;
  email: string;
  role: Role;
  shop_id: string | null;
  token_hash: string;
  invited_by: string;
  created_at: Time;
  expires_at: Time;
  accepted_at: NullableTime;
  revoked_at: NullableTime;
}
interface PasswordResetsTable {
  id: string;
  user_id: string;
  token_hash: string;
  created_at: Time;
  expires_at: Time;
  used_at: NullableTime;
}
interface SignUpsTable {
  id: string;
  email: string;
  name: string;
  token_hash: string;
  created_at: Time;
  expires_at: Time;
  used_at: NullableTime;
}
interface EmailsTable {
  id: string;
  to_address: string;
  template: string;
  params: Json<Record<string, string>>;
  created_at: Time;
  sent_at: NullableTime;
  failure: string | null;
}
interface AuditEventsTable {
  league_id: string;
  id: string;
  at: Time;
  user_id: string | null;
  type: string;
  subject_id: string | null;
  data: Json<Record<string, unknown>>;
  request_id: string;
}
interface SystemEventsTable {
  id: string;
  at: Time;
  user_id: string | null;
  type: string;
  data: Json<Record<string, unknown>>;
  request_id: string;
}
interface SeasonsTable {
  league_id: string;
  id: string;
  slug: string;
  name: string;
  sport: string;
  roster_opens_on: string;
  freezes_at: Time;
  release_on: string | null;
  hand_out_on: string;
  first_match_on: string;
  created_at: Time;
  row_version: Generated<number>;
}
interface RuleSetsTable {
  league_id: string;
  id: string;
  name: string;
  preset_id: string | null;
  created_at: Time;
}
interface RuleSetVersionsTable {
  league_id: string;
  id: string;
  rule_set_id: string;
  version: number;
  state: 'draft' | 'in force' | 'superseded';
  in_force_from: string | null;
  body: Json<RuleSet>;
  created_by: string | null;
  created_at: Time;
  row_version: Generated<number>;
}
interface DivisionsTable {
  league_id: string;
  id: string;
  season_id: string;
  slug: string;
  name: string;
  age_band: Generated<string>;
  level: Generated<string>;
  rule_set_id: string;
  least_players: number;
  most_players: number;
  freezes_at: NullableTime;
  position: number;
  created_at: Time;
  row_version: Generated<number>;
}
interface GarmentsTable {
  league_id: string;
  id: string;
  division_id: string;
  code: string;
  name: string;
  worn: Garment['worn'];
  numbered: boolean;
  named: boolean;
  sizes: Json<Garment['sizes']>;
  position: number;
}
interface TeamsTable {
  league_id: string;
  id: string;
  season_id: string;
  division_id: string;
  slug: string;
  name: string;
  home_kit: Json<Kit>;
  away_kit: ColumnType<Kit | null, string | null, string | null>;
  created_at: Time;
  row_version: Generated<number>;
}
interface MembershipTeamsTable {
  league_id: string;
  membership_id: string;
  team_id: string;
}
interface InvitationTeamsTable {
  league_id: string;
  invitation_id: string;
  team_id: string;
}
interface RostersTable {
  league_id: string;
  id: string;
  team_id: string;
  state: RosterState;
  revision: Generated<number>;
  return_reason: string | null;
  rule_set_version_id: string | null;
  submitted_at: NullableTime;
  submitted_by: string | null;
  signed_off_at: NullableTime;
  signed_off_by: string | null;
  frozen_at: NullableTime;
  updated_at: Time;
  updated_by: string | null;
}
interface PlayersTable {
  league_id: string;
  id: string;
  roster_id: string;
  position: number;
  name: string;
  name_on_back: string;
  number: string;
  role: string;
  sizes: Json<Record<string, string>>;
  extra: Json<Record<string, string>>;
  number_key: string | null;
  sealed: Generated<boolean>;
  updated_at: Time;
  updated_by: string | null;
}
interface ColumnMappingsTable {
  league_id: string;
  team_id: string;
  signature: string;
  mapping: Json<unknown>;
  used_at: Time;
}
interface StoredFilesTable {
  league_id: string;
  id: string;
  bytes: ColumnType<number, number, number>;
  sha256: string;
  created_at: Time;
}
interface StoredChunksTable {
  league_id: string;
  file_id: string;
  seq: number;
  data: Buffer;
}
interface BatchesTable {
  league_id: string;
  id: string;
  number: number;
  code: string;
  season_id: string;
  shop_id: string;
  state: BatchState;
  promised_on: string | null;
  snapshot: ColumnType<BatchSnapshot | null, string | null, string | null>;
  snapshot_sha256: string | null;
  created_at: Time;
  created_by: string | null;
  released_at: NullableTime;
  row_version: Generated<number>;
}
interface BatchTeamsTable {
  league_id: string;
  batch_id: string;
  roster_id: string;
}
interface BatchEventsTable {
  league_id: string;
  id: string;
  batch_id: string;
  state: BatchState;
  at: Time;
  user_id: string | null;
  note: Generated<string>;
}
interface BundlesTable {
  league_id: string;
  id: string;
  batch_id: string;
  state: 'queued' | 'building' | 'ready' | 'failed';
  done: Generated<number>;
  total: Generated<number>;
  doing: Generated<string>;
  failure: string | null;
  zip_file_id: string | null;
  queued_at: Time;
  started_at: NullableTime;
  finished_at: NullableTime;
}
interface BundlePartsTable {
  league_id: string;
  bundle_id: string;
  path: string;
  label: string;
  media_type: string;
  position: number;
  file_id: string;
}

export interface Database {
  users: UsersTable;
  leagues: LeaguesTable;
  shops: ShopsTable;
  memberships: MembershipsTable;
  invitations: InvitationsTable;
  password_resets: PasswordResetsTable;
  sign_ups: SignUpsTable;
  emails: EmailsTable;
  audit_events: AuditEventsTable;
  system_events: SystemEventsTable;
  seasons: SeasonsTable;
  rule_sets: RuleSetsTable;
  rule_set_versions: RuleSetVersionsTable;
  divisions: DivisionsTable;
  garments: GarmentsTable;
  teams: TeamsTable;
  membership_teams: MembershipTeamsTable;
  invitation_teams: InvitationTeamsTable;
  rosters: RostersTable;
  players: PlayersTable;
  column_mappings: ColumnMappingsTable;
  stored_files: StoredFilesTable;
  stored_chunks: StoredChunksTable;
  batches: BatchesTable;
  batch_teams: BatchTeamsTable;
  batch_events: BatchEventsTable;
  bundles: BundlesTable;
  bundle_parts: BundlePartsTable;
}
