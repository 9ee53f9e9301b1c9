import type { z } from 'zod';
import { AppError } from '@/lib/platform/errors';

/** Turns zod's issues into one `invalid` error: a sentence for each field, by its path joined with dots. */
export function describeIssues(error: z.ZodError): AppError {
  const fields: Record<string, string> = {};
  for (const issue of error.issues) {
    const path = issue.path.map(String).join('.');
    fields[path] ??= issue.message;
  }
  const paths = Object.keys(fields).filter((path) => path !== '');
  const first = Object.values(fields)[0] ?? '';
  const message =
    paths.length > 1
      ? `Put ${paths.length} fields right: ${paths.slice(0, 5).join(', ')}.`
      : paths[0] === undefined
        ? first
        : `${paths[0]}: ${first}`;
  return new AppError('invalid', message, { fields });
}
