import { type DrawnValues, type Parameter, type TemplateContent } from './content';
import { conditionHolds } from './conditions';
import { seededRandom, type SeededRandom } from './seeded-random';

/** A draw, and how many were thrown away before it because a constraint did not hold; or why there is none. */
export type DrawResult =
  | { readonly ok: true; readonly values: DrawnValues; readonly redraws: number }
  | { readonly ok: false; readonly error: string };

/** What of a template a draw depends on. */
export type Drawable = Pick<TemplateContent, 'parameters' | 'constraints' | 'symbols'>;

/** After so many draws that break a constraint the template is told to be too narrow. */
const MAX_REDRAWS = 1_000;

/**
 * Draws a value for every parameter, each equally likely in its own range, again and again until every constraint holds.
 * The same content and seed give the same values for ever. Fails with a sentence for the author where a range is empty,
 * a constraint cannot be read or decided, or none of 1,000 draws satisfies them all.
 */
export function drawValues(content: Drawable, seed: string): DrawResult {
  const empty = content.parameters.find((parameter) => countValues(parameter) === 0);
  if (empty) return { ok: false, error: `The range of ${empty.name} holds no value.` };
  const random = seededRandom(seed);
  for (let redraws = 0; redraws <= MAX_REDRAWS; redraws += 1) {
    const values = Object.fromEntries(
      content.parameters.map((parameter) => [parameter.name, drawOne(parameter, random)]),
    );
    const broken = firstBroken(content, values);
    if (broken === null) return { ok: true, values, redraws };
    if (broken.error !== null) return { ok: false, error: broken.error };
  }
  return {
    ok: false,
    error: `None of ${MAX_REDRAWS + 1} draws satisfies every constraint. Widen a range or loosen a constraint.`,
  };
}

/** How many different values a parameter may take. */
export function countValues(parameter: Parameter): number {
  return parameter.type === 'choice' ? parameter.values.length : integersLeftOut(parameter).count;
}

function drawOne(parameter: Parameter, random: SeededRandom): string {
  if (parameter.type === 'choice') return parameter.values[random.below(parameter.values.length)]!.trim();
  const { count, leftOut } = integersLeftOut(parameter);
  // The n-th integer of the range that is not left out: `leftOut` is ascending.
  let value = parameter.from + random.below(count);
  for (const gap of leftOut) if (gap <= value) value += 1;
  return String(value);
}

function integersLeftOut(parameter: Extract<Parameter, { type: 'integer' }>): { count: number; leftOut: number[] } {
  const leftOut = [...new Set(parameter.except)]
    .filter((value) => value >= parameter.from && value <= parameter.to)
    .sort((a, b) => a - b);
  return { count: Math.max(0, parameter.to - parameter.from + 1 - leftOut.length), leftOut };
}

/** The first constraint that a draw breaks, with an error where it could not be decided; null where all hold. */
function firstBroken(content: Drawable, values: DrawnValues): { error: string | null } | null {
  for (const constraint of content.constraints) {
    const holds = conditionHolds(constraint, values, content.symbols);
    if (!holds.ok) return { error: `The constraint “${constraint}” cannot be used: ${holds.error}` };
    if (!holds.value) return { error: null };
  }
  return null;
}
