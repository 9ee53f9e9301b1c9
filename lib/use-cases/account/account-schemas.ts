import { z } from 'zod';
import { passwordLimits } from '@/lib/domain/access/password-policy';

export const emailSchema = z
  .string()
  .trim()
  .toLowerCase()
  .max(254, 'An e-mail address has at most 254 characters.')
  .pipe(z.email('Write an e-mail address, such as name@club.example.'));

export const nameSchema = z
  .string()
  .trim()
  .min(1, 'Write your name as your league knows you.')
  .max(120, 'Write at most 120 characters.')
  .regex(/^\P{Cc}*$/u, 'Write the name on one line.');

/** Only its bounds; whether it is a good one is said by findPasswordFault, which needs the address too. */
export const passwordSchema = z.string().max(passwordLimits.most * 2, 'Write a shorter password.');

/** A link's secret: 32 bytes as newToken writes them. Anything else opens nothing. */
export const tokenSchema = z.string().max(200);

export const askForAccountSchema = z.object({ name: nameSchema, email: emailSchema });
export const openAccountSchema = z.object({ token: tokenSchema, password: passwordSchema });
export const askForResetSchema = z.object({ email: emailSchema });
export const setNewPasswordSchema = z.object({ token: tokenSchema, password: passwordSchema });
export const changePasswordSchema = z.object({
  oldPassword: z.string().min(1, 'Write the password you have now.').max(200),
  newPassword: passwordSchema,
});
export const changeNameSchema = z.object({ name: nameSchema });
