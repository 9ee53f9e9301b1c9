import { z } from 'zod';

/** A colour as six hexadecimal digits of sRGB with a leading #. */
export const hexSchema = z
  .string()
  .regex(/^#[0-9a-fA-F]{6}$/, 'Write a colour as # and six digits, such as #14375e.');

/** One kit a team wears: garment body and sleeves, the number on it and, if there is one, the number's outline. */
export const kitSchema = z.object({
  name: z.string().min(1, 'Name the colour, such as navy.').max(40),
  body: hexSchema,
  sleeves: hexSchema,
  number: hexSchema,
  outline: hexSchema.nullable(),
});
export type Kit = z.infer<typeof kitSchema>;

export const kitKinds = ['home', 'away'] as const;
export type KitKind = (typeof kitKinds)[number];

/** The two kits of a team; away is null for a team that owns only one. */
export type TeamKits = { home: Kit; away: Kit | null };
