import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { z } from 'zod';
import { templateContentSchema } from '@/lib/templates/content';

const shelfTemplateSchema = z.object({
  id: z.string().regex(/^[a-z0-9-]+$/),
  topics: z.array(z.string().min(1).max(60)),
  content: templateContentSchema,
});

/** A worked question of the shelf: what it says, and the words the shelf is searched by. */
export type ShelfTemplate = z.output<typeof shelfTemplateSchema>;

const folder = path.join(import.meta.dirname, 'shelf');

/** The worked questions that come with the demo beside those of its sets, one file each, in the order of their names. */
export function shelfTemplates(): ShelfTemplate[] {
  return readdirSync(folder)
    .filter((name) => name.endsWith('.json'))
    .sort()
    .map((name) => shelfTemplateSchema.parse(JSON.parse(readFileSync(path.join(folder, name), 'utf8'))));
}
