import 'server-only';
import type { NextAuthOptions } from 'next-auth';
import CredentialsProvider from 'next-auth/providers/credentials';
import { z } from 'zod';
import { readClock } from '@/lib/platform/clock';
import { getEnv } from '@/lib/platform/env';
import { AppError } from '@/lib/platform/errors';
import { getLog } from '@/lib/platform/log';
import { newId } from '@/lib/platform/ids';
import { signIn } from '@/lib/use-cases/account/sign-in';
import { paths } from './paths';

declare module 'next-auth' {
  interface Session {
    userId: string;
    sessionVersion: number;
  }
  interface User {
    sessionVersion: number;
  }
}
declare module 'next-auth/jwt' {
  interface JWT {
    userId?: string;
    sessionVersion?: number;
  }
}

const credentialsSchema = z.object({ email: z.email().max(254), password: z.string().min(1).max(200) });

let options: NextAuthOptions | undefined;

/** How people sign in: e-mail and password, a signed session cookie of eight hours that names the session version. */
export function getAuthOptions(): NextAuthOptions {
  options ??= {
    secret: getEnv().RAGLAN_SECRET,
    session: { strategy: 'jwt', maxAge: 8 * 3600 },
    pages: { signIn: paths.signIn(), error: paths.signIn() },
    providers: [
      CredentialsProvider({
        name: 'Password',
        credentials: { email: { type: 'email' }, password: { type: 'password' } },
        async authorize(raw, request) {
          const parsed = credentialsSchema.safeParse(raw);
          if (!parsed.success) return null;
          const sent: Record<string, unknown> = request.headers ?? {};
          const address = sent['x-raglan-address'];
          const sentId = sent['x-request-id'];
          const requestId = typeof sentId === 'string' ? sentId : newId();
          try {
            const person = await signIn(
              { now: readClock(), requestId, newId },
              { ...parsed.data, address: typeof address === 'string' ? address : 'unknown' },
            );
            return (
              person && {
                id: person.userId,
                email: person.email,
                name: person.name,
                sessionVersion: person.sessionVersion,
              }
            );
          } catch (error) {
            // next-auth hands the message to the sign-in page as it stands; only sentences meant for people pass.
            if (error instanceof AppError) throw new Error(error.message, { cause: error });
            getLog().error({ err: error, requestId }, 'sign-in failed');
            throw new Error(
              `Signing in failed on our side. Try again; if it stays, quote ${requestId.slice(0, 8)}.`,
            );
          }
        },
      }),
    ],
    callbacks: {
      jwt({ token, user }) {
        if (user) {
          token.userId = user.id;
          token.sessionVersion = user.sessionVersion;
        }
        return token;
      },
      session({ session, token }) {
        return { ...session, userId: token.userId ?? '', sessionVersion: token.sessionVersion ?? 0 };
      },
    },
  };
  return options;
}
