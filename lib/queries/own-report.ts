import { type PersonActor } from '@/lib/domain/actor';
import { decide, requireAllowed } from '@/lib/policies/decide';
import {
  appealsOf,
  issuedReports,
  witnessesOf,
  type IssuedReport,
  type OwnAppeal,
  type ReportedWitness,
} from './issued-reports';
import { ownSet, type OwnSet } from './own-set';

/** What a student may see of their scores: nothing but the set before release, when `reports` is empty. */
export type OwnReport = {
  set: OwnSet;
  reports: IssuedReport[];
  appeals: OwnAppeal[];
  witnesses: ReportedWitness[];
};

/**
 * A student's own report on a set, with appeals and witnesses. Nothing of it is read before the student's scores are
 * released.
 *
 * @throws HalfmarkError `not-found` or `forbidden` for everybody but a student of the course
 */
export async function ownReport(actor: PersonActor, problemSetId: string): Promise<OwnReport> {
  const whose = { problemSetId, userId: actor.userId };
  const set = await ownSet(actor, whose);
  requireAllowed(decide(actor, 'appeal-own-part', set.course));
  if (set.releasedAt === null) return { set, reports: [], appeals: [], witnesses: [] };
  const [reports, appeals, witnesses] = await Promise.all([issuedReports(whose), appealsOf(whose), witnessesOf(whose)]);
  return { set, reports, appeals, witnesses };
}
