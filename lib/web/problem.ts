import { errorStatus, type AppError } from '@/lib/platform/errors';

/** An error as RFC 9457 problem+json: type, title, status, detail, the request's id, and one entry per wrong field. */
export function makeProblem(error: AppError, requestId: string): Response {
  const status = errorStatus[error.code];
  const body = {
    type: `urn:raglan:problem:${error.code}`,
    title: error.code.replace('-', ' '),
    status,
    detail: error.message,
    instance: `urn:uuid:${requestId}`,
    errors: Object.entries(error.fields).map(([path, detail]) => ({ path, detail })),
  };
  const headers = new Headers({
    'content-type': 'application/problem+json',
    'cache-control': 'no-store',
    'x-request-id': requestId,
  });
  if (error.retryAfterSeconds !== undefined) headers.set('retry-after', String(error.retryAfterSeconds));
  return new Response(JSON.stringify(body), { status, headers });
}

/** The answer for a bug: status 500, the request's id, and nothing of what failed. */
export function makeFaultProblem(requestId: string): Response {
  const body = {
    type: 'urn:raglan:problem:failed',
    title: 'failed',
    status: 500,
    detail: 'Something failed on our side. Nothing was changed. Try again later.',
    instance: `urn:uuid:${requestId}`,
    errors: [],
  };
  return new Response(JSON.stringify(body), {
    status: 500,
    headers: {
      'content-type': 'application/problem+json',
      'cache-control': 'no-store',
      'x-request-id': requestId,
    },
  });
}
