type Installation = { folder: string; version: number };

export function majorVersion(text: string | null): number | null;
export function choose(installations: Installation[], required: number | null): Installation | null;
