/** The states of a queue item; see `mayPassTo` for the moves between them. */
export const queueItemStates = ['waiting', 'taken', 'ruled', 'to-settle', 'settled', 'escalated', 'withdrawn'] as const;

export type QueueItemState = (typeof queueItemStates)[number];

const next: Record<QueueItemState, readonly QueueItemState[]> = {
  waiting: ['taken', 'ruled', 'escalated', 'withdrawn'],
  taken: ['waiting', 'ruled', 'escalated', 'withdrawn'],
  escalated: ['taken', 'ruled', 'waiting', 'withdrawn'],
  ruled: ['to-settle', 'waiting'],
  'to-settle': ['settled', 'ruled'],
  settled: [],
  withdrawn: [],
};

/**
 * Whether a queue item may pass from one state to another. A waiting item becomes ruled without being taken when a
 * ruling on its kin covers it; a ruled one waits again when that ruling is reversed.
 */
export function mayPassTo(from: QueueItemState, to: QueueItemState): boolean {
  return next[from].includes(to);
}

/** The states in which an answer still waits for a person. */
export const liveQueueItemStates = ['waiting', 'taken', 'escalated'] as const satisfies readonly QueueItemState[];

/** How long a grader holds an item without a sign of life before it goes back to the queue. */
export const LEASE_MINUTES = 15;

/** Whether a hold has run out at `now`. */
export function hasExpired(heldUntil: Date, now: Date): boolean {
  return heldUntil <= now;
}

/** The time until which a hold taken or renewed at `now` lasts. */
export function leaseUntil(now: Date): Date {
  return new Date(now.getTime() + LEASE_MINUTES * 60_000);
}
