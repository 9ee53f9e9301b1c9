'use server';

import { chooseCurrentSeason } from '@/lib/use-cases/seasons/choose-current-season';
import { changeSeason } from '@/lib/use-cases/seasons/change-season';
import { openSeason } from '@/lib/use-cases/seasons/open-season';
import {
  changeSeasonSchema,
  seasonFieldsSchema,
  seasonIdSchema,
} from '@/lib/use-cases/seasons/season-schemas';
import { leagueAction } from '@/lib/web/action';

export const openSeasonAction = leagueAction(seasonFieldsSchema, openSeason);
export const changeSeasonAction = leagueAction(changeSeasonSchema, changeSeason);
export const chooseCurrentSeasonAction = leagueAction(seasonIdSchema, chooseCurrentSeason);
