import { z } from 'zod';
import { localDateTimeSchema } from '@/lib/domain/dates/zone';
import { garmentSchema } from '@/lib/domain/roster/player';

export const divisionFieldsSchema = z
  .object({
    name: z.string().trim().min(1, 'Name the division, such as U12 Mixed.').max(80),
    ageBand: z.string().trim().max(40),
    level: z.string().trim().max(40),
    ruleSetId: z.uuid('Pick the number rules it plays by.'),
    leastPlayers: z.int('Write a whole number.').min(0).max(200),
    mostPlayers: z.int('Write a whole number.').min(1, 'At least 1.').max(200, 'At most 200.'),
    /** On the clocks of the league's time zone; null where the season's freeze holds. */
    freezesAt: localDateTimeSchema.nullable(),
    garments: z.array(garmentSchema).min(1, 'Add at least one garment.').max(20),
  })
  .refine((division) => division.leastPlayers <= division.mostPlayers, {
    path: ['mostPlayers'],
    error: 'The most players cannot be fewer than the least.',
  })
  .superRefine((division, context) => {
    for (const part of ['code', 'name'] as const) {
      const seen = new Set<string>();
      division.garments.forEach((garment, index) => {
        const key = garment[part].toLowerCase();
        if (seen.has(key)) {
          context.addIssue({
            code: 'custom',
            path: ['garments', index, 'name'],
            message: `There are two garments called ${garment.name}.`,
          });
        }
        seen.add(key);
      });
    }
    division.garments.forEach((garment, index) => {
      const codes = garment.sizes.map((size) => size.code.toLowerCase());
      if (new Set(codes).size < codes.length) {
        context.addIssue({
          code: 'custom',
          path: ['garments', index, 'sizes'],
          message: `${garment.name} offers one size twice.`,
        });
      }
    });
  });
export type DivisionInput = z.input<typeof divisionFieldsSchema>;

export const addDivisionSchema = z.object({ season: z.string().max(80), fields: divisionFieldsSchema });
export const changeDivisionSchema = z.object({
  divisionId: z.uuid(),
  rowVersion: z.int(),
  fields: divisionFieldsSchema,
});
export const divisionIdSchema = z.object({ divisionId: z.uuid() });
