import { z } from 'zod';
import { ruleSetSchema } from '@/lib/domain/rules/rule-set';

export const startRuleSetSchema = z.object({
  name: z.string().trim().min(1, 'Name the rule set, such as Digits 0–5.').max(80),
  sport: z.string().trim().min(1, 'Name the sport.').max(60),
  /** A preset of the catalogue, or null for rules of the league's own. */
  presetId: z.string().max(80).nullable(),
});

export const saveDraftSchema = z.object({
  ruleSetId: z.uuid(),
  /** The row version of the draft that was opened; null when there was none and a new one is wanted. */
  rowVersion: z.int().nullable(),
  ruleSet: ruleSetSchema,
});

export const ruleSetIdSchema = z.object({ ruleSetId: z.uuid() });

export const putInForceSchema = z.object({ ruleSetId: z.uuid(), rowVersion: z.int() });
