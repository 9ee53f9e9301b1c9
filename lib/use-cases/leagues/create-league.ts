import type { z } from 'zod';
import { findAccount } from '@/db/queries/accounts';
import { insertAuditEvent } from '@/db/queries/audit';
import { insertDivision } from '@/db/queries/divisions';
import { replaceGarments } from '@/db/queries/garments';
import { insertInvitation } from '@/db/queries/invitations';
import { enqueueJob } from '@/db/queries/jobs';
import { insertLeague } from '@/db/queries/leagues';
import { ensureMembership } from '@/db/queries/memberships';
import { insertDraft, insertRuleSet, putDraftInForce } from '@/db/queries/rule-sets';
import { insertSeason, setCurrentSeason } from '@/db/queries/seasons';
import { withLeague, withUser, type LeagueTx } from '@/db/tenant';
import type { AuditEvent } from '@/lib/domain/audit/event';
import { toDay, toInstant } from '@/lib/domain/dates/zone';
import { findStarterKit } from '@/lib/domain/kit/starter-kits';
import { makeSlug } from '@/lib/domain/league/slug';
import { makeBlankRuleSet } from '@/lib/domain/rules/blank-rule-set';
import { findCataloguePreset } from '@/lib/domain/rules/catalogue/catalogue';
import { notFound } from '@/lib/platform/errors';
import { hashToken, newToken } from '@/lib/platform/ids';
import type { PersonContext } from '../context';
import { expiryOfInvitation, mailInvitation } from '../people-guards';
import { leagueBudget, spend } from '../rate-budgets';
import type { createLeagueSchema } from './new-league-schemas';

type Input = z.output<typeof createLeagueSchema>;
type Note = (event: AuditEvent) => Promise<void>;

/**
 * Creates a league with its first season, number rules in force, a division with garments, and invitations: all of it
 * or nothing. Whoever creates it is its league admin.
 */
export async function createLeague(
  ctx: PersonContext,
  input: Input,
): Promise<{ league: string; season: string }> {
  await spend(leagueBudget, ctx.userId, 'You have created ten leagues within a day.');
  const account = await withUser(ctx.userId, (tx) => findAccount(tx, ctx.userId));
  if (!account) throw notFound('account');
  const leagueId = ctx.newId();
  return withLeague(leagueId, async (tx) => {
    const slug = await insertUnderFreeSlug(tx, ctx, input, account.email);
    const note: Note = (event) => insertAuditEvent(tx, ctx, event);
    await note({ type: 'league created', subjectId: leagueId, data: { name: input.league.name } });
    const membership = { userId: ctx.userId, role: 'league admin' as const, shopId: null, now: ctx.now };
    await ensureMembership(tx, { id: ctx.newId(), ...membership });
    const season = await openSeason(tx, ctx, input, note);
    const ruleSetId = await putRulesInForce(tx, ctx, input, note);
    await addDivision(tx, ctx, input, { seasonId: season.id, ruleSetId }, note);
    for (const email of input.managers) {
      await inviteManager(tx, { ...ctx, league: input.league, actor: account }, email, note);
    }
    return { league: slug, season: season.slug };
  });
}

/** Other leagues are out of sight here, so the only way to find a free address is to try. */
async function insertUnderFreeSlug(
  tx: LeagueTx,
  ctx: PersonContext,
  input: Input,
  contactEmail: string,
): Promise<string> {
  const base = makeSlug(input.league.name, 'league');
  for (let n = 1; ; n += 1) {
    const slug = n === 1 ? base : `${base}-${n}`;
    if (await insertLeague(tx, { ...input.league, contactEmail, shipTo: '', slug, now: ctx.now }))
      return slug;
  }
}

async function openSeason(
  tx: LeagueTx,
  ctx: PersonContext,
  { season, league }: Input,
  note: Note,
): Promise<{ id: string; slug: string }> {
  const id = ctx.newId();
  const slug = makeSlug(season.name, 'season');
  const freezesAt = toInstant(season.freezesAt, league.timeZone).instant;
  await insertSeason(tx, { ...season, id, slug, freezesAt, now: ctx.now });
  await setCurrentSeason(tx, id);
  await note({ type: 'season opened', subjectId: id, data: { name: season.name } });
  await enqueueJob(
    tx,
    { task: 'freeze-rosters', payload: { leagueId: tx.leagueId, seasonId: id } },
    { key: `freeze:${id}`, runAt: freezesAt },
  );
  return { id, slug };
}

async function putRulesInForce(
  tx: LeagueTx,
  ctx: PersonContext,
  { division, season, league }: Input,
  note: Note,
): Promise<string> {
  const preset = division.presetId === null ? null : findCataloguePreset(division.presetId);
  if (preset === undefined) throw notFound('code in the catalogue');
  const name = (preset?.title ?? 'Own number rules').slice(0, 80);
  const ruleSet = preset ? { ...preset.ruleSet, name } : makeBlankRuleSet(name, season.sport);
  const [id, draftId] = [ctx.newId(), ctx.newId()];
  await insertRuleSet(tx, { id, name, presetId: division.presetId, now: ctx.now });
  await insertDraft(tx, {
    id: draftId,
    ruleSetId: id,
    version: 1,
    ruleSet,
    now: ctx.now,
    userId: ctx.userId,
  });
  await putDraftInForce(tx, { id: draftId, ruleSetId: id, from: toDay(ctx.now, league.timeZone) });
  await note({ type: 'rule set put in force', subjectId: id, data: { name, version: 1 } });
  return id;
}

async function addDivision(
  tx: LeagueTx,
  ctx: PersonContext,
  { division }: Input,
  place: { seasonId: string; ruleSetId: string },
  note: Note,
): Promise<void> {
  const kit = findStarterKit(division.starterKitId);
  if (!kit) throw notFound('starter kit');
  const id = ctx.newId();
  await insertDivision(tx, {
    ...place,
    id,
    slug: makeSlug(division.name, 'division'),
    name: division.name,
    ageBand: division.ageBand,
    level: '',
    leastPlayers: division.leastPlayers,
    mostPlayers: division.mostPlayers,
    freezesAt: null,
    now: ctx.now,
  });
  await replaceGarments(tx, id, kit.garments, ctx.newId);
  await note({ type: 'division added', subjectId: id, data: { name: division.name } });
}

/** There are no teams yet: the manager is named for them on the People page once there are. */
async function inviteManager(
  tx: LeagueTx,
  ctx: PersonContext & { league: { name: string; timeZone: string }; actor: { name: string } },
  email: string,
  note: Note,
): Promise<void> {
  const id = ctx.newId();
  const token = newToken();
  const expiresAt = expiryOfInvitation(ctx.now);
  const role = 'team manager' as const;
  await insertInvitation(tx, {
    id,
    email,
    role,
    shopId: null,
    tokenHash: hashToken(token),
    invitedBy: ctx.userId,
    now: ctx.now,
    expiresAt,
  });
  await mailInvitation(tx, ctx, { email, role, teams: [], token, expiresAt });
  await note({ type: 'person invited', subjectId: id, data: { role, email } });
}
