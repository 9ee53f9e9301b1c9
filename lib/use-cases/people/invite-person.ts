import type { z } from 'zod';
import { insertAuditEvent } from '@/db/queries/audit';
import { listShops } from '@/db/queries/batches';
import {
  addInvitationTeams,
  insertInvitation,
  lockSameInvitation,
  renewInvitation,
} from '@/db/queries/invitations';
import { queueEmail } from '@/db/queries/jobs';
import {
  addMembershipTeams,
  ensureShop,
  lockMembershipByEmail,
  type Membership,
  type TeamName,
} from '@/db/queries/memberships';
import { withLeague, type LeagueTx } from '@/db/tenant';
import { joinWords } from '@/lib/domain/text/sentence';
import { AppError, notFound } from '@/lib/platform/errors';
import { hashToken, newToken } from '@/lib/platform/ids';
import { assertCan, type ActorContext } from '../context';
import { links } from '../links';
import { assertTeams, expiryOfInvitation, mailInvitation } from '../people-guards';
import { invitationBudget, spend } from '../rate-budgets';
import type { invitePersonSchema } from './people-schemas';

type Input = z.output<typeof invitePersonSchema>;
export type Invited = { outcome: 'invited' | 'sent again' | 'teams added'; email: string };

/**
 * Invites an address to a role by a link that works once, for 14 days. When such an invitation is still out it is sent
 * again with a new link; a manager of the league gets the teams at once, without a link.
 */
export async function invitePerson(ctx: ActorContext, input: Input): Promise<Invited> {
  assertCan(ctx.actor, 'people.manage');
  await spend(invitationBudget, ctx.league.id, 'This league has sent 300 invitations within an hour.');
  return withLeague(ctx.league.id, async (tx) => {
    const teams = await assertTeams(tx, input.teamIds);
    const shopId = await findOrAddShop(tx, ctx, input.shop);
    const kind = { email: input.email, role: input.role, shopId };
    const held = await lockMembershipByEmail(tx, kind);
    if (held) return addTeams(tx, ctx, held, teams);

    const token = newToken();
    const tokenHash = hashToken(token);
    const expiresAt = expiryOfInvitation(ctx.now);
    const waiting = await lockSameInvitation(tx, kind);
    const id = waiting?.id ?? ctx.newId();
    if (waiting) await renewInvitation(tx, { id, tokenHash, expiresAt });
    else
      await insertInvitation(tx, {
        ...kind,
        id,
        tokenHash,
        expiresAt,
        invitedBy: ctx.actor.userId,
        now: ctx.now,
      });
    await addInvitationTeams(
      tx,
      id,
      teams.map((team) => team.id),
    );
    const known = waiting?.teams ?? [];
    const all = [...known, ...teams.filter((team) => !known.some((entry) => entry.id === team.id))];
    await mailInvitation(tx, ctx, { email: input.email, role: input.role, teams: all, token, expiresAt });
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      {
        type: waiting ? 'invitation sent again' : 'person invited',
        subjectId: id,
        data: { role: input.role, email: input.email },
      },
    );
    return { outcome: waiting ? 'sent again' : 'invited', email: input.email };
  });
}

async function findOrAddShop(tx: LeagueTx, ctx: ActorContext, shop: Input['shop']): Promise<string | null> {
  if (shop === null) return null;
  if (shop.kind === 'existing') {
    if (!(await listShops(tx)).some((entry) => entry.id === shop.id)) throw notFound('shop');
    return shop.id;
  }
  const { id, added } = await ensureShop(tx, { id: ctx.newId(), name: shop.name, now: ctx.now });
  if (added) {
    await insertAuditEvent(
      tx,
      { ...ctx, userId: ctx.actor.userId },
      { type: 'shop added', subjectId: id, data: { name: shop.name } },
    );
  }
  return id;
}

async function addTeams(
  tx: LeagueTx,
  ctx: ActorContext,
  held: Membership,
  teams: readonly TeamName[],
): Promise<Invited> {
  const missing = teams.filter((team) => !held.teams.some((entry) => entry.id === team.id));
  if (missing.length === 0) {
    const of = held.role === 'team manager' ? ` of ${joinWords(teams.map((team) => team.name))}` : '';
    throw new AppError('conflict', `${held.name} (${held.email}) is ${held.role}${of} already.`);
  }
  await addMembershipTeams(
    tx,
    held.id,
    missing.map((team) => team.id),
  );
  const added = missing.map((team) => team.name);
  await queueEmail(tx, ctx, held.email, {
    template: 'teams-added',
    params: {
      league: ctx.league.name,
      teams: joinWords(added),
      addedBy: ctx.actor.name,
      link: links.league(ctx.league.slug),
    },
  });
  await insertAuditEvent(
    tx,
    { ...ctx, userId: ctx.actor.userId },
    {
      type: 'manager teams changed',
      subjectId: held.id,
      data: { person: held.name, added, removed: [] },
    },
  );
  return { outcome: 'teams added', email: held.email };
}
