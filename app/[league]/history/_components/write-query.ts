/** The part of an address after the question mark that asks for this piece of the history; empty when it asks for nothing. */
export function writeQuery(query: { kind: string | null; search: string; before: string | null }): string {
  const given = Object.entries(query).filter(
    (entry): entry is [string, string] => entry[1] !== null && entry[1] !== '',
  );
  return given.length === 0 ? '' : `?${new URLSearchParams(given).toString()}`;
}
