'use server';

import { z } from 'zod';
import { addTeam } from '@/lib/use-cases/teams/add-team';
import { changeTeam } from '@/lib/use-cases/teams/change-team';
import { importTeams } from '@/lib/use-cases/teams/import-teams';
import { readTeamFile } from '@/lib/use-cases/teams/read-team-file';
import { removeTeam } from '@/lib/use-cases/teams/remove-team';
import {
  addTeamSchema,
  changeTeamSchema,
  importTeamsSchema,
  teamIdSchema,
} from '@/lib/use-cases/teams/team-schemas';
import { leagueAction } from '@/lib/web/action';

const fileSchema = z
  .instanceof(FormData)
  .transform((form) => form.get('file'))
  .pipe(z.instanceof(File, { error: 'Pick a file first.' }));

export const addTeamAction = leagueAction(addTeamSchema, addTeam);
export const changeTeamAction = leagueAction(changeTeamSchema, changeTeam);
export const removeTeamAction = leagueAction(teamIdSchema, removeTeam);
export const importTeamsAction = leagueAction(importTeamsSchema, importTeams);
export const readTeamFileAction = leagueAction(fileSchema, async (ctx, file) =>
  readTeamFile(ctx, { name: file.name, bytes: new Uint8Array(await file.arrayBuffer()) }),
);
