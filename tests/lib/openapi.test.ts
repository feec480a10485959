import { describe, expect, it } from 'vitest';
import { check } from '@/lib/checker/index';
import {
  checkErrorSchema,
  checkRequestSchema,
  checkResponseSchema,
  checksBodySchema,
  MOST_CHECKS,
} from '@/lib/http-api/check-schemas';
import { exampleChecks, openApiDocument } from '@/lib/http-api/openapi';

const document = openApiDocument();
const schemas = document.components.schemas;

/** Every `$ref` anywhere in the document. */
function refsIn(value: unknown): string[] {
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, inner]) =>
    key === '$ref' && typeof inner === 'string' ? [inner] : refsIn(inner),
  );
}

describe('the description of the HTTP interface', () => {
  it('is OpenAPI 3.1 and refers to nothing that is not in it', () => {
    expect(document.openapi).toMatch(/^3\.1\./);
    const names = Object.keys(schemas).map((name) => `#/components/schemas/${name}`);
    const refs = refsIn(document);
    expect(refs.length).toBeGreaterThan(5);
    expect(refs.filter((ref) => !names.includes(ref))).toEqual([]);
  });

  it('asks for what the handler takes: the same fields, and no others', () => {
    expect(Object.keys(schemas.Check['properties'] ?? {}).sort()).toEqual(Object.keys(checkRequestSchema.shape).sort());
    expect(schemas.Check['required']).toEqual(['id', 'kind', 'reference', 'answer']);
    expect(schemas.Check['additionalProperties']).toBe(false);
    expect(schemas.Checks.properties.checks.maxItems).toBe(MOST_CHECKS);
    const tooMany = { checks: Array.from({ length: MOST_CHECKS + 1 }, () => ({})) };
    expect(checksBodySchema.safeParse(tooMany).success).toBe(false);
    expect(checksBodySchema.safeParse({ checks: [] }).success).toBe(false);
    expect(checksBodySchema.safeParse({ checks: [{}], more: 1 }).success).toBe(false);
  });

  it('has an example that the handler takes and the checker answers as described', () => {
    expect(checksBodySchema.safeParse(exampleChecks).success).toBe(true);
    const verdicts = exampleChecks.checks.map((one) => {
      const request = checkRequestSchema.parse(one);
      return checkResponseSchema.parse(check(request)).verdict;
    });
    expect(verdicts).toEqual(['agrees', 'differs']);
  });

  it('describes every field that a result has', () => {
    const outcome = check(exampleChecks.checks[0]);
    expect(Object.keys(outcome).sort()).toEqual(Object.keys(schemas.Result['properties'] ?? {}).sort());
    expect(Object.keys(checkErrorSchema.shape).sort()).toEqual(
      Object.keys(schemas.CheckError['properties'] ?? {}).sort(),
    );
  });
});

describe('a check as the handler takes it', () => {
  const request = { id: 'a', kind: 'scalar', reference: '1', answer: '1' };
  it.each([
    ['an unknown option', { ...request, options: { upToMood: true } }],
    ['an unknown field', { ...request, hint: 'x' }],
    ['two tolerances', { ...request, options: { tolerance: { relative: 1, absolute: 1 } } }],
    ['an unknown domain', { ...request, symbols: { x: 'quaternion' } }],
    ['a long id', { ...request, id: 'a'.repeat(201) }],
    ['an unknown kind', { ...request, kind: 'tensor' }],
  ])('is refused for %s, by the schema and by the checker alike', (_what, bad) => {
    expect(checkRequestSchema.safeParse(bad).success).toBe(false);
    expect(check(bad)).toHaveProperty('error');
  });
});
