import { SetHead } from '@/app/(course)/_components/course-head';
import { openCoursePage } from '@/app/_server/course-page';
import { pageOf } from '@/app/_server/page';
import { Notice } from '@/components/ui/notice';
import { ScriptPage, Section } from '@/components/ui/script-page';
import { VerdictSign } from '@/components/ui/verdict-sign';
import { formatCredit } from '@/lib/domain/credit';
import { flagSentence } from '@/lib/domain/flag-reasons';
import { openDesk } from '@/lib/services/open-desk';
import { AnswerSheet } from '../_components/answer-sheet';
import { Desk } from '../_components/desk';
import { History, OtherParts } from '../_components/around';
import { quickCredits } from '../_components/quick-credits';
import { NotHeld } from '../_components/not-held';

export const metadata = { title: 'Review desk' };

type Props = { params: Promise<{ courseId: string; setId: string; queueItemId: string }> };

/** One answer that needs a person: question, reference and answer side by side, and the ruling in the margin. */
export default async function DeskPage({ params }: Props) {
  const { actor, course, ids } = await openCoursePage(params, 'work-queue');
  const desk = await pageOf(() => openDesk(actor, { ...ids, problemSetId: ids.setId }));
  const { answer, item, set } = desk;
  const itemIds = { courseId: course.id, problemSetId: set.id, queueItemId: item.id };
  const sheet = (
    <>
      {desk.appealReason === null ? null : (
        <div className="mb-4">
          <Notice title="The student appeals">{desk.appealReason}</Notice>
        </div>
      )}
      {item.question === null ? null : (
        <div className="mb-4">
          <Notice title="A grader asks">{item.question}</Notice>
        </div>
      )}
      <AnswerSheet answer={answer} zone={course.timeZone} />
    </>
  );
  const above = (
    <>
      {answer.verdict ? <VerdictSign verdict={answer.verdict} size="margin" detail={answer.slips[0]} /> : null}
      <ul className="text-small text-grey">
        {item.reasons.map((reason) => (
          <li key={reason}>{flagSentence(reason)}</li>
        ))}
      </ul>
    </>
  );
  const below = (
    <>
      <OtherParts parts={desk.otherParts} attempts={desk.earlierAttempts} />
      <History steps={desk.history} zone={course.timeZone} />
    </>
  );
  return (
    <>
      <SetHead
        actor={actor}
        course={course}
        set={set}
        place="Review desk"
        page="queue"
        waiting={desk.waiting}
        status={`${desk.waiting} waiting`}
      />
      <ScriptPage>
        {desk.heldUntil === null ? (
          <Section margin={<NotHeld ids={itemIds} state={item.state} above={above} below={below} />}>{sheet}</Section>
        ) : (
          <Desk
            key={item.id}
            ids={itemIds}
            kind={item.kind}
            quick={quickCredits(answer.outOf)}
            outOf={answer.marks}
            suggested={desk.suggested === null ? '' : formatCredit(desk.suggested)}
            heldUntil={desk.heldUntil.toISOString()}
            mayEscalate={desk.mayEscalate}
            sheet={sheet}
            above={above}
            below={below}
          />
        )}
      </ScriptPage>
    </>
  );
}
