/**
 * The details of an audit event as short lines: `role: ta → head-ta`, `sections: 3`. Lists are joined, whatever else is
 * nested is left out, and so is the name of a system actor, which stands elsewhere.
 */
export function presentAuditDetails(details: Readonly<Record<string, unknown>>): string[] {
  return Object.entries(details)
    .filter(([name]) => name !== 'by')
    .map(([name, value]) => [inWords(name), valueInWords(value)])
    .filter(([, words]) => words !== '')
    .map(([name, words]) => `${name}: ${words}`);
}

/** A name in camel or kebab case as words: `expiresAt` and `expires-at` are "expires at". */
export function inWords(name: string): string {
  return name
    .replace(/([a-z])([A-Z])/g, '$1 $2')
    .replace(/-/g, ' ')
    .toLowerCase();
}

function valueInWords(value: unknown): string {
  if (value === null || value === undefined || value === '') return 'none';
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (typeof value === 'string') return textInWords(value);
  if (typeof value === 'number') return String(value);
  if (Array.isArray(value)) return value.length === 0 ? 'none' : value.map(valueInWords).join(', ');
  if (typeof value === 'object' && 'from' in value && 'to' in value) {
    const [from, to] = [valueInWords(value.from), valueInWords(value.to)];
    return from === to ? '' : `${from} → ${to}`;
  }
  return '';
}

/** An id is cut short, a moment is written to the minute, a name in kebab case stays. */
function textInWords(text: string): string {
  if (isId(text)) return `${text.slice(0, 8)}…`;
  return /^\d{4}-\d\d-\d\dT\d\d:\d\d:\d\d\.\d{3}Z$/.test(text)
    ? `${text.slice(0, 10)} ${text.slice(11, 16)} UTC`
    : text;
}

/** Ids mean nothing to a reader in full; their beginning tells two apart. */
function isId(value: string): boolean {
  return /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/.test(value);
}
