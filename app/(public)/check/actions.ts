'use server';

import { headers } from 'next/headers';
import { z } from 'zod';
import { checkPublicBudget } from '@/lib/use-cases/account/check-public-budget';
import { readPublicWorkbook } from '@/lib/use-cases/public/read-public-workbook';
import { publicAction } from '@/lib/web/action';
import { readClientAddress } from '@/lib/web/request';

const formSchema = z
  .instanceof(FormData)
  .transform((form) => form.get('file'))
  .pipe(z.instanceof(File, { error: 'Pick a workbook first.' }));

/** Reads a workbook for the check without an account; it counts as one of the address's requests, and nothing is kept. */
export const readWorkbookAction = publicAction(formSchema, async (_ctx, file) => {
  await checkPublicBudget(readClientAddress(await headers()));
  return readPublicWorkbook({ name: file.name, bytes: new Uint8Array(await file.arrayBuffer()) });
});
