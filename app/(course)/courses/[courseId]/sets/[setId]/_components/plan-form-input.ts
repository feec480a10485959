import { z } from 'zod';
import { setPolicySchema, type SetPolicy } from '@/lib/domain/set-policy';
import { instantOf } from '@/lib/domain/zoned-time';
import { HalfmarkError } from '@/lib/errors';
import { courseForActor } from '@/lib/queries/course-for-actor';
import { type ServiceContext } from '@/lib/services/context';
import { setForStaff } from '@/lib/queries/set-for-staff';

const ticked = z
  .literal('on')
  .optional()
  .transform((value) => value === 'on');

/** A share typed in per cent with at most one decimal, as thousandths. */
const perCent = z
  .string()
  .regex(/^\s*\d{1,3}(\.\d)?\s*$/, 'Write a share from 0 to 100 per cent.')
  .transform((typed) => Math.round(Number(typed) * 10))
  .pipe(z.int().max(1000, 'At most 100 per cent.'));

/** The form of a set's plan as it is sent: times as the fields hold them, in the course's zone. */
export const planFormSchema = z.object({
  title: z.string().trim().min(1, 'Give the set a title.').max(200),
  opensAt: z.string().default(''),
  closesAt: z.string().default(''),
  appealsUntil: z.string().default(''),
  attemptsAllowed: z.coerce.number('Write a number of attempts.').int().min(1, 'At least one attempt.').max(100),
  flagNoCreditedSlip: ticked,
  flagFollowThrough: ticked,
  flagScan: ticked,
  spotCheckRate: perCent,
  secondMarkingRate: perCent,
  settleTolerance: perCent,
  headTaSeesIdentities: ticked,
  appealMayLower: ticked,
  showVerdictAtOnce: ticked,
  reportShowsTotal: ticked,
});

type PlanForm = z.output<typeof planFormSchema> & { courseId: string; problemSetId: string };

/** What the form means: instants, and the policy with what the form does not show left as it is. */
export async function planOfForm(context: ServiceContext, form: PlanForm) {
  const course = await courseForActor(context.actor, form.courseId, context.transaction);
  const before = await setForStaff(course.id, form.problemSetId, context.transaction);
  const fields: Record<string, string> = {};
  const time = (name: 'opensAt' | 'closesAt' | 'appealsUntil'): Date | null => {
    if (form[name].trim() === '') return null;
    // A time that was not touched stays to the second, which the field does not show.
    const instant = instantOf(form[name], course.timeZone);
    if (instant === null) fields[name] = 'Write a date and a time.';
    const kept = before[name];
    return kept && instant && sameMinute(kept, instant) ? kept : instant;
  };
  const plan = {
    title: form.title,
    opensAt: time('opensAt'),
    closesAt: time('closesAt'),
    appealsUntil: time('appealsUntil'),
    attemptsAllowed: form.attemptsAllowed,
    policy: policyOfForm(form, before.policy),
  };
  if (Object.keys(fields).length > 0) throw new HalfmarkError('invalid', undefined, { fields });
  return plan;
}

/** One time of a form in the course's zone; `invalid` at its field where it is none. */
export async function timeOfForm(context: ServiceContext, courseId: string, field: string, typed: string) {
  const course = await courseForActor(context.actor, courseId, context.transaction);
  const instant = instantOf(typed, course.timeZone);
  if (instant === null) {
    throw new HalfmarkError('invalid', undefined, { fields: { [field]: 'Write a date and a time.' } });
  }
  return instant;
}

function policyOfForm(form: PlanForm, before: SetPolicy): SetPolicy {
  const shown = {
    'no-credited-slip': form.flagNoCreditedSlip,
    'follow-through': form.flagFollowThrough,
    scan: form.flagScan,
  } as const;
  const hidden = before.flag.filter((reason) => !(reason in shown));
  const ticks = (Object.keys(shown) as (keyof typeof shown)[]).filter((reason) => shown[reason]);
  return setPolicySchema.parse({
    ...before,
    flag: [...hidden, ...ticks],
    spotCheckRate: form.spotCheckRate,
    secondMarkingRate: form.secondMarkingRate,
    settleTolerance: form.settleTolerance,
    headTaSeesIdentities: form.headTaSeesIdentities,
    appealMayLower: form.appealMayLower,
    showVerdictAtOnce: form.showVerdictAtOnce,
    reportShowsTotal: form.reportShowsTotal,
  });
}

function sameMinute(a: Date, b: Date): boolean {
  return Math.floor(a.getTime() / 60_000) === Math.floor(b.getTime() / 60_000);
}
