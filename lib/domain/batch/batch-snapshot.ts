import { z } from 'zod';
import { garmentSchema } from '../roster/player';
import { kitSchema } from '../kit/kit';

/**
 * Everything the decorator needs of a batch, frozen when it is released. It holds no e-mail address, no birth date
 * and no contact of a family: a player is a name, a number and sizes. Order is fixed: teams by division then name,
 * players by their place in the roster.
 */
export const batchSnapshotSchema = z.object({
  format: z.literal('raglan-batch'),
  formatVersion: z.literal(1),
  batch: z.object({
    code: z.string(),
    league: z.string(),
    season: z.string(),
    shop: z.string(),
    /** Calendar day, YYYY-MM-DD, or null when nothing was promised. */
    promisedOn: z.string().nullable(),
    /** Instant of release, ISO 8601 in UTC. Every document takes its date from here, none from the clock. */
    releasedAt: z.string(),
    timeZone: z.string(),
    paper: z.enum(['A4', 'Letter']),
  }),
  teams: z.array(
    z.object({
      id: z.string(),
      name: z.string(),
      slug: z.string(),
      division: z.string(),
      kits: z.object({ home: kitSchema, away: kitSchema.nullable() }),
      garments: z.array(garmentSchema),
      players: z.array(
        z.object({
          id: z.string(),
          /** The code on the bag label, unique in the batch, e.g. `7F3K-92QD`. */
          bagCode: z.string(),
          name: z.string(),
          nameOnBack: z.string(),
          number: z.string(),
          role: z.string(),
          sizes: z.record(z.string(), z.string()),
        }),
      ),
    }),
  ),
});
export type BatchSnapshot = z.infer<typeof batchSnapshotSchema>;
export type SnapshotTeam = BatchSnapshot['teams'][number];
export type SnapshotPlayer = SnapshotTeam['players'][number];
