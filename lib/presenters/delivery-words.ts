import type { DeliveryState } from '@/models/delivery';

/** What became of a report's e-mail, in words. */
export const deliveryWords: Record<DeliveryState, string> = {
  waiting: 'waiting to be sent',
  sending: 'being handed over',
  sent: 'taken by the mail server',
  unconfirmed: 'cut short, may have gone out',
  failed: 'not sent',
};

/** Whether a delivery will go on by itself, so that a page about it looks again. */
export function isUnderWay(state: DeliveryState): boolean {
  return state === 'waiting' || state === 'sending';
}

/** Whether a delivery waits for a person to send it again or leave it. */
export function needsPerson(state: DeliveryState): boolean {
  return state === 'failed' || state === 'unconfirmed';
}
