'use client';

import { useActionForm } from '@/app/_components/use-action-form';
import { Checkbox, Field, FieldGroup } from '@/components/ui/fields';
import { FormErrorSummary } from '@/components/ui/form-error-summary';
import { SubmitButton } from '@/components/ui/submit-button';
import { useToast } from '@/components/ui/toast';
import { type FlagReason } from '@/lib/domain/flag-reasons';
import { type SetPolicy } from '@/lib/domain/set-policy';
import { savePlan } from '../actions';

interface PlanFormProps {
  readonly ids: { courseId: string; problemSetId: string; revision: string };
  readonly zone: string;
  /** Students may have seen the set: its opening time stays. */
  readonly begun: boolean;
  readonly closed: boolean;
  readonly plan: {
    title: string;
    opensAt: string;
    closesAt: string;
    appealsUntil: string;
    attemptsAllowed: number;
    policy: SetPolicy;
  };
}

/** Title, times, attempts and policy. */
export function PlanForm({ ids, zone, begun, closed, plan }: PlanFormProps) {
  const toast = useToast();
  const { form, faults } = useActionForm(savePlan, () => toast('Saved.'));
  const { policy } = plan;
  const flags = (reason: FlagReason) => policy.flag.includes(reason);
  return (
    <form {...form} className="grid gap-5">
      <FormErrorSummary errors={faults} />
      {Object.entries(ids).map(([name, value]) => (
        <input key={name} type="hidden" name={name} value={value} />
      ))}
      <Field name="title" label="Title" defaultValue={plan.title} maxLength={200} error={faults.title} />
      <div className="grid max-w-measure gap-4 sm:grid-cols-2">
        <Time name="opensAt" label="Opens" value={plan.opensAt} zone={zone} fixed={begun} error={faults.opensAt} />
        <Time name="closesAt" label="Closes" value={plan.closesAt} zone={zone} fixed={closed} error={faults.closesAt} />
        <Time
          name="appealsUntil"
          label="Appeals until"
          value={plan.appealsUntil}
          zone={zone}
          error={faults.appealsUntil}
        />
        <Field
          name="attemptsAllowed"
          label="Attempts for each part"
          hint="The last one counts"
          inputMode="numeric"
          defaultValue={plan.attemptsAllowed}
          error={faults.attemptsAllowed}
        />
      </div>
      <FieldGroup
        legend="A person looks at"
        hint="Always at what cannot be decided or read, at questions written back, and at slips you left to a person."
      >
        <Checkbox
          name="flagNoCreditedSlip"
          label="wrong answers that no credited slip explains"
          defaultChecked={flags('no-credited-slip')}
        />
        <Checkbox
          name="flagFollowThrough"
          label="answers that follow from the student’s own earlier part"
          defaultChecked={flags('follow-through')}
        />
        <Checkbox name="flagScan" label="answers with a scan attached" defaultChecked={flags('scan')} />
      </FieldGroup>
      <div className="grid max-w-measure gap-4 sm:grid-cols-3">
        <Share
          name="secondMarkingRate"
          label="Second marking"
          hint="of rulings"
          value={policy.secondMarkingRate}
          error={faults.secondMarkingRate}
        />
        <Share
          name="spotCheckRate"
          label="Spot checks"
          hint="of automatic marks"
          value={policy.spotCheckRate}
          error={faults.spotCheckRate}
        />
        <Share
          name="settleTolerance"
          label="To settle above"
          hint="of marks apart"
          value={policy.settleTolerance}
          error={faults.settleTolerance}
        />
      </div>
      <FieldGroup legend="Students and names">
        <Checkbox
          name="showVerdictAtOnce"
          label="Students are told the verdict at once"
          defaultChecked={policy.showVerdictAtOnce}
        />
        <Checkbox
          name="reportShowsTotal"
          label="Score reports show the total"
          defaultChecked={policy.reportShowsTotal}
        />
        <Checkbox
          name="appealMayLower"
          label="An appeal may lower a mark"
          hint="Students are told so before they appeal."
          defaultChecked={policy.appealMayLower}
          error={faults.appealMayLower}
        />
        <Checkbox
          name="headTaSeesIdentities"
          label="The head TA sees names before release"
          defaultChecked={policy.headTaSeesIdentities}
        />
      </FieldGroup>
      <div>
        <SubmitButton pendingWords="Saving">Save</SubmitButton>
      </div>
    </form>
  );
}

function Time({
  name,
  label,
  value,
  zone,
  fixed = false,
  error,
}: {
  name: string;
  label: string;
  value: string;
  zone: string;
  fixed?: boolean;
  error?: string;
}) {
  return (
    <Field
      name={name}
      label={label}
      type="datetime-local"
      defaultValue={value}
      hint={fixed ? 'Has passed, and stays' : `Time in ${zone}`}
      readOnly={fixed}
      optional
      error={error}
    />
  );
}

function Share({
  name,
  label,
  hint,
  value,
  error,
}: {
  name: string;
  label: string;
  hint: string;
  value: number;
  error?: string;
}) {
  return (
    <Field
      name={name}
      label={label}
      hint={`Per cent ${hint}`}
      inputMode="decimal"
      defaultValue={value / 10}
      error={error}
    />
  );
}
