import { type SendMailOptions } from 'nodemailer';
import { describe, expect, it } from 'vitest';
import { Delivery } from '@/models/delivery';
import { ScoreReport } from '@/models/score-report';
import { sendScoreReportBy } from '@/lib/jobs/send-score-report';
import { type HandOff } from '@/lib/mail/transport';
import { type ScoreReportContent } from '@/lib/presenters/score-report';
import { claimDelivery, doubtStaleDeliveries, settleDelivery } from '@/lib/services/hand-over-delivery';
import { messageIdOf } from '@/lib/services/message-id';
import { releaseScores } from '@/lib/services/release-scores';
import { retryDelivery } from '@/lib/services/retry-delivery';
import { actingAs, actingAsSystem } from '../../factories/context';
import { buildMarkedSet, studentAt, type MarkedSet } from '../../factories/marked-set';
import { refusalOf } from '../../factories/refusal';

const now = new Date('2026-12-01T10:00:00Z');
const later = (minutes: number) => new Date(now.getTime() + minutes * 60_000);

async function releasedSet(): Promise<MarkedSet & { delivery: Delivery; report: ScoreReport }> {
  const marked = await buildMarkedSet({ students: 1 });
  await actingAs(
    marked.headTa.user,
    (context) => releaseScores(context, { problemSetId: marked.problemSet.id, reportWaitingParts: false }),
    now,
  );
  const report = await ScoreReport.findOne({ where: { problemSetId: marked.problemSet.id }, rejectOnEmpty: true });
  const delivery = await Delivery.findOne({ where: { scoreReportId: report.id }, rejectOnEmpty: true });
  return { ...marked, report, delivery };
}

/** A mail server that answers as it is told and remembers what it was handed, and in which state the delivery was. */
function server(delivery: Delivery, answer: HandOff | Error) {
  const handed: SendMailOptions[] = [];
  const states: string[] = [];
  return {
    handed,
    states,
    send: async (message: SendMailOptions): Promise<HandOff> => {
      handed.push(message);
      // Read over another connection: what is seen here is committed.
      states.push((await Delivery.findByPk(delivery.id, { rejectOnEmpty: true })).state);
      if (answer instanceof Error) throw answer;
      return answer;
    },
  };
}

const first = { isLastAttempt: false };
const last = { isLastAttempt: true };

describe('the delivery of a report', () => {
  it('is committed as sending before the hand-off, and sent after it, once', async () => {
    const { delivery, report, ...marked } = await releasedSet();
    const mail = server(delivery, { outcome: 'accepted' });
    await sendScoreReportBy(mail.send, { deliveryId: delivery.id }, first);
    await sendScoreReportBy(mail.send, { deliveryId: delivery.id }, first);
    expect(mail.states).toEqual(['sending']);
    expect((await delivery.reload()).state).toBe('sent');
    expect(delivery.attempts).toBe(1);
    expect(mail.handed).toHaveLength(1);
    const student = studentAt(marked);
    expect(mail.handed[0]).toMatchObject({
      messageId: messageIdOf(report.id),
      to: { name: student.name, address: student.email },
    });
  });

  it('goes out once when two workers take it at the same instant', async () => {
    const { delivery } = await releasedSet();
    const mail = server(delivery, { outcome: 'accepted' });
    const claims = await Promise.all([claimDelivery(delivery.id, now), claimDelivery(delivery.id, now)]);
    expect(claims.filter((claim) => claim !== null)).toHaveLength(1);
    expect(mail.handed).toHaveLength(0);
  });

  it('is unconfirmed when a worker dies in the midst of it, is never resent by itself, and a person may send it again', async () => {
    const { delivery, ...marked } = await releasedSet();
    // The worker claims it and dies: nothing settles it.
    const claim = await claimDelivery(delivery.id, now);
    expect(claim?.messageId).toBe(delivery.messageId);
    const mail = server(delivery, { outcome: 'accepted' });
    await sendScoreReportBy(mail.send, { deliveryId: delivery.id }, first);
    await sendScoreReportBy(mail.send, { deliveryId: delivery.id }, first);
    expect(mail.handed).toHaveLength(0);
    expect((await delivery.reload()).state).toBe('unconfirmed');
    expect(delivery.lastError).toContain('may or may not');

    const { messageId } = delivery;
    await refusalOf(
      actingAs(studentAt(marked), (context) => retryDelivery(context, { deliveryId: delivery.id })),
      'forbidden',
    );
    await actingAs(marked.headTa.user, (context) => retryDelivery(context, { deliveryId: delivery.id }));
    expect((await delivery.reload()).state).toBe('waiting');
    await sendScoreReportBy(mail.send, { deliveryId: delivery.id }, first);
    expect((await delivery.reload()).state).toBe('sent');
    expect(mail.handed.map((message) => message.messageId)).toEqual([messageId]);
    await refusalOf(
      actingAs(marked.headTa.user, (context) => retryDelivery(context, { deliveryId: delivery.id })),
      'wrong-state',
    );
  });

  it('is unconfirmed by the clock where no further run of the job comes to find it', async () => {
    const { delivery } = await releasedSet();
    await claimDelivery(delivery.id, now);
    await actingAsSystem(doubtStaleDeliveries, later(14));
    expect((await delivery.reload()).state).toBe('sending');
    expect(await actingAsSystem(doubtStaleDeliveries, later(16))).toBeGreaterThan(0);
    expect((await delivery.reload()).state).toBe('unconfirmed');
  });

  it('takes a late word of the same hand-off, and none of an earlier one after a person has sent it again', async () => {
    const { delivery, ...marked } = await releasedSet();
    const claim = await claimDelivery(delivery.id, now);
    if (claim === null) throw new Error('The delivery was waiting.');
    await actingAsSystem(doubtStaleDeliveries, later(16));
    await actingAs(marked.headTa.user, (context) => retryDelivery(context, { deliveryId: delivery.id }));
    const again = await claimDelivery(delivery.id, later(17));
    await settleDelivery(delivery.id, claim.attempt, { outcome: 'accepted' }, later(18), { mayRetry: true });
    expect((await delivery.reload()).state).toBe('sending');
    await actingAsSystem(doubtStaleDeliveries, later(40));
    await settleDelivery(delivery.id, again?.attempt ?? 0, { outcome: 'accepted' }, later(41), { mayRetry: true });
    expect((await delivery.reload()).state).toBe('sent');
  });

  it('waits again when the server refuses it for now, and has failed at the last try', async () => {
    const { delivery } = await releasedSet();
    const busy = server(delivery, { outcome: 'refused', forNow: true, reason: 'the mail server answered 451' });
    await expect(sendScoreReportBy(busy.send, { deliveryId: delivery.id }, first)).rejects.toThrow('451');
    expect((await delivery.reload()).state).toBe('waiting');
    await sendScoreReportBy(busy.send, { deliveryId: delivery.id }, last);
    expect((await delivery.reload()).state).toBe('failed');
    expect(delivery.lastError).toContain('451');
  });

  it('has failed at once for an address that cannot be mailed to', async () => {
    const { delivery } = await releasedSet();
    const never = server(delivery, { outcome: 'refused', forNow: false, reason: 'the address cannot be mailed to' });
    await sendScoreReportBy(never.send, { deliveryId: delivery.id }, first);
    expect((await delivery.reload()).state).toBe('failed');
  });

  it('is in doubt when the hand-off itself breaks without a word', async () => {
    const { delivery } = await releasedSet();
    const broken = server(delivery, new Error('out of memory'));
    await expect(sendScoreReportBy(broken.send, { deliveryId: delivery.id }, first)).rejects.toThrow('out of memory');
    await sendScoreReportBy(broken.send, { deliveryId: delivery.id }, first);
    expect(broken.handed).toHaveLength(1);
    expect((await delivery.reload()).state).toBe('unconfirmed');
  });

  it('has failed, not been cut short, when its letter cannot be written', async () => {
    const { delivery, report } = await releasedSet();
    const content = report.content as ScoreReportContent;
    await report.update({ content: { ...content, course: { ...content.course, timeZone: 'Nowhere/None' } } });
    const mail = server(delivery, { outcome: 'accepted' });
    await expect(sendScoreReportBy(mail.send, { deliveryId: delivery.id }, first)).rejects.toThrow();
    expect(mail.handed).toHaveLength(0);
    expect((await delivery.reload()).state).toBe('failed');
  });
});
