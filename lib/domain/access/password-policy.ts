/**
 * How long a password is, counted in characters a person would count. NIST SP 800-63B (section 5.1.1.2, from memory)
 * asks for at least 8, for room for 64 and more, and for no rules on which characters; ten is our own figure.
 */
export const passwordLimits = { least: 10, most: 200 } as const;

/** Long enough to pass by length and still the first thing anybody would try. Written by us, common practice. */
const common = [
  'password',
  'passwort',
  'passw0rd',
  'p4ssword',
  'p@ssword',
  'p@ssw0rd',
  'qwerty',
  'qwertz',
  'azerty',
  'qwertyuiop',
  'asdfghjkl',
  'zxcvbnm',
  '1q2w3e4r5t',
  '1qaz2wsx3edc',
  'abcdefghij',
  'letmein',
  'welcome',
  'iloveyou',
  'trustno1',
  'administrator',
  'admin',
  'changeme',
  'default',
  'secret',
  'football',
  'basketball',
  'baseball',
  'volleyball',
  'superman',
  'princess',
  'sunshine',
  'monkey',
  'dragon',
  'raglan',
];

const rows = [
  '0123456789',
  '1234567890',
  '9876543210',
  '0987654321',
  'abcdefghijklmnopqrstuvwxyz',
  'qwertyuiop',
  'asdfghjkl',
  'zxcvbnm',
];

/**
 * Why this can't be a password, as a sentence, or null when it can. Refused are: under 10 or over 200 characters, the
 * person's own address (or what stands before its @), one character or short piece over and over, a run along the
 * alphabet or keyboard, and a common word padded with digits and marks. There are no rules on kinds of characters.
 */
export function findPasswordFault(password: string, email: string): string | null {
  const length = [...password].length;
  if (length < passwordLimits.least) {
    return `Write at least ${passwordLimits.least} characters; this has ${length}. A few words in a row do well.`;
  }
  if (password.length > passwordLimits.most) {
    return `Write at most ${passwordLimits.most} characters; this has ${password.length}.`;
  }
  const plain = password.trim().toLowerCase();
  const [local = ''] = email.toLowerCase().split('@');
  if (plain === email.toLowerCase() || (local !== '' && isPadded(plain, local))) {
    return 'Your own address is the first thing anybody would try. Write something else.';
  }
  if (isRepeated(plain) || isRun(plain)) {
    return 'That is one piece over and over, or keys in a row. Write a few words that only you would put together.';
  }
  if (common.some((word) => isPadded(plain, word) || isPadded(plain, word + word))) {
    return 'That is among the passwords people try first. Write a few words that only you would put together.';
  }
  return null;
}

/** The word with nothing but digits and marks before or after it. */
function isPadded(password: string, word: string): boolean {
  const at = password.indexOf(word);
  if (at === -1) return false;
  return !/\p{L}/u.test(password.slice(0, at) + password.slice(at + word.length));
}

/** One piece of up to four characters from end to end: aaaaaaaaaa, 1212121212, abcabcabcabc. */
function isRepeated(password: string): boolean {
  const characters = [...password];
  return [1, 2, 3, 4].some((size) =>
    characters.every((character, index) => character === characters[index % size]),
  );
}

/** Neighbours on the alphabet, the digits or a row of keys, from end to end, starting over when the row ends. */
function isRun(password: string): boolean {
  return rows.some((row) => {
    const endless = row.repeat(Math.ceil(password.length / row.length) + 1);
    return endless.includes(password);
  });
}
