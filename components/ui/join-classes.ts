/** Joins class names and leaves out what is off. Later names do not override earlier ones: keep them apart. */
export const joinClasses = (...names: (string | false | null | undefined)[]): string =>
  names.filter(Boolean).join(' ');
