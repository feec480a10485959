import { errorTable, type HalfmarkError } from '@/lib/errors';

/** A failure as `application/problem+json` (RFC 9457), with our code, the request's id and the faults by field. */
export function problemResponse(error: HalfmarkError, requestId: string): Response {
  const problem = {
    type: 'about:blank',
    title: errorTable[error.code].message,
    status: error.status,
    detail: error.message,
    code: error.code,
    requestId,
    ...(Object.keys(error.fields).length > 0 ? { fields: error.fields } : {}),
  };
  return new Response(JSON.stringify(problem), {
    status: error.status,
    headers: {
      'content-type': 'application/problem+json',
      'cache-control': 'no-store',
      'x-request-id': requestId,
    },
  });
}
