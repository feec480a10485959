import { SetHead } from '@/app/(course)/_components/course-head';
import { openCoursePage } from '@/app/_server/course-page';
import { pageOf } from '@/app/_server/page';
import { ScriptPage } from '@/components/ui/script-page';
import { VerdictSign } from '@/components/ui/verdict-sign';
import { openSecondMarking } from '@/lib/services/open-second-marking';
import { AnswerSheet } from '../../_components/answer-sheet';
import { quickCredits } from '../../_components/quick-credits';
import { SecondDesk } from '../../_components/second-desk';

export const metadata = { title: 'Second marking' };

type Props = { params: Promise<{ courseId: string; setId: string; secondMarkingId: string }> };

/** One answer to mark a second time, blind: nothing of the first mark, its marker or a suggestion is sent. */
export default async function SecondMarkingPage({ params }: Props) {
  const { actor, course, ids } = await openCoursePage(params, 'work-queue');
  const { set, answer, left } = await pageOf(() => openSecondMarking(actor, { ...ids, problemSetId: ids.setId }));
  return (
    <>
      <SetHead actor={actor} course={course} set={set} place="Second marking" page="queue" status={`${left} left`} />
      <ScriptPage>
        <SecondDesk
          key={ids.secondMarkingId}
          ids={{ courseId: course.id, problemSetId: set.id, secondMarkingId: ids.secondMarkingId }}
          what="mark"
          quick={quickCredits(answer.outOf)}
          outOf={answer.marks}
          sheet={<AnswerSheet answer={answer} zone={course.timeZone} />}
          above={
            <>
              {answer.verdict ? <VerdictSign verdict={answer.verdict} size="margin" /> : null}
              <p className="text-small text-grey">
                A blind second marking: give the credit you would give. The first mark is shown to nobody before yours.
              </p>
            </>
          }
        />
      </ScriptPage>
    </>
  );
}
