import 'server-only';
import { headers } from 'next/headers';
import { readClock } from '@/lib/platform/clock';
import { newId } from '@/lib/platform/ids';
import type { RequestContext } from '@/lib/use-cases/context';

/** The id proxy.ts gave this request, the time it was read, and where new ids come from. */
export async function readRequestContext(): Promise<RequestContext> {
  const requestId = (await headers()).get('x-request-id') ?? newId();
  return { now: readClock(), requestId, newId };
}

/**
 * The network address of the caller as the web server saw it (scripts/web.mjs writes the header and drops any that
 * a client sent); `unknown` when the page was rendered without a connection.
 */
export const readClientAddress = (list: Headers): string => list.get('x-raglan-address') ?? 'unknown';
