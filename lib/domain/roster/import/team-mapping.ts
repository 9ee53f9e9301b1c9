import { z } from 'zod';
import { findHeadingRow, listHeadings } from './find-headings';
import { findTeamField, teamFields } from './heading-words';
import { fileLimits } from './limits';

/** What a column of a list of teams holds; `extra` columns are shown but nothing reads them. */
const teamColumnSchema = z.enum([...teamFields, 'extra', 'leave out']);
export type TeamColumn = z.infer<typeof teamColumnSchema>;

const headingRowSchema = z
  .int()
  .min(0)
  .max(fileLimits.rows + fileLimits.aboveHeadings)
  .nullable();

/** How a list of teams is read: the index (from 0) of its row of headings, or null, and what each column holds. */
export const teamMappingSchema = z
  .object({ headerRow: headingRowSchema, columns: z.array(teamColumnSchema).max(fileLimits.columns) })
  .superRefine(({ columns }, context) => {
    for (const [index, column] of columns.entries()) {
      if (column === 'extra' || column === 'leave out' || columns.indexOf(column) === index) continue;
      const message = 'Two columns are chosen for the same thing. Choose one of them.';
      context.addIssue({ code: 'custom', path: ['columns', index], message });
    }
  });
export type TeamMapping = z.infer<typeof teamMappingSchema>;

/**
 * Guesses what each column of a list of teams holds, by its heading; the first column is the team when no heading says
 * so. Columns that fit nothing, or come a second time, become `extra`.
 */
export function guessTeamMapping(rows: readonly (readonly string[])[]): TeamMapping {
  const headerRow = findHeadingRow(rows);
  const header = headerRow === null ? [] : (rows[headerRow] ?? []);
  const taken = new Set<TeamColumn>();
  const columns = listHeadings(rows, headerRow).headings.map((_, column): TeamColumn => {
    const field = findTeamField(header[column] ?? '');
    if (field === null || taken.has(field)) return 'extra';
    taken.add(field);
    return field;
  });
  if (!taken.has('team') && columns[0] === 'extra') columns[0] = 'team';
  return { headerRow, columns };
}
