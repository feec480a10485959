/**
 * What a student's browser could be sent, by the imports of the sources: from every client component of the students'
 * pages and of trying a reading, through all it imports. tests/journeys/student-bundle.test.ts looks at the build.
 */
import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import path from 'node:path';
import ts from 'typescript';
import { describe, expect, it } from 'vitest';

const pages = ['app/(student)', 'app/(tools)/reading'];

/** Files and packages reached from some files, by what is imported when the code runs. Server actions are not entered. */
function reachedFrom(entries: readonly string[]): { files: Set<string>; packages: Set<string> } {
  const files = new Set<string>();
  const packages = new Set<string>();
  const waiting = [...entries];
  for (let file = waiting.pop(); file !== undefined; file = waiting.pop()) {
    if (files.has(file)) continue;
    const source = readFileSync(file, 'utf8');
    if (hasDirective(source, 'use server')) continue;
    files.add(file);
    for (const name of importsOf(file, source)) {
      const target = resolve(file, name);
      if (target === null) packages.add(name);
      else if (/\.tsx?$/.test(target)) waiting.push(target);
    }
  }
  return { files, packages };
}

function hasDirective(source: string, directive: string): boolean {
  return new RegExp(`^['"]${directive}['"];`).test(source);
}

/** Names of modules that are imported as values: statically, again exported, or later. */
function importsOf(file: string, source: string): string[] {
  const tree = ts.createSourceFile(file, source, ts.ScriptTarget.ES2022, true);
  const names: string[] = [];
  const visit = (node: ts.Node): void => {
    if (ts.isImportDeclaration(node) && ts.isStringLiteral(node.moduleSpecifier)) {
      if (!isOnlyTypes(node.importClause)) names.push(node.moduleSpecifier.text);
    } else if (ts.isExportDeclaration(node) && node.moduleSpecifier && ts.isStringLiteral(node.moduleSpecifier)) {
      if (!node.isTypeOnly) names.push(node.moduleSpecifier.text);
    } else if (ts.isCallExpression(node) && node.expression.kind === ts.SyntaxKind.ImportKeyword) {
      const [argument] = node.arguments;
      if (argument && ts.isStringLiteral(argument)) names.push(argument.text);
    }
    ts.forEachChild(node, visit);
  };
  visit(tree);
  return names;
}

function isOnlyTypes(clause: ts.ImportClause | undefined): boolean {
  if (!clause) return false;
  if (clause.phaseModifier === ts.SyntaxKind.TypeKeyword) return true;
  const { name, namedBindings } = clause;
  if (name || !namedBindings || !ts.isNamedImports(namedBindings)) return false;
  return namedBindings.elements.length > 0 && namedBindings.elements.every((element) => element.isTypeOnly);
}

/** The file of a module of ours, relative to the project; null for a package. */
function resolve(from: string, name: string): string | null {
  const base = name.startsWith('@/')
    ? name.slice(2)
    : name.startsWith('.')
      ? path.join(path.dirname(from), name)
      : null;
  if (base === null) return null;
  const found = ['', '.ts', '.tsx', '/index.ts'].map((end) => base + end).find((file) => isFile(file));
  if (found === undefined) throw new Error(`${from} imports ${name}, which is not there.`);
  return found;
}

function isFile(file: string): boolean {
  return existsSync(file) && statSync(file).isFile();
}

const entries = pages
  .flatMap((folder) =>
    readdirSync(folder, { recursive: true, encoding: 'utf8' }).map((file) => path.join(folder, file)),
  )
  .filter((file) => /\.tsx?$/.test(file) && hasDirective(readFileSync(file, 'utf8'), 'use client'));
const reached = reachedFrom(entries);
const ofReader = reachedFrom(['lib/checker/reader.ts']);

describe('the scripts of students’ pages', () => {
  it('are found', () => {
    expect(entries.length).toBeGreaterThan(5);
    expect(reached.files.has('components/math/answer-field.tsx')).toBe(true);
    expect(reached.packages.has('react-katex')).toBe(true);
  });

  it('hold of the checker what the reader needs, and nothing else', () => {
    const ofChecker = [...reached.files].filter((file) => file.startsWith('lib/checker/'));
    expect(ofChecker).toContain('lib/checker/reader.ts');
    expect(ofChecker.filter((file) => !ofReader.files.has(file))).toEqual([]);
  });

  it('hold no template, service, query, model, queue or mail', () => {
    const foreign =
      /^(?:lib\/(?:templates|services|queries|presenters|policies|queue|jobs|mail|db|uploads)\/|models\/)/;
    expect([...reached.files].filter((file) => foreign.test(file))).toEqual([]);
  });

  it('use no computer algebra system and no database', () => {
    const refused = ['mathjs', 'nerdamer', 'decimal.js', 'sequelize', 'pg', 'piscina', 'graphile-worker'];
    expect(refused.filter((name) => reached.packages.has(name))).toEqual([]);
  });
});

describe('the reader', () => {
  it('holds no comparison, algebra or slips, and no package', () => {
    const deep = /^lib\/checker\/(?:algebra|equivalence|kinds|slips)\/|^lib\/checker\/index\.ts/;
    expect([...ofReader.files].filter((file) => deep.test(file))).toEqual([]);
    expect([...ofReader.packages]).toEqual([]);
    // The whole door, looked at in the same way, does reach them.
    expect([...reachedFrom(['lib/checker/index.ts']).files].some((file) => deep.test(file))).toBe(true);
  });
});
