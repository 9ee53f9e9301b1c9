'use server';

import { discardDraft } from '@/lib/use-cases/rule-sets/discard-draft';
import { putInForce } from '@/lib/use-cases/rule-sets/put-in-force';
import {
  putInForceSchema,
  ruleSetIdSchema,
  saveDraftSchema,
  startRuleSetSchema,
} from '@/lib/use-cases/rule-sets/rule-set-schemas';
import { saveDraft } from '@/lib/use-cases/rule-sets/save-draft';
import { startRuleSet } from '@/lib/use-cases/rule-sets/start-rule-set';
import { leagueAction } from '@/lib/web/action';

export const startRuleSetAction = leagueAction(startRuleSetSchema, startRuleSet);
export const saveDraftAction = leagueAction(saveDraftSchema, saveDraft);
export const discardDraftAction = leagueAction(ruleSetIdSchema, discardDraft);
export const putInForceAction = leagueAction(putInForceSchema, putInForce);
