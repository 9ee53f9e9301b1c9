/** Why a file or a paste as a whole could not be taken in. Codes are stable; the sentence beside them is for a person. */
export type RefusalCode =
  | 'empty'
  | 'too-large'
  | 'too-many-rows'
  | 'too-many-columns'
  | 'not-text'
  | 'wrong-type'
  | 'password-protected'
  | 'old-workbook'
  | 'macro-workbook'
  | 'unpacks-too-large'
  | 'damaged';

/** A refusal of the whole file: `message` says what is wrong and what to do next, in whole sentences. */
export type Refusal = { ok: false; code: RefusalCode; message: string };

/** Makes a refusal from its code and its sentence. */
export const refuse = (code: RefusalCode, message: string): Refusal => ({ ok: false, code, message });
