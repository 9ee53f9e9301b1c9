/** JSON with the keys of every object in code-unit order and no white space: equal values give equal text. */
export function writeCanonicalJson(value: unknown): string {
  if (Array.isArray(value)) return `[${value.map(writeCanonicalJson).join(',')}]`;
  if (value !== null && typeof value === 'object') {
    const entries = Object.entries(value)
      .filter(([, entry]) => entry !== undefined)
      .sort(([a], [b]) => (a < b ? -1 : 1));
    return `{${entries.map(([key, entry]) => `${JSON.stringify(key)}:${writeCanonicalJson(entry)}`).join(',')}}`;
  }
  return JSON.stringify(value);
}
