export type Holder = { pid: number; startTicks?: number | null; [more: string]: unknown };

export function takeLock(
  file: string,
): Promise<{ note(more: object): void; release(): void; tookOver: boolean } | { holder: Holder }>;
export function holds(holder: Partial<Holder> | null): boolean;
