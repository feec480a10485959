import { SetHead } from '@/app/(course)/_components/course-head';
import { openCoursePage } from '@/app/_server/course-page';
import { pageOf } from '@/app/_server/page';
import { ScriptPage } from '@/components/ui/script-page';
import { VerdictSign } from '@/components/ui/verdict-sign';
import { formatCredit } from '@/lib/domain/credit';
import { openSettling } from '@/lib/services/open-second-marking';
import { AnswerSheet } from '../../../desk/_components/answer-sheet';
import { quickCredits } from '../../../desk/_components/quick-credits';
import { SecondDesk } from '../../../desk/_components/second-desk';

export const metadata = { title: 'Settle' };

type Props = { params: Promise<{ courseId: string; setId: string; secondMarkingId: string }> };

/** One answer on which two graders differ, with both marks and their reasons, to be settled. */
export default async function SettlePage({ params }: Props) {
  const { actor, course, ids } = await openCoursePage(params, 'settle-disagreements');
  const { set, answer, marks } = await pageOf(() => openSettling(actor, { ...ids, problemSetId: ids.setId }));
  return (
    <>
      <SetHead actor={actor} course={course} set={set} place="Settle" page="queue" />
      <ScriptPage>
        <SecondDesk
          key={ids.secondMarkingId}
          ids={{ courseId: course.id, problemSetId: set.id, secondMarkingId: ids.secondMarkingId }}
          what="settle"
          quick={quickCredits(answer.outOf)}
          outOf={answer.marks}
          sheet={<AnswerSheet answer={answer} zone={course.timeZone} />}
          above={
            <>
              {answer.verdict ? <VerdictSign verdict={answer.verdict} size="margin" detail={answer.slips[0]} /> : null}
              <dl className="grid gap-2 text-small">
                {marks.map(({ order, by, credit, comment }) => (
                  <div key={order}>
                    <dt className="text-grey">
                      {order} mark, {by}
                    </dt>
                    <dd>
                      <span className="font-semibold">{formatCredit(credit)}</span> of {answer.marks}
                      {comment ? <span className="block">{comment}</span> : null}
                    </dd>
                  </div>
                ))}
              </dl>
            </>
          }
        />
      </ScriptPage>
    </>
  );
}
