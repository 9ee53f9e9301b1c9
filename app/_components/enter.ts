'use client';

import { signIn } from 'next-auth/react';

/**
 * Signs in and answers the sentence to show, or null when it worked. An unknown address and a wrong password get the
 * same one.
 */
export async function enter(email: string, password: string): Promise<string | null> {
  try {
    const answer = await signIn('credentials', { redirect: false, email: email.trim(), password });
    if (answer?.ok === true && !answer.error) return null;
    if (answer?.error && answer.error !== 'CredentialsSignin') return answer.error;
    return 'This address and this password do not belong together. Check both, or set a new password.';
  } catch {
    return 'That did not reach the server. What you typed is still here: check the connection and try again.';
  }
}
