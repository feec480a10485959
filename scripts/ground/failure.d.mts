export class Failure extends Error {
  constructor(cause: string, cure: string);
}

export function explain(error: unknown, folder?: string): unknown;
export function lastWords(output: unknown, length?: number): string;
