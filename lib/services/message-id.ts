import { environment } from '@/lib/env';

/** The Message-ID of a report's mail: always the same for the same report, so that a mail server can tell a repeat. */
export function messageIdOf(scoreReportId: string): string {
  return `<score-report.${scoreReportId}@${new URL(environment().appUrl).hostname}>`;
}
