import { readUpload } from '@/lib/platform/files/read-upload';
import { AppError } from '@/lib/platform/errors';

/** The first sheet of a workbook that somebody without an account brings to the check; nothing of it is stored. */
export async function readPublicWorkbook(input: {
  name: string;
  bytes: Uint8Array;
}): Promise<{ rows: string[][]; sheet: string }> {
  const result = await readUpload(input);
  if (!result.ok) throw new AppError('invalid', result.message);
  const [first] = result.tables;
  if (!first) throw new AppError('invalid', `${input.name} has no sheet with a list in it.`);
  return { rows: first.rows, sheet: first.name };
}
