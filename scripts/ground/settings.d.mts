export type Settings = {
  host: string;
  port: string | undefined;
  appUrl: string | null;
  databaseUrl: string | null;
  smtpUrl: string | null;
  workers: number;
  isPublic: boolean;
  managesDatabase: boolean;
};

export function isLoopback(hostname: string): boolean;
export function readSettings(env: Record<string, string | undefined>): Settings;
