import 'server-only';
import type { NextRequest } from 'next/server';
import { z } from 'zod';
import { AppError } from '@/lib/platform/errors';
import { getLog } from '@/lib/platform/log';
import { checkPublicBudget } from '@/lib/use-cases/account/check-public-budget';
import type { ActorContext, PersonContext, RequestContext } from '@/lib/use-cases/context';
import { describeIssues } from './issues';
import { makeFaultProblem, makeProblem } from './problem';
import { readClientAddress, readRequestContext } from './request';
import { getLeagueContext, getPersonContext } from './session';

type Access = 'public' | 'person' | 'league';
type ContextOf<A extends Access> = A extends 'league'
  ? ActorContext
  : A extends 'person'
    ? PersonContext
    : RequestContext;

type RouteDefinition<A extends Access, P extends z.ZodType, Q extends z.ZodType, B extends z.ZodType> = {
  /** `public` takes 60 requests a minute per address; `league` reads the league's slug from the `league` parameter. */
  access: A;
  params?: P;
  query?: Q;
  body?: B;
  /** Largest body in bytes; 1 MB unless said otherwise. */
  maxBytes?: number;
  run: (
    ctx: ContextOf<A>,
    input: { params: z.output<P>; query: z.output<Q>; body: z.output<B>; request: NextRequest },
  ) => Promise<Response>;
};

const anything = z.unknown();

/** The one shape of a route handler: find who asks, parse, call, present; errors leave as problem+json (RFC 9457). */
export function defineRoute<
  A extends Access,
  P extends z.ZodType = z.ZodUnknown,
  Q extends z.ZodType = z.ZodUnknown,
  B extends z.ZodType = z.ZodUnknown,
>(route: RouteDefinition<A, P, Q, B>) {
  return async (
    request: NextRequest,
    segment: { params: Promise<Record<string, string | string[]>> },
  ): Promise<Response> => {
    const base = await readRequestContext();
    try {
      const rawParams = await segment.params;
      const ctx = (await findContext(route.access, base, request, rawParams)) as ContextOf<A>;
      const params = parse<P>(route.params, rawParams);
      const query = parse<Q>(route.query, Object.fromEntries(request.nextUrl.searchParams));
      const body = parse<B>(
        route.body,
        route.body ? await readJson(request, route.maxBytes ?? 1_000_000) : undefined,
      );
      return await route.run(ctx, { params, query, body, request });
    } catch (error) {
      if (error instanceof AppError) return makeProblem(error, base.requestId);
      // The caller has hung up: there is nobody to answer, and nothing of ours that failed.
      if (request.signal.aborted) return new Response(null, { status: 499 });
      getLog().error({ err: error, requestId: base.requestId }, 'route failed');
      return makeFaultProblem(base.requestId);
    }
  };
}

async function findContext(
  access: Access,
  base: RequestContext,
  request: NextRequest,
  params: Record<string, string | string[]>,
): Promise<RequestContext> {
  if (access === 'league') return getLeagueContext(String(params['league']));
  if (access === 'person') return (await getPersonContext()).ctx;
  await checkPublicBudget(readClientAddress(request.headers));
  return base;
}

function parse<S extends z.ZodType>(schema: S | undefined, value: unknown): z.output<S> {
  const result = (schema ?? anything).safeParse(value);
  if (!result.success) throw describeIssues(result.error);
  return result.data as z.output<S>;
}

/** Reads a JSON body but never more than `maxBytes`, whatever the request says of its own length. */
async function readJson(request: NextRequest, maxBytes: number): Promise<unknown> {
  const type = request.headers.get('content-type') ?? '';
  if (!/^application\/(?:[\w.+-]+\+)?json\b/i.test(type)) {
    throw new AppError('unsupported', 'Send the body as JSON, with Content-Type: application/json.');
  }
  const tooLarge = () =>
    new AppError(
      'too-large',
      `The body is over ${Math.floor(maxBytes / 1000).toLocaleString('en')} KB. Send fewer players at a time.`,
    );
  if (Number(request.headers.get('content-length') ?? 0) > maxBytes) throw tooLarge();
  const chunks: Uint8Array[] = [];
  let total = 0;
  for await (const chunk of request.body ?? []) {
    total += chunk.byteLength;
    if (total > maxBytes) throw tooLarge();
    chunks.push(chunk);
  }
  const text = Buffer.concat(chunks).toString('utf8');
  try {
    return JSON.parse(text);
  } catch (error) {
    throw new AppError(
      'invalid',
      `The body is not JSON: ${error instanceof Error ? error.message : 'it could not be read'}.`,
    );
  }
}
