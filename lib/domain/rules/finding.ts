import { z } from 'zod';

/** How much a finding weighs: a blocker stops submission, a caution asks for a human look, a note only informs. */
export const severitySchema = z.enum(['blocker', 'caution', 'note']);
export type Severity = z.infer<typeof severitySchema>;

/** Every kind of finding the roster check can give. Codes are part of the public API: add, never rename. */
export const findingCodes = [
  'number-missing',
  'number-unreadable',
  'number-not-allowed',
  'digit-not-allowed',
  'too-many-digits',
  'leading-zero',
  'zero-and-double-zero',
  'number-repeated',
  'number-reserved',
  'number-needs-role',
  'roster-too-small',
  'roster-too-large',
  'role-missing',
  'player-name-missing',
  'player-repeated',
  'name-on-back-missing',
  'name-on-back-not-wanted',
  'name-too-long',
  'name-letters',
  'surname-needs-initial',
  'size-missing',
  'size-not-offered',
] as const;
export const findingCodeSchema = z.enum(findingCodes);
export type FindingCode = z.infer<typeof findingCodeSchema>;

/** The part of a player a finding points at; `roster` when it is about the list as a whole. */
export const findingFieldSchema = z.enum(['name', 'nameOnBack', 'number', 'role', 'sizes', 'roster']);
export type FindingField = z.infer<typeof findingFieldSchema>;

/**
 * One thing the check has to say. `row` counts players from 0, null for the whole roster; `garment` names the
 * garment when `field` is `sizes`; `message` is a whole sentence for a person; `suggestions` are values that
 * would put `field` right, best first.
 */
export const findingSchema = z.object({
  code: findingCodeSchema,
  severity: severitySchema,
  row: z.int().min(0).nullable(),
  field: findingFieldSchema,
  garment: z.string().optional(),
  message: z.string(),
  suggestions: z.array(z.string()),
});
export type Finding = z.infer<typeof findingSchema>;

/** Counts by severity, and how many players have none of them. */
export const checkSummarySchema = z.object({
  players: z.int().min(0),
  blockers: z.int().min(0),
  cautions: z.int().min(0),
  notes: z.int().min(0),
  clean: z.int().min(0),
});
export type CheckSummary = z.infer<typeof checkSummarySchema>;
