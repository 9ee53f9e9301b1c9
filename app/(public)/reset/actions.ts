'use server';

import { headers } from 'next/headers';
import { askForResetSchema, setNewPasswordSchema } from '@/lib/use-cases/account/account-schemas';
import { askForReset } from '@/lib/use-cases/account/ask-for-reset';
import { setNewPassword } from '@/lib/use-cases/account/set-new-password';
import { publicAction } from '@/lib/web/action';
import { readClientAddress } from '@/lib/web/request';

export const askForResetAction = publicAction(askForResetSchema, async (ctx, input) =>
  askForReset(ctx, { ...input, address: readClientAddress(await headers()) }),
);

export const setNewPasswordAction = publicAction(setNewPasswordSchema, setNewPassword);
