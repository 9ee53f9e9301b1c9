/**
 * The characters of a bag code: no 0, O, 1, I, L or U, no pair that is misread on a creased bag (5 and S, 2 and Z,
 * 8 and B, 6 and G, U and V), and no A or E, so that a code spells nothing. Their number, 23, is a prime: the check
 * character depends on it.
 */
export const bagCodeAlphabet = '23456789CDFHJKMNPQRTWXY';

const base = bagCodeAlphabet.length;
const bodyLength = 7;
const codeLength = bodyLength + 1;
const shape = new RegExp(`^[${bagCodeAlphabet}]{4}-[${bagCodeAlphabet}]{4}$`);

/**
 * The check character of seven characters. Our own scheme, in the manner of the pure systems of ISO/IEC 7064: the sum
 * of character values times powers of 2, counted from the right, is 0 modulo 23. The first eight powers of 2 are all
 * different modulo 23 and none is 0, so any one wrong character and any two swapped characters change the sum.
 */
function findCheckCharacter(body: readonly number[]): number {
  const sum = body.reduce((carry, value) => (carry + value) * 2, 0);
  return (base - (sum % base)) % base;
}

const write = (values: readonly number[]): string => {
  const text = values.map((value) => bagCodeAlphabet.charAt(value)).join('');
  return `${text.slice(0, 4)}-${text.slice(4)}`;
};

/**
 * The bag code of a hash, such as `7F3K-92QD`: seven characters from its first eight bytes and a check character.
 * Throws a RangeError for fewer than eight bytes. There are 23^7 codes (about 3.4 thousand million).
 */
export function makeBagCode(seedBytes: Uint8Array): string {
  if (seedBytes.length < 8) throw new RangeError('A bag code needs eight bytes of a hash or more.');
  let rest = seedBytes.slice(0, 8).reduce((value, byte) => (value << 8n) | BigInt(byte), 0n);
  const body = Array.from({ length: bodyLength }, () => {
    const value = Number(rest % BigInt(base));
    rest /= BigInt(base);
    return value;
  });
  return write([...body, findCheckCharacter(body)]);
}

/** Whether a text is a bag code as printed: capitals, the hyphen in its place, and a check character that agrees. */
export function isBagCode(text: string): boolean {
  if (!shape.test(text)) return false;
  const values = Array.from(text.replace('-', ''), (character) => bagCodeAlphabet.indexOf(character));
  return (
    values.length === codeLength && findCheckCharacter(values.slice(0, bodyLength)) === values[bodyLength]
  );
}

/** How often a clash is resolved before the hash is taken to be broken. */
const mostAttempts = 1000;

/**
 * A bag code for each id, no two alike, whatever the order of the ids. `hashOf` gives eight bytes or more for a text
 * and is asked for the id itself, then, when another id got that code before, for the id with `#2`, `#3` and so on.
 * Throws when the hash keeps giving the same code.
 */
export function assignBagCodes(
  ids: readonly string[],
  hashOf: (text: string) => Uint8Array,
): Map<string, string> {
  const taken = new Set<string>();
  const codeOf = new Map<string, string>();
  // In the order of the ids, not of the roster, so that moving a player in the list changes no code.
  for (const id of [...new Set(ids)].sort()) {
    let attempt = 1;
    let code = makeBagCode(hashOf(id));
    while (taken.has(code)) {
      attempt += 1;
      if (attempt > mostAttempts) throw new Error('The hash gives the same bag code over and over.');
      code = makeBagCode(hashOf(`${id}#${attempt}`));
    }
    taken.add(code);
    codeOf.set(id, code);
  }
  return codeOf;
}
