import { createHash, randomBytes, randomUUID } from 'node:crypto';

/** A new random id (UUID version 4). */
export const newId = (): string => randomUUID();

/** A new secret for a link: 32 random bytes as 43 characters that need no escaping in a URL. */
export const newToken = (): string => randomBytes(32).toString('base64url');

/** What is stored of a link's secret: its SHA-256 in hexadecimal, so that a leaked table opens nothing. */
export const hashToken = (token: string): string => createHash('sha256').update(token).digest('hex');

/** SHA-256 of bytes or text in hexadecimal. */
export const sha256 = (data: string | Uint8Array): string => createHash('sha256').update(data).digest('hex');

/** SHA-256 of text as its 32 bytes. */
export const sha256Bytes = (data: string): Uint8Array => createHash('sha256').update(data).digest();
