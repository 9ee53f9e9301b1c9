'use server';

import { remindManagers, remindSchema } from '@/lib/use-cases/readiness/remind-managers';
import { leagueAction } from '@/lib/web/action';

export const remindManagersAction = leagueAction(remindSchema, remindManagers);
