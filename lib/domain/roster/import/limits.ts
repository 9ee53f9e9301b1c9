import { refuse, type Refusal } from './refusal';

/**
 * What one file or paste may hold: `bytes` of the file as sent (5 MB, of 1,048,576 bytes each), `rows` of data below
 * the headings, `columns` across, and `aboveHeadings` lines of title that may stand over the headings.
 */
export const fileLimits = { bytes: 5 * 1024 * 1024, rows: 2000, columns: 100, aboveHeadings: 10 } as const;

/** The refusal of a file of `bytes` bytes when that is over the limit, else null. */
export function refuseSize(bytes: number): Refusal | null {
  if (bytes <= fileLimits.bytes) return null;
  const size = (bytes / (1024 * 1024)).toFixed(1);
  return refuse(
    'too-large',
    `This file is ${size} MB and the most is 5 MB. Keep only the sheet and the columns of the roster, or split it into parts.`,
  );
}

/**
 * The refusal of `rows` rows of data when that is over the limit, else null. `counted` says what the number is: all
 * rows of data, all with the headings among them, or the count at which counting stopped.
 */
export function refuseRowCount(
  rows: number,
  counted: 'all' | 'with headings' | 'at least' = 'all',
): Refusal | null {
  if (rows <= fileLimits.rows) return null;
  const amount = `${counted === 'at least' ? 'at least ' : ''}${rows.toLocaleString('en-GB')}`;
  return refuse(
    'too-many-rows',
    `This list has ${amount} rows${counted === 'with headings' ? ', headings included,' : ''} and the most is 2,000. ` +
      'Keep the rows of one team, or split the list into parts of at most 2,000 rows.',
  );
}

/** The refusal of a table of `columns` columns when that is over the limit, else null. */
export function refuseColumnCount(columns: number): Refusal | null {
  if (columns <= fileLimits.columns) return null;
  return refuse(
    'too-many-columns',
    `This list has ${columns.toLocaleString('en-GB')} columns and the most is ${fileLimits.columns}. ` +
      'Keep the columns of the roster and delete the others.',
  );
}
