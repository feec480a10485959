import { checkNames } from '@/lib/checker/notation/scope';
import { type TemplateContent } from './content';
import { slotsIn } from './interpolate';
import { type TemplateProblem } from './template-problem';

/** Names that already mean something in the answer language, and parameters that nothing uses. */
export function findNameProblems(content: TemplateContent): TemplateProblem[] {
  const named = [
    ...content.parameters.map(({ name }, index) => ({ name, path: `parameters.${index}.name` })),
    ...content.symbols.map(({ name }, index) => ({ name, path: `symbols.${index}.name` })),
  ];
  const reserved = named.flatMap(({ name, path }): TemplateProblem[] => {
    const [fault] = checkNames([name]);
    return fault ? [{ path, message: `${fault.message} Choose another.`, weight: 'mistake' }] : [];
  });
  return [...reserved, ...findUnused(content)];
}

/** A drawn value that no student sees and no reference needs is most likely a slip of the pen. */
function findUnused(content: TemplateContent): TemplateProblem[] {
  const slots = new Set(
    [content.prompt, content.solution, ...content.parts.map((part) => part.prompt)]
      .flatMap((text) => slotsIn(text))
      .map((slot) => slot.name),
  );
  const expressions = [
    ...content.constraints,
    ...content.parts.flatMap((part) => [part.reference, ...part.expected.map((wrong) => wrong.expression)]),
  ];
  return content.parameters.flatMap(({ name }, index): TemplateProblem[] => {
    const isUsed = slots.has(name) || expressions.some((expression) => expression.includes(name));
    if (isUsed) return [];
    return [{ path: `parameters.${index}.name`, message: `${name} is drawn but used nowhere.`, weight: 'advice' }];
  });
}
