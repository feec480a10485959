import { readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';

/** The JSON in a file, or `fallback` where the file is missing or not JSON. */
export function readJson(file, fallback = null) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch (error) {
    if (error.code === 'ENOENT' || error instanceof SyntaxError) return fallback;
    throw error;
  }
}

/** Writes a file whole or not at all, so that a crash never leaves half of it. */
export function writeWhole(file, text, mode = 0o600) {
  const draft = `${file}.${process.pid}.new`;
  try {
    writeFileSync(draft, text, { mode });
    renameSync(draft, file);
  } catch (error) {
    rmSync(draft, { force: true });
    throw error;
  }
}

/** Writes a value as JSON, whole or not at all. */
export function writeJson(file, value, mode = 0o600) {
  writeWhole(file, `${JSON.stringify(value, null, 2)}\n`, mode);
}
