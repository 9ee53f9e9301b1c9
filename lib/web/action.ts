import 'server-only';
import { unstable_rethrow } from 'next/navigation';
import type { z } from 'zod';
import { AppError } from '@/lib/platform/errors';
import { getLog } from '@/lib/platform/log';
import type { ActorContext, PersonContext, RequestContext } from '@/lib/use-cases/context';
import type { ActionResult } from './action-result';
import { readRequestContext } from './request';
import { getLeagueContext, getPersonContext } from './session';
import { describeIssues } from './issues';

type Run<C, S extends z.ZodType, T> = (ctx: C, input: z.output<S>) => Promise<T>;

/** An action of one league: `(leagueSlug, input)`; parses, finds the actor, calls, and turns errors into words. */
export function leagueAction<S extends z.ZodType, T>(schema: S, run: Run<ActorContext, S, T>) {
  return async (leagueSlug: string, input: z.input<S>): Promise<ActionResult<T>> =>
    answer(schema, input, () => getLeagueContext(String(leagueSlug)), run);
}

/** An action of a signed-in person outside any league: `(input)`. */
export function personAction<S extends z.ZodType, T>(schema: S, run: Run<PersonContext, S, T>) {
  return async (input: z.input<S>): Promise<ActionResult<T>> =>
    answer(schema, input, async () => (await getPersonContext()).ctx, run);
}

/** An action anybody may call, such as asking for a new password: `(input)`. */
export function publicAction<S extends z.ZodType, T>(schema: S, run: Run<RequestContext, S, T>) {
  return async (input: z.input<S>): Promise<ActionResult<T>> =>
    answer(schema, input, readRequestContext, run);
}

async function answer<C, S extends z.ZodType, T>(
  schema: S,
  input: unknown,
  findContext: () => Promise<C>,
  run: Run<C, S, T>,
): Promise<ActionResult<T>> {
  const { requestId } = await readRequestContext();
  try {
    // Who is asking comes before what: a stranger learns nothing about the shape of the input.
    const ctx = await findContext();
    const parsed = schema.safeParse(input);
    if (!parsed.success) throw describeIssues(parsed.error);
    return { ok: true, data: await run(ctx, parsed.data) };
  } catch (error) {
    unstable_rethrow(error);
    if (error instanceof AppError) {
      return {
        ok: false,
        error: { code: error.code, message: error.message, fields: error.fields, requestId },
      };
    }
    getLog().error({ err: error, requestId }, 'action failed');
    const message = `Something failed on our side. Nothing was changed. Try again; if it stays, quote ${requestId.slice(0, 8)}.`;
    return { ok: false, error: { code: 'failed', message, fields: {}, requestId } };
  }
}
