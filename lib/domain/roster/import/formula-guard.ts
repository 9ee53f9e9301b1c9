/**
 * What a spreadsheet may run as a formula when a CSV file is opened: a cell whose first character is = + - @, a tab or
 * a line end, also in full width, also behind spaces. Source: OWASP, CSV Injection; the full-width forms and the
 * leading spaces are our own addition. Any number of apostrophes in front is included so that guarding is reversible.
 */
const formulaLike = /^'*(?:[\t\r\n]|[\s\u00A0\u200B\uFEFF]*[=+\-@\uFF1D\uFF0B\uFF0D\uFF20])/;
const guarded = /^'+(?:[\t\r\n]|[\s\u00A0\u200B\uFEFF]*[=+\-@\uFF1D\uFF0B\uFF0D\uFF20])/;

/** Whether a spreadsheet might run this cell as a formula once it stands in a CSV file without a guard. */
export const looksLikeFormula = (cell: string): boolean => formulaLike.test(cell);

/** Puts one apostrophe before text that might run as a formula; all other text is returned as it is. */
export const guardCell = (cell: string): string => (formulaLike.test(cell) ? `'${cell}` : cell);

/**
 * Takes off the one apostrophe that `guardCell` put there, and nothing else: `unguardCell(guardCell(x)) = x` for every
 * text, and names such as 'Alembert keep theirs.
 */
export const unguardCell = (cell: string): string => (guarded.test(cell) ? cell.slice(1) : cell);
