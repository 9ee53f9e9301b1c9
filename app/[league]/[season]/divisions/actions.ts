'use server';

import { addDivision } from '@/lib/use-cases/divisions/add-division';
import { changeDivision } from '@/lib/use-cases/divisions/change-division';
import {
  addDivisionSchema,
  changeDivisionSchema,
  divisionIdSchema,
} from '@/lib/use-cases/divisions/division-schemas';
import { removeDivision } from '@/lib/use-cases/divisions/remove-division';
import { leagueAction } from '@/lib/web/action';

export const addDivisionAction = leagueAction(addDivisionSchema, addDivision);
export const changeDivisionAction = leagueAction(changeDivisionSchema, changeDivision);
export const removeDivisionAction = leagueAction(divisionIdSchema, removeDivision);
