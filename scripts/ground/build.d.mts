export function hashOf(root: string, names: string[]): string;
