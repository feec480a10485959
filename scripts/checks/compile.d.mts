/** Compiles a TypeScript entry with all it imports into one CommonJS script, as text. */
export function compile(entry: URL): Promise<string>;
