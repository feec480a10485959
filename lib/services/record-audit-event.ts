import { AuditEvent } from '@/models/audit-event';
import { type ServiceContext } from './context';

/** What happened, as the audit log keeps it. */
export type AuditEntry = {
  /** A verb and a noun in kebab case: `open-set`, `rule-on-answer`. Its words are what the log page shows. */
  action: string;
  /** The course it happened in; null or left out for what concerns the whole service. */
  courseId?: string | null;
  /** The thing it happened to: its kind as the model is called, in kebab case, and its id. */
  subject?: { kind: string; id: string };
  /** What a reader needs beside that: old and new values, counts. Never an answer, a password, a token or an address. */
  details?: Record<string, unknown>;
};

/** Appends who did what to the audit log, in the transaction of the deed itself: both are there or neither. */
export async function recordAuditEvent(context: ServiceContext, entry: AuditEntry): Promise<void> {
  const { actor, now, transaction } = context;
  await AuditEvent.create(
    {
      at: now,
      actorKind: actor.kind,
      actorId: actor.kind === 'user' ? actor.userId : actor.kind === 'token' ? actor.tokenId : null,
      courseId: entry.courseId ?? null,
      action: entry.action,
      subjectKind: entry.subject?.kind ?? null,
      subjectId: entry.subject?.id ?? null,
      details: { ...entry.details, ...(actor.kind === 'system' ? { by: actor.name } : {}) },
    },
    { transaction },
  );
}
