'use server';

import { revalidatePath } from 'next/cache';
import { freezeRoster } from '@/lib/use-cases/rosters/freeze-roster';
import { importRoster } from '@/lib/use-cases/rosters/import-roster';
import { reopenRoster } from '@/lib/use-cases/rosters/reopen-roster';
import { returnRoster } from '@/lib/use-cases/rosters/return-roster';
import {
  importRosterSchema,
  reasonedStepSchema,
  rosterStepSchema,
} from '@/lib/use-cases/rosters/roster-schemas';
import { signOffRoster } from '@/lib/use-cases/rosters/sign-off-roster';
import { submitRoster } from '@/lib/use-cases/rosters/submit-roster';
import { withdrawRoster } from '@/lib/use-cases/rosters/withdraw-roster';
import { leagueAction } from '@/lib/web/action';

/** The state of a roster shows on many pages of its league: lists, readiness, batches, the counts in the panel. */
const afterwards =
  <A extends unknown[], T>(run: (...args: A) => Promise<T>) =>
  async (...args: A): Promise<T> => {
    const answer = await run(...args);
    revalidatePath('/[league]', 'layout');
    return answer;
  };

export const submitRosterAction = leagueAction(rosterStepSchema, afterwards(submitRoster));
export const withdrawRosterAction = leagueAction(rosterStepSchema, afterwards(withdrawRoster));
export const returnRosterAction = leagueAction(reasonedStepSchema, afterwards(returnRoster));
export const signOffRosterAction = leagueAction(rosterStepSchema, afterwards(signOffRoster));
export const reopenRosterAction = leagueAction(reasonedStepSchema, afterwards(reopenRoster));
export const freezeRosterAction = leagueAction(rosterStepSchema, afterwards(freezeRoster));
export const importRosterAction = leagueAction(importRosterSchema, afterwards(importRoster));
