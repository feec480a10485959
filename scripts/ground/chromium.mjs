import { findOnPath, installDebianPackages, isExecutable, isRoot } from './programs.mjs';
import { Failure } from './failure.mjs';

/**
 * The browser of the journeys: HALFMARK_CHROMIUM, or Chromium on PATH, or Debian's package, which is then installed.
 *
 * @param {(line: string) => void} say
 * @returns {Promise<string>} its full path
 */
export async function ensureChromium(say) {
  const declared = process.env.HALFMARK_CHROMIUM;
  if (declared) {
    if (isExecutable(declared)) return declared;
    throw new Failure('HALFMARK_CHROMIUM names no program.', 'Give the full path of Chromium, or unset it.');
  }
  const found = findOnPath('chromium') ?? findOnPath('chromium-browser');
  if (found) return found;
  if (isRoot()) say('Installing Chromium (Debian package chromium) …');
  await installDebianPackages(['chromium'], 'Chromium');
  const installed = findOnPath('chromium');
  if (installed) return installed;
  throw new Failure('Chromium was installed but is not on PATH.', 'Name it in HALFMARK_CHROMIUM.');
}
