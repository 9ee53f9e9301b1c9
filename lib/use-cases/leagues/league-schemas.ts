import { z } from 'zod';
import { isTimeZone } from '@/lib/domain/dates/zone';
import { emailSchema } from '../account/account-schemas';

const currencies = new Set(Intl.supportedValuesOf('currency'));

export const leagueFieldsSchema = z.object({
  name: z
    .string()
    .trim()
    .min(1, 'Name the league.')
    .max(120, 'Write at most 120 characters.')
    .regex(/^\P{Cc}*$/u, 'Write the name on one line.'),
  timeZone: z.string().max(60).refine(isTimeZone, 'Choose a time zone from the list, such as Europe/London.'),
  unit: z.enum(['in', 'mm'], 'Choose inches or millimetres.'),
  paper: z.enum(['A4', 'Letter'], 'Choose A4 or Letter.'),
  currency: z.string().refine((code) => currencies.has(code), 'Choose a currency from the list.'),
  contactEmail: z.preprocess((value) => (value === '' ? null : value), emailSchema.nullable()).default(null),
  shipTo: z.string().trim().max(500, 'Write at most 500 characters.').default(''),
});

export const changeLeagueSchema = leagueFieldsSchema.extend({ rowVersion: z.int() });
