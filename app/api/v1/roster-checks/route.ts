import { findCataloguePreset } from '@/lib/domain/rules/catalogue/catalogue';
import { checkRoster } from '@/lib/domain/rules/check-roster';
import { notFound } from '@/lib/platform/errors';
import { rosterCheckRequestSchema } from '@/lib/web/api-v1/roster-check-schemas';
import { defineRoute } from '@/lib/web/route';

/** Checks a roster that is not stored, against a preset of the catalogue or a rule set in the body. */
export const POST = defineRoute({
  access: 'public',
  body: rosterCheckRequestSchema,
  async run(_ctx, { body }) {
    const ruleSet =
      'preset' in body.ruleSet ? findCataloguePreset(body.ruleSet.preset)?.ruleSet : body.ruleSet;
    if (!ruleSet) throw notFound('preset in the catalogue');
    return Response.json(checkRoster(ruleSet, body.players, body.garments), {
      headers: { 'cache-control': 'no-store' },
    });
  },
});
