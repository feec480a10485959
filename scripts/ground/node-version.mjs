/**
 * Whether a Node.js version fits what package.json asks for.
 *
 * @param {string} version such as '20.20.2'
 * @param {{ major: number, minor: number }} wanted the one major line that is supported and its first minor
 */
export function nodeFits(version, wanted) {
  const [major, minor] = version.split('.').map(Number);
  return major === wanted.major && minor >= wanted.minor;
}

/** What package.json's "engines" asks for, read from the form '>=20.19 <21'. */
export function wantedNode(engines) {
  const match = /^>=(\d+)\.(\d+) <(\d+)$/.exec(engines);
  if (!match) throw new Error(`The "engines" entry "${engines}" is not of the form ">=20.19 <21".`);
  return { major: Number(match[1]), minor: Number(match[2]) };
}
