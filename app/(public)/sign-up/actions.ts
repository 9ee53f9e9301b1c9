'use server';

import { headers } from 'next/headers';
import { askForAccountSchema, openAccountSchema } from '@/lib/use-cases/account/account-schemas';
import { askForAccount } from '@/lib/use-cases/account/ask-for-account';
import { openAccount } from '@/lib/use-cases/account/open-account';
import { publicAction } from '@/lib/web/action';
import { readClientAddress } from '@/lib/web/request';

export const askForAccountAction = publicAction(askForAccountSchema, async (ctx, input) =>
  askForAccount(ctx, { ...input, address: readClientAddress(await headers()) }),
);

export const openAccountAction = publicAction(openAccountSchema, openAccount);
