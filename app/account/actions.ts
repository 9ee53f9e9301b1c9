'use server';

import { changeNameSchema, changePasswordSchema } from '@/lib/use-cases/account/account-schemas';
import { changeName } from '@/lib/use-cases/account/change-name';
import { changePassword } from '@/lib/use-cases/account/change-password';
import { signOutEverywhere } from '@/lib/use-cases/account/sign-out-everywhere';
import { z } from 'zod';
import { personAction } from '@/lib/web/action';

export const changeNameAction = personAction(changeNameSchema, changeName);
export const changePasswordAction = personAction(changePasswordSchema, changePassword);
export const signOutEverywhereAction = personAction(z.object({}), signOutEverywhere);
