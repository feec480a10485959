'use client';

import { useState, type ReactNode } from 'react';
import { useActionForm } from '@/app/_components/use-action-form';
import { type ActionResult } from '@/app/_server/action-result';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Field } from '@/components/ui/fields';
import { FormErrorSummary } from '@/components/ui/form-error-summary';
import { SubmitButton } from '@/components/ui/submit-button';
import { useToast } from '@/components/ui/toast';
import { type ProblemSetState } from '@/lib/domain/problem-set-state';
import { closeSetNow, openSet, reopenSet } from '../actions';

interface SetMovesProps {
  readonly ids: { courseId: string; problemSetId: string; revision: string };
  readonly state: ProblemSetState;
  readonly begun: boolean;
  readonly items: number;
  readonly students: number;
  readonly opensLater: boolean;
  readonly hasClosingTime: boolean;
  readonly opening: ReactNode;
  readonly closing: ReactNode;
  /** This time tomorrow, as a date-and-time field holds it. */
  readonly tomorrow: string;
  readonly zone: string;
}

/** The next step of a set: open a draft, close an open one, open a closed one again; each asks first. */
export function SetMoves(props: SetMovesProps) {
  const { state, begun, items, hasClosingTime } = props;
  if (state === 'draft') {
    const missing = items === 0 ? 'a question' : hasClosingTime ? null : 'a closing time that is still to come';
    return missing === null ? (
      <OpenMove {...props} />
    ) : (
      <p className="text-small text-grey">Before it can be opened it needs {missing}.</p>
    );
  }
  if (state === 'open') return begun ? <CloseMove {...props} /> : null;
  return state === 'closed' ? <ReopenMove {...props} /> : null;
}

function OpenMove({ ids, students, opensLater, opening, closing }: SetMovesProps) {
  return (
    <Move
      ids={ids}
      action={openSet}
      look="primary"
      label={opensLater ? 'Open at its time…' : 'Open now…'}
      send={opensLater ? 'Open it then' : 'Open it now'}
      title={opensLater ? 'Let this set open by itself?' : 'Open this set now?'}
      done={opensLater ? 'The set will open at its time.' : 'The set is open.'}
    >
      <p>
        {students === 1 ? '1 student' : `${students} students`} will see it{' '}
        {opensLater ? <>from {opening}</> : 'at once'}, each with their own numbers, and may answer until {closing}.
      </p>
      <p>
        From then on questions and points stay as they are, and times and attempts can only become more generous. Until
        then everything can be changed.
      </p>
    </Move>
  );
}

function CloseMove({ ids, closing }: SetMovesProps) {
  return (
    <Move
      ids={ids}
      action={closeSetNow}
      look="danger"
      label="Close now…"
      send="Close it now"
      title="Close this set before its time?"
      done="The set is closed."
    >
      <p>
        It would close by itself on {closing}. Students who have not handed in yet lose the rest of that time; those
        with an extension keep theirs. It can be opened again until its scores are released.
      </p>
    </Move>
  );
}

function ReopenMove({ ids, tomorrow, zone }: SetMovesProps) {
  return (
    <Move
      ids={ids}
      action={reopenSet}
      look="quiet"
      label="Open again…"
      send="Open it again"
      title="Open this set again?"
      done="The set is open again."
    >
      <p>Every student may hand in again until the new closing time. The end of appeals moves by as much.</p>
      <Field
        id="reopen-closesAt"
        name="closesAt"
        type="datetime-local"
        label="Closes"
        hint={`Time in ${zone}`}
        defaultValue={tomorrow}
      />
    </Move>
  );
}

interface MoveProps {
  readonly ids: SetMovesProps['ids'];
  readonly action: (form: FormData) => Promise<ActionResult<unknown>>;
  readonly look: 'primary' | 'quiet' | 'danger';
  readonly label: string;
  readonly send: string;
  readonly title: string;
  readonly done: string;
  readonly children: ReactNode;
}

function Move({ ids, action, look, label, send, title, done, children }: MoveProps) {
  const [asking, ask] = useState(false);
  const toast = useToast();
  const { form, faults } = useActionForm(action, () => {
    ask(false);
    toast(done);
  });
  return (
    <div>
      <Button look={look} onClick={() => ask(true)}>
        {label}
      </Button>
      <Dialog open={asking} onClose={() => ask(false)} title={title}>
        <form {...form} className="grid gap-3">
          <FormErrorSummary errors={faults} title="Not done" />
          {Object.entries(ids).map(([name, value]) => (
            <input key={name} type="hidden" name={name} value={value} />
          ))}
          {children}
          <div className="mt-2 flex flex-wrap gap-3">
            <Button look="quiet" onClick={() => ask(false)}>
              Leave it as it is
            </Button>
            <SubmitButton look={look === 'danger' ? 'danger' : 'primary'}>{send}</SubmitButton>
          </div>
        </form>
      </Dialog>
    </div>
  );
}
