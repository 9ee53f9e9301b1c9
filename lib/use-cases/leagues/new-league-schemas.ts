import { z } from 'zod';
import { quoteText } from '@/lib/domain/text/sentence';
import { emailSchema } from '../account/account-schemas';
import { seasonFieldsSchema } from '../seasons/season-schemas';
import { leagueFieldsSchema } from './league-schemas';

const text = (most: number, empty: string) =>
  z.string().trim().min(1, empty).max(most, `Write at most ${most} characters.`);

const limit = z.coerce.number<string | number>('Write a whole number.').int('Write a whole number.');
const divisionSchema = z
  .object({
    name: text(80, 'Name the division, such as Under 12 mixed.'),
    ageBand: z.string().trim().max(40, 'Write at most 40 characters.').default(''),
    leastPlayers: limit.min(0, 'Not below 0.').max(200, 'At most 200.'),
    mostPlayers: limit.min(1, 'At least 1.').max(200, 'At most 200.'),
    starterKitId: z.string().max(60),
    /** A code of the catalogue, or null for rules that allow every number from 0 to 99. */
    presetId: z.string().max(80).nullable(),
  })
  .refine((division) => division.leastPlayers <= division.mostPlayers, {
    path: ['mostPlayers'],
    error: 'The most players cannot be fewer than the least.',
  });

const mostManagers = 60;
/** Addresses as people paste them: a line each, or with commas, semicolons or blanks between. */
const addressListSchema = z
  .string()
  .max(6000, 'Write fewer addresses; more people can be invited later.')
  .transform((list, context) => {
    const words = [...new Set(list.split(/[\s,;]+/).filter((word) => word !== ''))];
    const read = words.map((word) => ({ word, email: emailSchema.safeParse(word).data }));
    const bad = read.find((entry) => entry.email === undefined);
    if (bad) {
      context.addIssue({ code: 'custom', message: `${quoteText(bad.word)} is not an e-mail address.` });
    } else if (read.length > mostManagers) {
      context.addIssue({
        code: 'custom',
        message: `Invite at most ${mostManagers} now, and the others later.`,
      });
    }
    return [...new Set(read.flatMap((entry) => entry.email ?? []))];
  });

export const createLeagueSchema = z.object({
  league: leagueFieldsSchema.pick({ name: true, timeZone: true, unit: true, paper: true, currency: true }),
  /** The freeze is read on clocks of the league's time zone. */
  season: seasonFieldsSchema,
  division: divisionSchema,
  managers: addressListSchema,
});
export type CreateLeagueInput = z.input<typeof createLeagueSchema>;
