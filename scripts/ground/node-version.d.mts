export function nodeFits(version: string, wanted: { major: number; minor: number }): boolean;
export function wantedNode(engines: string): { major: number; minor: number };
