import { hash, verify } from '@node-rs/argon2';

// Argon2id with 19 MiB, 2 passes, 1 lane: the second parameter set of the OWASP Password Storage Cheat Sheet.
const options = { memoryCost: 19456, timeCost: 2, parallelism: 1 } as const;

// A hash of nothing anybody can type, so that an unknown address costs the same time as a wrong password.
let decoy: Promise<string> | undefined;

/** One keyboard writes é as one character, another as two; both must open the account (NFKC; NIST SP 800-63B 5.1.1.2, from memory). */
const normalise = (password: string): string => password.normalize('NFKC');

/** Hashes a password with argon2id. */
export const hashPassword = (password: string): Promise<string> => hash(normalise(password), options);

/** Whether the password matches; with no hash (unknown account) does the same work and answers false. */
export async function verifyPassword(passwordHash: string | undefined, password: string): Promise<boolean> {
  if (passwordHash !== undefined) return verify(passwordHash, normalise(password)).catch(() => false);
  decoy ??= hashPassword('no account has this password \u0000');
  await verify(await decoy, password);
  return false;
}
