import { z } from 'zod';

/** How a single rule weighs in one rule set; `off` leaves it unchecked. */
export const ruleWeightSchema = z.enum(['blocker', 'caution', 'off']);
export type RuleWeight = z.infer<typeof ruleWeightSchema>;

/** Where a value comes from and how it is known. Printed beside every verdict that rests on it. */
export const citationSchema = z.object({
  body: z.string().max(120),
  document: z.string().max(200),
  edition: z.string().max(120),
  rule: z.string().max(120),
  known: z.enum(['read', 'quoted by others', 'from memory', 'common practice', "the league's own"]),
});
export type Citation = z.infer<typeof citationSchema>;

/** A label or labels set aside: only these roles may wear it, or nobody when `roles` is empty. */
export const reservedSchema = z.object({
  labels: z.string().min(1).max(120),
  roles: z.array(z.string().min(1).max(40)).max(12),
  reason: z.string().min(1).max(200),
});
export type Reserved = z.infer<typeof reservedSchema>;

/**
 * The rules one version of a rule set states. `labels.allowed` is written as ranges and single labels
 * (`0, 00, 1-5, 10-15`); `digits` is the set of digits officials can signal, null for any.
 */
export const ruleSetSchema = z.object({
  name: z.string().min(1).max(80),
  sport: z.string().min(1).max(60),
  labels: z.object({
    allowed: z.string().min(1).max(400),
    digits: z
      .string()
      .regex(/^[0-9]{1,10}$/)
      .nullable(),
    digitsReason: z.string().max(200),
    mostDigits: z.int().min(1).max(3),
    leadingZeros: z.enum(['refused', 'same as without', 'allowed']),
    zeroAndDoubleZero: z.enum(['both and different', 'not both', 'one value', 'neither']),
    weight: ruleWeightSchema,
  }),
  uniqueness: z.object({ within: z.enum(['team', 'none']), weight: ruleWeightSchema }),
  reserved: z.array(reservedSchema).max(40),
  reservedWeight: ruleWeightSchema,
  roster: z.object({
    least: z.int().min(0).max(200),
    most: z.int().min(1).max(200),
    requiredRoles: z
      .array(z.object({ role: z.string().min(1).max(40), least: z.int().min(1).max(20) }))
      .max(12),
    weight: ruleWeightSchema,
  }),
  names: z.object({
    onBack: z.enum(['wanted', 'allowed', 'not allowed']),
    mostLetters: z.int().min(1).max(40),
    letters: z.enum(['any', 'latin']),
    sharedSurnameNeedsInitial: z.boolean(),
    weight: ruleWeightSchema,
  }),
  sizes: z.object({ weight: ruleWeightSchema }),
  citations: z.array(citationSchema).max(20),
});
export type RuleSet = z.infer<typeof ruleSetSchema>;
