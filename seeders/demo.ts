import type { Sequelize } from 'sequelize';
import { closeCheckerPool } from '@/lib/jobs/checker-pool';
import { inTransaction } from '@/lib/db/transaction';
import { seededRandom } from '@/lib/templates/seeded-random';
import { appealSome, markSet, releaseSet } from './demo-marking';
import { seedPeople } from './demo-people';
import { answerSet, checkEverything, closeSet, makeSets, publishTemplates } from './demo-work';

const DAY = 24 * 60 * 60 * 1000;

/**
 * Puts the invented course into an empty database: its people; one set released, one closed with its queue half worked,
 * one open. Everything is drawn from a fixed seed, and answers, verdicts, rulings and reports are made by the services
 * that people use. Only the dates move: the open set is open on the day the demo is made.
 */
export async function seedDemo(_database: Sequelize): Promise<void> {
  const random = seededRandom('Wrenfield Institute, PHY 342');
  const today = new Date();
  const daysFromNow = (days: number) => new Date(today.getTime() + days * DAY);
  const people = await inTransaction((transaction) => seedPeople(transaction, random));
  const versions = await publishTemplates(people, daysFromNow(-40));
  const sets = await makeSets(people, versions, daysFromNow);

  await answerSet(people, sets.released, { random, share: 0.95, at: daysFromNow(-22) });
  await answerSet(people, sets.closed, { random, share: 0.92, at: daysFromNow(-4) });
  await answerSet(people, sets.open, { random, share: 0.4, at: daysFromNow(-1) });
  await checkEverything();

  await closeSet(people, sets.released, daysFromNow(-21));
  await markSet(people, sets.released, { random, share: 1, settle: true, from: daysFromNow(-20) });
  await releaseSet(people, sets.released, daysFromNow(-14));
  await appealSome(people, sets.released, daysFromNow(-13));

  await closeSet(people, sets.closed, daysFromNow(-2));
  await markSet(people, sets.closed, { random, share: 0.5, settle: false, from: daysFromNow(-1) });
  await closeCheckerPool();
}
