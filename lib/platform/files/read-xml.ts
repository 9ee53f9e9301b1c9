const entities: Record<string, string> = { amp: '&', lt: '<', gt: '>', quot: '"', apos: "'" };

/** Text of XML with its five named entities and its character references put right; what is neither stays. */
export const decodeEntities = (text: string): string =>
  text.replace(
    /&(?:#x([0-9a-f]{1,6})|#([0-9]{1,7})|(amp|lt|gt|quot|apos));/gi,
    (whole, hex, decimal, name) => {
      if (typeof name === 'string') return entities[name.toLowerCase()] ?? whole;
      const code = typeof hex === 'string' ? Number.parseInt(hex, 16) : Number(decimal);
      return code <= 0x10ffff ? String.fromCodePoint(code) : whole;
    },
  );

/**
 * One attribute from the inside of a tag, whatever its prefix: its text, null when it is not there, undefined when it
 * is there more than once, so that two readers could take different ones.
 */
export function readAttribute(attributes: string, name: string): string | null | undefined {
  const found = [...attributes.matchAll(/([^\s=:"'/]+)\s*=\s*(?:"([^"]*)"|'([^']*)')/g)].filter(
    ([, key]) => key === name,
  );
  const [first] = found;
  if (!first) return null;
  return found.length > 1 ? undefined : (first[2] ?? first[3] ?? '');
}

/** The insides of all tags of one local name, in order. */
export const listTags = (xml: string, name: string): string[] =>
  Array.from(
    xml.matchAll(new RegExp(`<(?:[^\\s<>/:!?]+:)?${name}(?=[\\s/>])([^>]*)>`, 'g')),
    ([, inside]) => inside ?? '',
  );
