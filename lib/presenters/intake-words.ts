import type { IntakeState } from '@/models/intake';

const words: Record<IntakeState, string> = {
  uploaded: 'waiting to be read',
  reading: 'being read',
  previewed: 'to be looked at',
  committing: 'being taken in',
  checking: 'being checked',
  done: 'done',
  cancelled: 'given up',
  failed: 'could not be read',
};

/** The state of an upload in words. */
export function intakeStateInWords(state: IntakeState): string {
  return words[state];
}
