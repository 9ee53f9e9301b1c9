/** A file to try bringing in with: where it lies under /samples, what it is called, and what it shows. */
export type SampleFile = { file: string; kind: 'roster' | 'teams'; title: string; says: string };

/** The sample files of public/samples, plain ones first. All people and teams in them are invented. */
export const sampleFiles: readonly SampleFile[] = [
  {
    file: 'clean-roster.csv',
    kind: 'roster',
    title: 'Clean roster, CSV',
    says: 'Thirteen players with number and sizes, and nothing to put right.',
  },
  {
    file: 'clean-roster.xlsx',
    kind: 'roster',
    title: 'Clean roster, workbook',
    says: 'The same thirteen players; numbers shown as 07 and 00 stay what they show.',
  },
  {
    file: 'semicolon-windows-1252.csv',
    kind: 'roster',
    title: 'Semicolons and an old encoding',
    says: 'German headings, first and last name apart, letters stored as Windows-1252.',
  },
  {
    file: 'utf16-tabs.txt',
    kind: 'roster',
    title: 'Unicode text with tabs',
    says: 'What a spreadsheet saves as Unicode text: UTF-16 with tabs.',
  },
  {
    file: 'two-headings-and-totals.csv',
    kind: 'roster',
    title: 'Titles, two headings and totals',
    says: 'A printed page saved as a list: titles above, headings repeated, sums and blank rows between.',
  },
  {
    file: 'numbers-as-people-type-them.csv',
    kind: 'roster',
    title: 'Numbers as people type them',
    says: '7.0, No. 7, #07, Arabic and full-width digits, and some that only a person can read.',
  },
  {
    file: 'duplicates-and-long-names.csv',
    kind: 'roster',
    title: 'Doubles and long names',
    says: 'Shared numbers and surnames, one player twice, two columns called Size, names of one letter and of 80.',
  },
  {
    file: 'formulas.csv',
    kind: 'roster',
    title: 'Cells that look like formulas',
    says: 'Harmless ones: kept as text, never worked out, and neutralised when exported.',
  },
  {
    file: 'right-to-left.csv',
    kind: 'roster',
    title: 'Arabic and Hebrew names',
    says: 'Names written from right to left, with digits of their own and marks nobody sees.',
  },
  {
    file: 'no-header.csv',
    kind: 'roster',
    title: 'No headings',
    says: 'Players from the first row on: columns are told by what they hold.',
  },
  {
    file: 'team-list.csv',
    kind: 'teams',
    title: 'List of teams',
    says: 'Eight teams with division, colours and managers; one colour and one division to put right.',
  },
];
