import { describe, expect, it } from 'vitest';
import { demoTemplates } from '@/seeders/demo-templates';
import { shelfTemplates } from '@/seeders/demo-shelf';
import { check, compute } from '@/lib/checker';
import { answerKinds } from '@/lib/templates/content';
import { draftOfContent } from '@/lib/templates/draft';
import { drawValues } from '@/lib/templates/draw-values';
import { findProblems } from '@/lib/templates/find-problems';
import { referenceOf } from '@/lib/templates/reference-of';
import publishedRows from './published-references.json' with { type: 'json' };

/** A part of a template for drawn values, what it must be, and where that is published. */
type Published = { template: string; part: string; values: Record<string, string>; answer: string; source: string };

const published = publishedRows as unknown as Published[];
const shelf = shelfTemplates();
const all = [...demoTemplates.map(({ content }) => content), ...shelf.map(({ content }) => content)];

describe('the worked questions of the shelf', () => {
  it('are twenty, with titles of their own, and ask for every kind of answer', () => {
    expect(all).toHaveLength(20);
    expect(new Set(all.map(({ title }) => title)).size).toBe(20);
    expect(new Set(all.flatMap(({ parts }) => parts.map(({ kind }) => kind)))).toEqual(new Set(answerKinds));
  });

  it.each(all.map((content) => [content.title, content] as const))('%s has no mistake', (_title, content) => {
    expect(findProblems(draftOfContent(content)).problems).toEqual([]);
  });

  it.each(all.map((content) => [content.title, content] as const))(
    '%s has a reference in every draw',
    (_title, content) => {
      for (let seed = 0; seed < 25; seed += 1) {
        const drawn = drawValues(content, `shelf ${seed}`);
        if (!drawn.ok) throw new Error(drawn.error);
        for (const part of content.parts) {
          const reference = referenceOf(content, part.key, drawn.values);
          if (!reference.ok) throw new Error(reference.error);
          if (part.kind === 'choice') continue;
          expect(compute({ ...reference.check }), `${part.key} of ${JSON.stringify(drawn.values)}`).toMatchObject({
            ok: true,
          });
        }
      }
    },
  );
});

describe('published values', () => {
  it.each(published.map((row) => [`${row.template} ${row.part}: ${row.source}`, row] as const))('%s', (_name, row) => {
    const content = shelf.find(({ id }) => id === row.template)?.content;
    if (!content) throw new Error(`There is no template ${row.template}.`);
    const reference = referenceOf(content, row.part, row.values);
    if (!reference.ok) throw new Error(reference.error);
    expect(check({ id: 'published', ...reference.check, answer: row.answer })).toMatchObject({ verdict: 'agrees' });
  });
});
