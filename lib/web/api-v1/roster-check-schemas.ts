import { z } from 'zod';
import { garmentSchema, playerLimits } from '@/lib/domain/roster/player';
import { checkSummarySchema, findingSchema } from '@/lib/domain/rules/finding';
import { citationSchema, ruleSetSchema } from '@/lib/domain/rules/rule-set';

const mostPlayers = 2000;

/** A number is a label: text keeps `00` and `07`; a JSON number is taken as it would be written. */
const numberSchema = z
  .union([z.string().max(playerLimits.number), z.int().min(0).max(999)])
  .transform(String)
  .meta({
    description: 'The label worn, best as text: "00" and "0" differ, "07" is not "7".',
    examples: ['14', '00'],
  });

const checkedPlayerSchema = z
  .strictObject({
    name: z.string().max(playerLimits.name),
    nameOnBack: z.string().max(playerLimits.nameOnBack).default(''),
    number: numberSchema,
    role: z.string().max(playerLimits.role).default(''),
    sizes: z.record(z.string().max(40), z.string().max(playerLimits.size)).default({}),
  })
  .meta({ id: 'Player', description: 'One line of a roster. `sizes` maps a garment code to a size code.' });

const presetRefSchema = z
  .strictObject({ preset: z.string().min(1).max(80).describe('An id from GET /api/v1/rule-catalogue.') })
  .meta({ id: 'RuleSetPreset' });

export const rosterCheckRequestSchema = z
  .strictObject({
    ruleSet: z.union([presetRefSchema, ruleSetSchema.meta({ id: 'RuleSet' })]),
    players: z
      .array(checkedPlayerSchema)
      .max(mostPlayers, `Send at most ${mostPlayers.toLocaleString('en')} players at a time.`),
    garments: z.array(garmentSchema).max(40).default([]).describe('Only needed to have sizes checked.'),
  })
  .meta({ id: 'RosterCheckRequest' });

export const rosterCheckAnswerSchema = z
  .object({
    findings: z.array(findingSchema.meta({ id: 'Finding' })),
    summary: checkSummarySchema.meta({ id: 'CheckSummary' }),
  })
  .meta({ id: 'RosterCheck' });

export const ruleCatalogueSchema = z
  .object({
    presets: z.array(
      z
        .object({
          id: z.string(),
          sport: z.string(),
          title: z.string(),
          summary: z.string(),
          inForce: z
            .object({ from: z.string().nullable(), to: z.string().nullable() })
            .describe('Days from and to which the code held, where known.'),
          citations: z.array(citationSchema.extend({ settles: z.array(z.string()), says: z.string() })),
          open: z.array(z.string()).describe('What the source does not say and the league must decide.'),
          checkYourBook: z.string(),
          ruleSet: ruleSetSchema,
        })
        .meta({ id: 'RuleCataloguePreset' }),
    ),
  })
  .meta({ id: 'RuleCatalogue' });

/** Errors of the API (RFC 9457, application/problem+json). */
export const problemSchema = z
  .object({
    type: z.string(),
    title: z.string(),
    status: z.int(),
    detail: z.string().describe('What is wrong and what to do, for a person.'),
    instance: z.string().describe('The id of this request, to quote when asking for help.'),
    errors: z.array(z.object({ path: z.string(), detail: z.string() })),
  })
  .meta({ id: 'Problem' });
