import type { DeliveryState } from '@/models/delivery';

/** What became of a report's e-mail, in words. */
export const deliveryWords: Record<DeliveryState, string> = {
  waiting: 'waiting',
  sending: 'sending',
  sent: 'sent',
  unconfirmed: 'unconfirmed',
  failed: 'failed',
};

/** Whether a delivery will go on by itself, so that a page about it looks again. */
export function isUnderWay(state: DeliveryState): boolean {
  return state === 'waiting' || state === 'sending';
}

/** Whether a delivery waits for a person to send it again or leave it. */
export function needsPerson(state: DeliveryState): boolean {
  return state === 'failed' || state === 'unconfirmed';
}
