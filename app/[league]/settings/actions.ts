'use server';

import { changeLeagueSettings } from '@/lib/use-cases/leagues/change-league-settings';
import { changeLeagueSchema } from '@/lib/use-cases/leagues/league-schemas';
import { leagueAction } from '@/lib/web/action';

export const changeLeagueAction = leagueAction(changeLeagueSchema, changeLeagueSettings);
