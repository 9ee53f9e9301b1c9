import { z } from 'zod';

/** Longest entries kept. Longer input is reported, never cut. */
export const playerLimits = { name: 120, nameOnBack: 60, number: 20, role: 40, size: 20, note: 500 } as const;

/** The most players one roster holds; rule sets ask for fewer. */
export const mostPlayersPerRoster = 200;

/**
 * One line of a roster as a person entered it. `number` and sizes are text exactly as typed (a number is a label),
 * empty when not given; `sizes` maps a garment code to a size code.
 */
export const rosterLineSchema = z.object({
  name: z.string().max(playerLimits.name),
  nameOnBack: z.string().max(playerLimits.nameOnBack),
  number: z.string().max(playerLimits.number),
  role: z.string().max(playerLimits.role),
  sizes: z.record(z.string().max(40), z.string().max(playerLimits.size)),
});
export type RosterLine = z.infer<typeof rosterLineSchema>;

/** A roster line that has been stored: it has an id, a place in the list, and cells nobody could map. */
export type Player = RosterLine & {
  id: string;
  position: number;
  /** What a file held in columns that were mapped to nothing, by heading: kept and shown, never dropped. */
  extra: Record<string, string>;
};

/** A garment of a division's kit with the sizes it is offered in, smallest first. */
export const garmentSchema = z.object({
  code: z
    .string()
    .regex(/^[a-z][a-z0-9-]{0,38}$/)
    .describe('short name, unique in a division'),
  name: z.string().min(1).max(60),
  worn: z.enum(['home', 'away', 'home and away']),
  numbered: z.boolean(),
  named: z.boolean(),
  sizes: z
    .array(z.object({ code: z.string().min(1).max(20), label: z.string().min(1).max(40) }))
    .min(1)
    .max(40),
});
export type Garment = z.infer<typeof garmentSchema>;
