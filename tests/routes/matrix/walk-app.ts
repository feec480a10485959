import { readFileSync, readdirSync } from 'node:fs';
import path from 'node:path';

/** Something that a browser can reach: a page, a method of a route, or an exported server action. */
export type Door = { kind: 'page' | 'route' | 'action'; file: string; key: string };

const root = path.resolve(import.meta.dirname, '../../../app');
const methods = 'GET|HEAD|POST|PUT|PATCH|DELETE|OPTIONS';
const useServer = /^\s*['"]use server['"]/m;

/** Every door under app/, found in the sources themselves. */
export function walkApp(): Door[] {
  return sourceFiles().flatMap(({ file, text }): Door[] => {
    const name = path.basename(file);
    if (name === 'page.tsx') return [{ kind: 'page', file, key: file }];
    if (name === 'route.ts')
      return exportedMethods(text).map((method) => ({ kind: 'route', file, key: `${file}#${method}` }));
    if (!startsWithUseServer(text)) return [];
    return exportedFunctions(text).map((action) => ({ kind: 'action', file, key: `${file}#${action}` }));
  });
}

/** Files in which a server action stands inside something else, where this walk would not see it. There must be none. */
export function hiddenActions(): string[] {
  return sourceFiles()
    .filter(({ text }) => useServer.test(text) && !startsWithUseServer(text))
    .map(({ file }) => file);
}

/** The source of a file under app/. */
export function sourceOf(file: string): string {
  return readFileSync(path.join(root, file), 'utf8');
}

function sourceFiles(): { file: string; text: string }[] {
  return readdirSync(root, { recursive: true, encoding: 'utf8' })
    .filter((file) => /\.tsx?$/.test(file))
    .map((file) => ({ file: file.split(path.sep).join('/'), text: sourceOf(file) }))
    .sort((a, b) => a.file.localeCompare(b.file));
}

function startsWithUseServer(text: string): boolean {
  return /^\s*(?:\/\*[\s\S]*?\*\/\s*|\/\/.*\n\s*)*['"]use server['"]/.test(text);
}

function exportedMethods(text: string): string[] {
  const declared = text.matchAll(
    new RegExp(`^export\\s+(?:async\\s+)?(?:function|const|let)\\s+(${methods})\\b`, 'gm'),
  );
  const renamed = [...text.matchAll(/^export\s*\{([^}]*)\}/gm)].flatMap((match) => [
    ...(match[1] ?? '').matchAll(new RegExp(`(?:^|[\\s,])(?:\\w+\\s+as\\s+)?(${methods})\\s*(?=,|$)`, 'g')),
  ]);
  return [...declared, ...renamed].map((match) => match[1] ?? '');
}

/** What a file of actions exports at run time; an export in any other form than these is an error, so none is missed. */
function exportedFunctions(text: string): string[] {
  const lines = text.match(/^export\b.*$/gm) ?? [];
  return lines
    .filter((line) => !/^export\s+(?:type|interface)\b/.test(line))
    .map((line) => {
      const name = /^export\s+(?:async\s+function|const)\s+(\w+)/.exec(line)?.[1];
      if (name === undefined) throw new Error(`An action is exported in a form that the walk does not know: ${line}`);
      return name;
    });
}
