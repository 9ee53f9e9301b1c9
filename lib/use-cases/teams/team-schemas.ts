import { z } from 'zod';
import { kitSchema } from '@/lib/domain/kit/kit';

const teamNameSchema = z.string().trim().min(1, 'Name the team.').max(80, 'Write at most 80 characters.');

export const teamFieldsSchema = z.object({
  name: teamNameSchema,
  divisionId: z.uuid('Pick a division.'),
  kits: z.object({ home: kitSchema, away: kitSchema.nullable() }),
});
export type TeamInput = z.input<typeof teamFieldsSchema>;

export const addTeamSchema = z.object({ season: z.string().max(80), fields: teamFieldsSchema });
export const changeTeamSchema = z.object({ teamId: z.uuid(), rowVersion: z.int(), fields: teamFieldsSchema });
export const teamIdSchema = z.object({ teamId: z.uuid() });

export const importTeamsSchema = z.object({
  season: z.string().max(80),
  teams: z
    .array(
      z.object({
        name: teamNameSchema,
        divisionId: z.uuid(),
        home: kitSchema.nullable(),
        away: kitSchema.nullable(),
      }),
    )
    .min(1, 'There is no team to import.')
    .max(500, 'Import at most 500 teams at a time.'),
  /** How many rows of the list were refused in the preview: kept in the history, nothing else. */
  refused: z.int().min(0).max(5000),
});
