import { readdirSync } from 'node:fs';
import path from 'node:path';
import { type Row } from './row';
import { type Scene } from './scene';

/** One file of tests/routes/permissions: its rows, and what they need beyond the scene. */
type Area = { rows: readonly Row[]; prepare?: (scene: Scene) => Promise<void> };

const folder = path.resolve(import.meta.dirname, '../permissions');

/** Every area there is, by the name of its file. */
export async function allAreas(): Promise<Map<string, Area>> {
  const files = readdirSync(folder)
    .filter((file) => file.endsWith('.ts'))
    .sort();
  const areas = files.map(async (file): Promise<[string, Area]> => {
    const area = (await import(path.join(folder, file))) as Area;
    return [path.basename(file, '.ts'), area];
  });
  return new Map(await Promise.all(areas));
}

/** Every row of every area. */
export async function allRows(): Promise<Row[]> {
  return [...(await allAreas()).values()].flatMap((area) => [...area.rows]);
}

/** Builds what the areas need beyond the scene, one after the other. */
export async function prepareAreas(scene: Scene): Promise<void> {
  for (const area of (await allAreas()).values()) await area.prepare?.(scene);
}
