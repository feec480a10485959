import { check, compute, read } from '@/lib/checker/index';
import type { CheckOutcome, CheckRequest } from '@/lib/checker/contract';

/** What a checker thread gives back for one request; texts are empty where there is nothing to show. */
export type ThreadResult = {
  requestId: string;
  outcome: CheckOutcome;
  readingPlain: string;
  referenceLatex: string;
};

/** Checks requests one after another, in a thread that can be ended. */
export default function checkAll(requests: readonly CheckRequest[]): ThreadResult[] {
  return requests.map((request) => {
    const computed = compute(request);
    return {
      requestId: request.id,
      outcome: check(request, { now: () => performance.now() }),
      readingPlain: read(request.answer, {
        kind: request.kind,
        symbols: request.symbols ?? {},
        options: request.options,
      }).plain,
      referenceLatex: computed.ok ? computed.latex : '',
    };
  });
}
