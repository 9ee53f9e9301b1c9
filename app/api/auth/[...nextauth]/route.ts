import NextAuth from 'next-auth';
import type { NextRequest } from 'next/server';
import { getAuthOptions } from '@/lib/web/auth-options';

// next-auth brings its own parsing, CSRF token and answers; the wrapper for our own routes does not apply.
type Segment = { params: Promise<{ nextauth: string[] }> };
const handle = (request: NextRequest, segment: Segment): Promise<Response> =>
  NextAuth(request, segment, getAuthOptions());

export { handle as GET, handle as POST };
