import { VerdictSign } from '@/components/ui/verdict-sign';
import { verdicts } from '@/lib/domain/verdict';
import { type IntakeOutcome } from '@/lib/queries/intake-rows';
import { type OpenedIntake } from '@/lib/services/open-intake';

/** The counts of an upload in its margin: rows first, then verdicts as they come. */
export function Outcome({ intake, outcome }: { intake: OpenedIntake; outcome: IntakeOutcome }) {
  const checked = verdicts.filter((verdict) => outcome[verdict] > 0);
  return (
    <div className="grid gap-3">
      <p className="flex items-baseline gap-x-2">
        <span className="text-mark font-semibold">{intake.rowsAccepted}</span>
        <span className="text-small text-grey">
          of {intake.rowsTotal} {intake.rowsTotal === 1 ? 'row' : 'rows'} can be taken in
        </span>
      </p>
      {intake.rowsRefused > 0 ? (
        <p className="text-small">
          <span className="font-semibold">{intake.rowsRefused}</span> refused, each with its reason
        </p>
      ) : null}
      {checked.length > 0 ? (
        <ul className="text-small">
          {checked.map((verdict) => (
            <li key={verdict} className="flex gap-3">
              <span className="w-10 text-end font-semibold">{outcome[verdict]}</span>
              <VerdictSign verdict={verdict} />
            </li>
          ))}
        </ul>
      ) : null}
      {outcome.queued > 0 ? <p className="text-small text-grey">{outcome.queued} wait for a person</p> : null}
    </div>
  );
}
