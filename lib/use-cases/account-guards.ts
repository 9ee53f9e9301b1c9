import { findPasswordFault } from '@/lib/domain/access/password-policy';
import { AppError } from '@/lib/platform/errors';

/** Ends the use case, with the sentence beside the field, unless this may be the password of this address. */
export function assertGoodPassword(password: string, email: string, field = 'password'): void {
  const fault = findPasswordFault(password, email);
  if (fault !== null) throw new AppError('invalid', fault, { fields: { [field]: fault } });
}

/** The one answer for links that are unknown, used or past their date. */
export const spentLink = (again: string): AppError =>
  new AppError('conflict', `This link has been used or is too old. ${again}`);
