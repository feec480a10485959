import { Answer } from '@/models/answer';
import { Draw } from '@/models/draw';
import { ProblemSet } from '@/models/problem-set';
import { ProblemSetItem } from '@/models/problem-set-item';
import { TemplateVersion } from '@/models/template-version';
import type { User } from '@/models/user';
import { loadActor } from '@/lib/auth/load-actor';
import { inTransaction } from '@/lib/db/transaction';
import { defaultSetPolicy } from '@/lib/domain/set-policy';
import { checkAnswers } from '@/lib/jobs/check-answers';
import { closeProblemSet } from '@/lib/services/close-problem-set';
import type { ServiceContext } from '@/lib/services/context';
import { createProblemSet } from '@/lib/services/create-problem-set';
import { createTemplate } from '@/lib/services/create-template';
import { addItem } from '@/lib/services/edit-set-items';
import { editProblemSet } from '@/lib/services/edit-problem-set';
import { handInAnswers } from '@/lib/services/hand-in-answers';
import { openProblemSet } from '@/lib/services/open-problem-set';
import { publishTemplateVersion } from '@/lib/services/publish-template-version';
import { draftOfContent } from '@/lib/templates/draft';
import { drawValues } from '@/lib/templates/draw-values';
import type { SeededRandom } from '@/lib/templates/seeded-random';
import { answerForms, type AnswerForms } from './demo-answers';
import { newClientKey, type DemoPeople } from './demo-people';
import { demoTemplates, type DemoTemplateId } from './demo-templates';
import { shelfTemplates, type ShelfTemplate } from './demo-shelf';

const MINUTE = 60_000;

/** Runs a service as a person would, at a time of the demo's. */
export async function as<Result>(
  user: User,
  at: Date,
  work: (context: ServiceContext) => Promise<Result>,
): Promise<Result> {
  return inTransaction(async (transaction) => {
    const actor = await loadActor(user.id, transaction);
    if (actor === null) throw new Error(`${user.name} has no account.`);
    return work({ actor, transaction, now: at });
  });
}

/** Puts the demo's questions on the shelf and publishes each; gives the versions of those that its sets use. */
export async function publishTemplates(people: DemoPeople, at: Date): Promise<Map<DemoTemplateId, string>> {
  const versions = new Map<DemoTemplateId, string>();
  for (const template of demoTemplates) versions.set(template.id, await publish(people, at, template));
  for (const template of shelfTemplates()) await publish(people, at, template);
  return versions;
}

async function publish(
  people: DemoPeople,
  at: Date,
  { topics, content }: Pick<ShelfTemplate, 'topics' | 'content'>,
): Promise<string> {
  const { templateId, revision } = await as(people.instructor, at, (context) =>
    createTemplate(context, {
      departmentId: people.course.departmentId,
      name: content.title,
      topics,
      draft: draftOfContent(content),
    }),
  );
  const { versionId } = await as(people.instructor, at, (context) =>
    publishTemplateVersion(context, { templateId, revision }),
  );
  return versionId;
}

/** A set of the demo with the questions in it, in order. */
export type DemoSet = { id: string; items: { itemId: string; template: DemoTemplateId }[] };

/** Makes the three sets and opens them, each at its own time; they are answered before the first two are closed. */
export async function makeSets(
  people: DemoPeople,
  versions: ReadonlyMap<DemoTemplateId, string>,
  daysFromNow: (days: number) => Date,
): Promise<{ released: DemoSet; closed: DemoSet; open: DemoSet }> {
  const make = (title: string, questions: readonly DemoTemplateId[], opens: number, closes: number, appeals: number) =>
    makeSet(people, versions, {
      title,
      questions,
      opensAt: daysFromNow(opens),
      closesAt: daysFromNow(closes),
      appealsUntil: daysFromNow(appeals),
    });
  return {
    released: await make('Spin algebra', ['commutators', 'magnet'], -30, -21, 14),
    closed: await make('Spin in a field', ['magnet', 'precession'], -12, -2, 21),
    open: await make('Evolution', ['precession', 'commutators'], -3, 6, 28),
  };
}

async function makeSet(
  people: DemoPeople,
  versions: ReadonlyMap<DemoTemplateId, string>,
  plan: { title: string; questions: readonly DemoTemplateId[]; opensAt: Date; closesAt: Date; appealsUntil: Date },
): Promise<DemoSet> {
  const { title, questions, opensAt, closesAt, appealsUntil } = plan;
  const before = new Date(opensAt.getTime() - 60 * MINUTE);
  return as(people.instructor, before, async (context) => {
    const { problemSetId } = await createProblemSet(context, { courseId: people.course.id, title });
    const items: DemoSet['items'] = [];
    for (const template of questions) {
      const set = await ProblemSet.findByPk(problemSetId, { transaction: context.transaction, rejectOnEmpty: true });
      const content = demoTemplates.find(({ id }) => id === template)?.content;
      const weights = content?.parts.reduce((sum, part) => sum + part.weight, 0) ?? 0;
      const { itemId } = await addItem(context, {
        problemSetId,
        revision: set.revision,
        templateVersionId: versions.get(template) ?? '',
        points: 1000 * weights,
      });
      items.push({ itemId, template });
    }
    const set = await ProblemSet.findByPk(problemSetId, { transaction: context.transaction, rejectOnEmpty: true });
    const { revision } = await editProblemSet(context, {
      problemSetId,
      revision: set.revision,
      title,
      opensAt,
      closesAt,
      appealsUntil,
      attemptsAllowed: 3,
      policy: { ...defaultSetPolicy, secondMarkingRate: 350, headTaSeesIdentities: true },
    });
    await openProblemSet(context, { problemSetId, revision });
    return { id: problemSetId, items };
  });
}

/** Has a share of the students answer a set, each with their own numbers and in their own way. */
export async function answerSet(
  people: DemoPeople,
  set: DemoSet,
  { random, share, at }: { random: SeededRandom; share: number; at: Date },
): Promise<void> {
  for (const [index, student] of people.students.entries()) {
    if (random.below(1000) >= share * 1000) continue;
    for (const item of set.items) {
      const draw = await seedDraw(item.itemId, student, random);
      const content = demoTemplates.find(({ id }) => id === item.template)?.content;
      const answers = (content?.parts ?? []).flatMap(({ key }) => {
        const text = chooseAnswer(answerForms(item.template, key, draw.drawnValues), random);
        return text === null ? [] : [{ partKey: key, text }];
      });
      if (answers.length === 0) continue;
      await as(student, new Date(at.getTime() + index * 7 * MINUTE), (context) =>
        handInAnswers(context, { drawId: draw.id, answers, clientKey: newClientKey(), confirmUnreadable: true }),
      );
    }
  }
}

/** A draw whose seed is the demo's, so that the demo is the same each time; a student's own would be random. */
async function seedDraw(itemId: string, student: User, random: SeededRandom): Promise<Draw> {
  const item = await ProblemSetItem.findByPk(itemId, { rejectOnEmpty: true });
  const version = await TemplateVersion.findByPk(item.templateVersionId, { rejectOnEmpty: true });
  const seed = `demo ${random.below(2 ** 32)}`;
  const drawn = drawValues(version.content, seed);
  if (!drawn.ok) throw new Error(`A question of the demo cannot be drawn: ${drawn.error}`);
  return Draw.create({
    itemId,
    userId: student.id,
    templateVersionId: version.id,
    seed,
    drawnValues: drawn.values,
  });
}

/** Out of a hundred answers 60 are right, 17 have a slip, 10 are wrong, 5 cannot be read and 8 are missing. */
function chooseAnswer(forms: AnswerForms, random: SeededRandom): string | null {
  const chance = random.below(100);
  const kind = chance < 60 ? forms.right : chance < 77 ? forms.slips : chance < 87 ? forms.wrong : forms.unreadable;
  return chance >= 92 ? null : (kind[random.below(kind.length)] ?? null);
}

/** Checks what waits, as the worker does. */
export async function checkEverything(): Promise<void> {
  const waiting = await Answer.findAll({ where: { checkState: 'waiting' }, attributes: ['id'], order: ['id'] });
  const answerIds = waiting.map(({ id }) => id);
  for (let start = 0; start < answerIds.length; start += 500) {
    await checkAnswers(
      { answerIds: answerIds.slice(start, start + 500) },
      { jobId: 'demo', attempt: 1, isLastAttempt: true, signal: new AbortController().signal },
    );
  }
}

/** Closes a set at its closing time. */
export async function closeSet(people: DemoPeople, set: DemoSet, at: Date): Promise<void> {
  await as(people.instructor, at, async (context) => {
    const { revision } = await ProblemSet.findByPk(set.id, { transaction: context.transaction, rejectOnEmpty: true });
    return closeProblemSet(context, { problemSetId: set.id, revision });
  });
}
