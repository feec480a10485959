type Entry = { version?: string; integrity?: string; optional?: boolean; devOptional?: boolean };
export type Lock = { packages?: Record<string, Entry> } | null;

export function packagesKey(lockText: string | Buffer, abi?: string, platform?: string): string;
export function sameInstall(locked: Lock, installed: Lock, isThere: (name: string) => boolean): boolean;
