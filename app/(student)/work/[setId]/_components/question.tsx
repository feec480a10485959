'use client';

import { type FormEvent, type ReactNode, useActionState, useSyncExternalStore } from 'react';
import { type ActionResult } from '@/app/_server/action-result';
import { Button } from '@/components/ui/button';
import { Section } from '@/components/ui/script-page';
import { type StudentPart, type StudentQuestion } from '@/lib/presenters/student-set';
import { type HandInResult } from '@/lib/services/hand-in-answers';
import { handInForm } from '../actions';
import { AnswerPart, isUnsubmitted } from './answer-part';
import { pressValue, readPress } from './hand-in-form';
import { HandInNotice } from './hand-in-notice';
import { useKeeper } from './keeper-context';
import { type HandInNews, useHandIn } from './use-hand-in';

interface QuestionProps {
  readonly question: StudentQuestion;
  readonly zone: string;
  /** Title and prompt, and the margin beside them, made by the server. */
  readonly head: ReactNode;
  readonly headMargin: ReactNode;
  /** Prompts of the parts, by their letter. */
  readonly prompts: Readonly<Record<string, ReactNode>>;
  /** Choices of the parts that are one, by their letter. */
  readonly choices: Readonly<Record<string, readonly ReactNode[]>>;
  /** Rows of the parts without attempts left, by their letter: they are only shown. */
  readonly locked: Readonly<Record<string, ReactNode>>;
  /** Makes the bare form's hand-in one of its kind. */
  readonly formKey: string;
}

/** One question of an open set: its parts with their fields, each submitted alone or all at once. */
export function Question({ question, zone, head, headMargin, prompts, choices, locked, formKey }: QuestionProps) {
  const { drawId, place } = question;
  const form = `question-${place}`;
  const parts = question.parts.filter(({ key }) => locked[key] === undefined);
  const keeper = useKeeper();
  const handIn = useHandIn(drawId, keeper);
  const [bare, sendBare] = useActionState(handInForm, null);
  const news = handIn.news ?? newsOfBare(bare);
  const unsubmitted = useUnsubmitted(drawId, parts);

  const submit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const { submitter } = event.nativeEvent as SubmitEvent;
    const press = readPress(submitter instanceof HTMLButtonElement ? submitter.value : 'all');
    const answers = parts
      .filter(({ key }) => press.part === 'all' || press.part === key)
      .map((part) => ({ part, text: keeper.draftOf({ drawId, partKey: part.key }).text }))
      .filter(({ part, text }) => isUnsubmitted(part, text))
      .map(({ part, text }) => ({ partKey: part.key, text }));
    if (answers.length > 0) void handIn.press(press, answers);
  };
  const goBack = () => {
    const first = news?.kind === 'ask' ? news.unreadable[0]?.partKey : undefined;
    handIn.clearNews();
    if (first !== undefined) document.getElementById(`${form}-${first}`)?.focus();
  };
  const submitAll = (
    <Button
      look="primary"
      type="submit"
      form={form}
      name="press"
      value={pressValue({ part: 'all', confirmUnreadable: false })}
      pending={handIn.pressed === 'all'}
    >
      Submit question {place}
    </Button>
  );
  return (
    <>
      <Section
        label={`Question ${place}`}
        margin={
          <>
            {headMargin}
            <noscript>{submitAll}</noscript>
          </>
        }
      >
        {head}
        <form id={form} action={sendBare} onSubmit={submit} hidden>
          <input type="hidden" name="drawId" value={drawId} />
          <input type="hidden" name="clientKey" value={formKey} />
        </form>
      </Section>
      {question.parts.map(
        (part) =>
          locked[part.key] ?? (
            <AnswerPart
              key={part.key}
              drawId={drawId}
              place={place}
              part={part}
              prompt={prompts[part.key]}
              choices={choices[part.key] ?? []}
              isFirst={place === 1 && part === parts[0]}
              zone={zone}
              form={form}
              isPending={handIn.pressed === part.key}
              news={news?.part === part.key ? news : null}
              onBack={goBack}
            />
          ),
      )}
      {unsubmitted > 1 || news?.part === 'all' ? (
        <Section
          margin={
            <div className="grid justify-items-start gap-2.5">
              {submitAll}
              {news?.part === 'all' ? <HandInNotice news={news} form={form} onBack={goBack} /> : null}
            </div>
          }
        >
          <p className="text-small text-grey">
            {unsubmitted} answers to question {place} are typed and not submitted.
          </p>
        </Section>
      ) : null}
    </>
  );
}

/** How many parts hold a text that has not been submitted. */
function useUnsubmitted(drawId: string, parts: readonly StudentPart[]): number {
  const keeper = useKeeper();
  const count = () =>
    parts.filter((part) => isUnsubmitted(part, keeper.draftOf({ drawId, partKey: part.key }).text)).length;
  return useSyncExternalStore(keeper.subscribe, count, count);
}

/** What became of the bare form, which does not tell which button was pressed. */
function newsOfBare(result: ActionResult<HandInResult> | null): HandInNews | null {
  if (result === null) return null;
  if (!result.ok) {
    return { kind: 'refused', part: 'all', message: result.message, isSignedOut: result.code === 'signed-out' };
  }
  if (result.value.kind === 'handed-in') return null;
  const { unreadable } = result.value;
  return { kind: 'ask', part: unreadable.length === 1 ? (unreadable[0]?.partKey ?? 'all') : 'all', unreadable };
}
