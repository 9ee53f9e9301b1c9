'use server';

import { createLeague } from '@/lib/use-cases/leagues/create-league';
import { createLeagueSchema } from '@/lib/use-cases/leagues/new-league-schemas';
import { personAction } from '@/lib/web/action';

export const createLeagueAction = personAction(createLeagueSchema, createLeague);
