import { ActionButton } from '@/app/_components/action-button';
import { TimeStamp } from '@/components/ui/time-stamp';
import { type OwnSession } from '@/lib/queries/own-sessions';
import { endOtherSessions, endSession } from '../actions';

/** Where one is signed in, with the way to end each. */
export function Sessions({ sessions, zone }: { sessions: readonly OwnSession[]; zone: string }) {
  const others = sessions.filter((session) => !session.isThis);
  return (
    <>
      <ul className="max-w-measure">
        {sessions.map((session) => (
          <li
            key={session.reference}
            className="flex flex-wrap items-baseline justify-between gap-x-6 border-t border-hairline py-2.5"
          >
            <span>
              Signed in <TimeStamp at={session.since} zone={zone} style="short" />
              <span className="text-grey">
                , until <TimeStamp at={session.until} zone={zone} style="short" /> if not used
              </span>
            </span>
            {session.isThis ? (
              <span className="text-small text-grey">this browser</span>
            ) : (
              <ActionButton
                action={endSession}
                fields={{ reference: session.reference }}
                label="Sign it out"
                look="plain"
                done="That browser is signed out."
              />
            )}
          </li>
        ))}
      </ul>
      {others.length > 1 ? (
        <div className="mt-4">
          <ActionButton
            action={endOtherSessions}
            fields={{}}
            label="Sign out everywhere else"
            done="Every other browser is signed out."
          />
        </div>
      ) : null}
    </>
  );
}
