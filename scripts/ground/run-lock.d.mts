export type Holder = { pid: number; startTicks?: number | null; [more: string]: unknown };

export function takeLock(file: string): Promise<{ note(more: object): void; release(): void } | { holder: Holder }>;
export function holds(holder: Partial<Holder> | null): boolean;
