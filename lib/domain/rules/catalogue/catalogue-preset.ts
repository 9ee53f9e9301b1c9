import { type Citation, type RuleSet } from '../rule-set';

/** The parts of a rule set that a source can settle. What no source settles is the league's to decide. */
export const settledParts = [
  'numbers',
  'digits',
  'number of digits',
  'leading zeros',
  '0 and 00',
  'repeated numbers',
  'numbers set aside',
  'roster size',
  'roles',
  'names on the back',
  'letters of names',
] as const;
export type SettledPart = (typeof settledParts)[number];

/** A citation with the parts of the preset that rest on it and what it says about them, in our words. */
export type PresetCitation = Citation & { settles: readonly SettledPart[]; says: string };

/**
 * A published code to start a rule set from. `inForce` are days (YYYY-MM-DD) when they are known. Everything the
 * sources do not settle holds a neutral value and is named in `open`.
 */
export type CataloguePreset = {
  id: string;
  sport: string;
  title: string;
  summary: string;
  inForce: { from: string | null; to: string | null };
  ruleSet: RuleSet;
  citations: readonly PresetCitation[];
  open: readonly string[];
  checkYourBook: string;
};
