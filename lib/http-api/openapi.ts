import { z } from 'zod';
import { checkErrorSchema, checkRequestSchema, checkResponseSchema, MOST_CHECKS, problemSchema } from './check-schemas';

const schema = (source: z.ZodType, io: 'input' | 'output') => {
  const { $schema: _dialect, ...rest } = z.toJSONSchema(source, { io });
  return rest;
};

const ref = (name: string) => ({ $ref: `#/components/schemas/${name}` });
const problem = (description: string) => ({
  description,
  content: { 'application/problem+json': { schema: ref('Problem') } },
});

/** The example of the document, tried on the checker in the tests. */
export const exampleChecks = {
  checks: [
    { id: 'h1', kind: 'operator', reference: 'i*hbar*S_z', answer: '[S_x, S_y]' },
    { id: 'h2', kind: 'scalar', reference: 'hbar omega/2', answer: 'ħω', symbols: { omega: 'positive' } },
  ],
};

/** The description of the HTTP interface (OpenAPI 3.1), made from the very schemas that the handlers use. */
export function openApiDocument() {
  return {
    openapi: '3.1.0',
    info: {
      title: 'Halfmark',
      version: '1',
      description:
        'Checks answers against references. For the staff of a course and for programs with a token of theirs.',
    },
    servers: [{ url: '/' }],
    paths: {
      '/api/v1/checks': {
        post: {
          operationId: 'checkAnswers',
          summary: 'Check answers against references',
          description:
            `Takes up to ${MOST_CHECKS} checks in at most 1 MB and answers each in order. A check that cannot be made ` +
            'has an error in its place; the others are made. With a session cookie the Origin header must be this site’s.',
          security: [{ token: [] }, { session: [] }],
          requestBody: {
            required: true,
            content: { 'application/json': { schema: ref('Checks'), example: exampleChecks } },
          },
          responses: {
            '200': {
              description: 'One result a check, in order.',
              content: { 'application/json': { schema: ref('Results') } },
            },
            '401': problem('Nobody is signed in, or the token is not good.'),
            '403': problem('A student, a token that was not made for this, or a request from another site.'),
            '413': problem('The body is larger than 1 MB, or holds too many checks.'),
            '422': problem('The body is not JSON, or not what is asked for.'),
            '429': {
              ...problem('Too many checks in a quarter of an hour.'),
              headers: { 'Retry-After': { description: 'Seconds to wait.', schema: { type: 'integer' } } },
            },
          },
        },
      },
    },
    components: {
      securitySchemes: {
        token: { type: 'http', scheme: 'bearer', description: 'An API token made for checking answers.' },
        session: { type: 'apiKey', in: 'cookie', name: 'halfmark.session' },
      },
      schemas: {
        Checks: {
          type: 'object',
          required: ['checks'],
          additionalProperties: false,
          properties: { checks: { type: 'array', minItems: 1, maxItems: MOST_CHECKS, items: ref('Check') } },
        },
        Check: schema(checkRequestSchema, 'input'),
        Results: {
          type: 'object',
          required: ['results'],
          properties: { results: { type: 'array', items: { anyOf: [ref('Result'), ref('CheckError')] } } },
        },
        Result: schema(checkResponseSchema, 'output'),
        CheckError: schema(checkErrorSchema, 'output'),
        Problem: schema(problemSchema, 'output'),
      },
    },
  };
}
