import { openApiDocument } from '@/lib/http-api/openapi';

/** The description of the HTTP interface, for everybody: it tells how to ask, and nothing about anyone. */
export function GET(): Response {
  return Response.json(openApiDocument());
}
