/** A count with its word: `1 team`, `19 teams`; `plural` only where it is more than the word with an s. */
export function countOf(count: number, word: string, plural = `${word}s`): string {
  return `${count.toLocaleString('en')} ${count === 1 ? word : plural}`;
}
