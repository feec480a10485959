'use client';

import { type ReactNode } from 'react';
import { AnswerField } from '@/components/math/answer-field';
import { Button } from '@/components/ui/button';
import { PartRow } from '@/components/ui/script-page';
import { read } from '@/lib/checker/reader';
import { type StudentPart } from '@/lib/presenters/student-set';
import { ChoiceField } from './choice-field';
import { DraftNotice } from './draft-notice';
import { answerName, pressValue, revisionName } from './hand-in-form';
import { HandInNotice } from './hand-in-notice';
import { Hint } from './hint';
import { useDraft, useKeeper } from './keeper-context';
import { PartMargin } from './part-margin';
import { type HandInNews } from './use-hand-in';

interface AnswerPartProps {
  readonly drawId: string;
  /** The question's place in the set. */
  readonly place: number;
  readonly part: StudentPart;
  readonly prompt: ReactNode;
  /** For a choice: the choices as they are shown. */
  readonly choices: readonly ReactNode[];
  /** Whether to say that what is typed is shown back: once a page is enough. */
  readonly isFirst: boolean;
  readonly zone: string;
  readonly form: string;
  /** Whether this part is on its way. */
  readonly isPending: boolean;
  readonly news: HandInNews | null;
  readonly onBack: () => void;
}

/** A part that still takes an answer: the field and how it is read, and in the margin what was submitted. */
export function AnswerPart({
  drawId,
  place,
  part,
  prompt,
  choices,
  isFirst,
  zone,
  form,
  isPending,
  news,
  onBack,
}: AnswerPartProps) {
  const keeper = useKeeper();
  const ref = { drawId, partKey: part.key };
  const draft = useDraft(ref);
  const isNew = isUnsubmitted(part, draft.text);
  const field = {
    id: `${form}-${part.key}`,
    name: answerName(part.key),
    form,
    label: `Answer to question ${place}, part ${part.key}`,
    defaultValue: draft.text,
    onTyped: (text: string) => keeper.type(ref, text),
  };
  const button = (
    <Button
      type="submit"
      form={form}
      name="press"
      value={pressValue({ part: part.key, confirmUnreadable: false })}
      pending={isPending}
    >
      Submit part {part.key}
    </Button>
  );
  return (
    <PartRow
      id={`${form}-part-${part.key}`}
      letter={part.key}
      label={`Question ${place}, part ${part.key}`}
      prompt={prompt}
      margin={
        <PartMargin part={part} zone={zone}>
          {isNew || isPending ? button : <noscript>{button}</noscript>}
          {news ? <HandInNotice news={news} form={form} onBack={onBack} /> : null}
        </PartMargin>
      }
    >
      <input type="hidden" form={form} name={revisionName(part.key)} value={part.revision} />
      {part.kind === 'choice' ? (
        <ChoiceField key={draft.renewed} {...field} choices={part.reading.options.choices ?? []} shown={choices} />
      ) : (
        <AnswerField
          key={draft.renewed}
          {...field}
          {...part.reading}
          hint={<Hint reading={part.reading} />}
          {...(isFirst ? {} : { empty: null })}
          read={read}
        />
      )}
      {part.handedIn && isNew ? (
        <p className="mt-2 text-small text-grey">
          Submitted and standing: <code className="break-all whitespace-pre-wrap text-ink">{part.handedIn.text}</code>
        </p>
      ) : null}
      <div className="mt-2">
        <DraftNotice part={ref} draft={draft} />
      </div>
    </PartRow>
  );
}

/** Whether a text says something that has not been submitted. */
export function isUnsubmitted(part: StudentPart, text: string): boolean {
  return text.trim() !== '' && text !== part.handedIn?.text;
}
