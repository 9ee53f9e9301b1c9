import { z } from 'zod';
import { daySchema } from '@/lib/domain/dates/day';
import { listSeasonFaults } from '@/lib/domain/dates/list-season-faults';
import { localDateTimeSchema } from '@/lib/domain/dates/zone';

/** A season as its form gives it: days on the league's calendar, the freeze on the clocks of its time zone. */
export const seasonFieldsSchema = z
  .object({
    name: z.string().trim().min(1, 'Name the season, such as Spring 2027.').max(80),
    sport: z.string().trim().min(1, 'Name the sport.').max(60),
    rosterOpensOn: daySchema,
    freezesAt: localDateTimeSchema,
    releaseOn: daySchema.nullable(),
    handOutOn: daySchema,
    firstMatchOn: daySchema,
  })
  .superRefine((season, context) => {
    const freezeOn = season.freezesAt.slice(0, 10);
    for (const [field, message] of Object.entries(listSeasonFaults({ ...season, freezeOn }))) {
      context.addIssue({ code: 'custom', path: [field === 'freezeOn' ? 'freezesAt' : field], message });
    }
    if (season.releaseOn !== null && (season.releaseOn < freezeOn || season.releaseOn > season.handOutOn)) {
      context.addIssue({
        code: 'custom',
        path: ['releaseOn'],
        message: 'The release lies between the freeze and the hand-out day.',
      });
    }
  });
export type SeasonInput = z.input<typeof seasonFieldsSchema>;

export const changeSeasonSchema = z.object({
  seasonId: z.uuid(),
  rowVersion: z.int(),
  fields: seasonFieldsSchema,
});
export const seasonIdSchema = z.object({ seasonId: z.uuid() });
