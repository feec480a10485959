import { Graph } from '../algebra/graph';
import { type CheckOutcome, type CheckRequest, type CheckResponse, type Evidence } from '../contract';
import { type Diagnostic } from '../diagnostics';
import { seedOf } from '../equivalence/random';
import { type AnswerTree, type ParseResult, type QuantityNode, type ReadingContext } from '../notation/answer-tree';
import { parse } from '../notation/parse';
import { printLatex } from '../notation/print-latex';
import { kinKeyOf, unreadableKinKey } from '../slips/kin-key';
import { findSlips } from '../slips/find-slips';
import { type AnswerValue, answerValue } from './answer-value';
import { compareValues } from './compare';
import { compareQuantities, realValue } from './compare-quantity';
import { type Comparison, type Context } from './comparison';
import { isEvaluated } from './form';
import { messageOf } from './messages';
import { BadRequest, type Failure, failureOf, prepare } from './prepare';
import { isHermitian, isUnitary } from './properties';
import { compareWithin } from './tolerance';

type Answered = Omit<CheckResponse, 'id' | 'ms'>;

/** Decides a valid request. Never throws; the time is filled in by the door. */
export function decide(request: CheckRequest): CheckOutcome {
  try {
    const outcome = request.kind === 'choice' ? decideChoice(request) : decideExpression(request);
    return 'error' in outcome ? { id: request.id, error: outcome.error } : { id: request.id, ...outcome, ms: 0 };
  } catch (error) {
    if (error instanceof BadRequest) return { id: request.id, error: error.message };
    const failure = failureOf(error);
    return { id: request.id, ...undecided('', failure.message, null), ms: 0 };
  }
}

function readingContext(request: CheckRequest, forReference: boolean): ReadingContext {
  const { kind, options, symbols = {} } = request;
  return { kind, symbols, options, allowReferenceFunctions: forReference };
}

function decideChoice(request: CheckRequest): Answered | { error: string } {
  const context = readingContext(request, false);
  const wanted = parse(request.reference, context).tree;
  if (wanted?.node !== 'choice') return { error: 'The reference is not one of the choices.' };
  const { tree, diagnostics } = parse(request.answer, context);
  if (tree?.node !== 'choice') return unreadable(request.answer, diagnostics[0]);
  const agrees = tree.choice === wanted.choice;
  return {
    verdict: agrees ? 'agrees' : 'differs',
    slip: null,
    slips: [],
    kinKey: agrees ? null : `choice:${tree.choice}`,
    reading: printLatex(tree),
    message: agrees ? 'This is the choice asked for.' : 'This is another choice.',
    evidence: { test: 'text' },
  };
}

function decideExpression(request: CheckRequest): Answered | { error: string } {
  const reference = parse(request.reference, readingContext(request, true));
  if (!reference.tree) {
    const [problem] = reference.diagnostics;
    return { error: `The reference cannot be read: ${problem?.message ?? 'it is empty.'}` };
  }
  const answer = parse(request.answer, readingContext(request, false));
  const context = prepare(request.symbols, request.options, seedOf(request.kind, request.reference, request.answer));
  try {
    return decideIn(request, context, reference.tree, answer);
  } finally {
    Graph.release(context.environment.g);
  }
}

function decideIn(
  request: CheckRequest,
  context: Context,
  referenceTree: AnswerTree,
  answer: ParseResult,
): Answered | { error: string } {
  if (request.kind === 'quantity') return decideQuantity(request, context, referenceTree, answer);
  let wanted: AnswerValue;
  try {
    wanted = answerValue(context.environment, request.kind, referenceTree);
  } catch (error) {
    const failure = failureOf(error);
    if (failure.type === 'budget') return undecided('', failure.message, null);
    return { error: `The reference has no value: ${failure.message}.` };
  }
  const refused = refuseReference(request, context, wanted);
  if (refused !== null) return { error: refused };
  if (!answer.tree) return unreadable(request.answer, answer.diagnostics[0]);
  return decideAnswer(request, context, referenceTree, wanted, answer, answer.tree);
}

function refuseReference(request: CheckRequest, context: Context, wanted: AnswerValue): string | null {
  if (wanted.kind === 'eigenvalues' && wanted.values.length !== 2) return 'The reference must have two values.';
  if (wanted.kind === 'eigenpairs' && wanted.pairs.length !== 2) return 'The reference must have two pairs.';
  const { g } = context.environment;
  if (request.options?.tolerance?.relative !== undefined && wanted.kind === 'scalar' && wanted.node === g.zero) {
    return 'A relative tolerance needs a reference that is not zero.';
  }
  return null;
}

function decideAnswer(
  request: CheckRequest,
  context: Context,
  referenceTree: AnswerTree,
  wanted: AnswerValue,
  answer: ParseResult,
  tree: AnswerTree,
): Answered {
  const reading = printLatex(tree);
  const form =
    request.options?.answerForm === 'evaluated' ? (isEvaluated(tree) ? 'evaluated' : 'not evaluated') : undefined;
  let given: AnswerValue;
  let compared: Comparison;
  try {
    given = answerValue(context.environment, request.kind, tree);
    compared = compareTo(context, wanted, given);
  } catch (error) {
    const failure = failureOf(error);
    if (failure.type !== 'nowhere') return undecided(reading, failure.message, form ?? null);
    return unreadable(request.answer, nowhere(failure, request.answer));
  }
  const evidence: Evidence = { ...compared.evidence(), ...(form && { form }), ...properties(context, given) };
  if (compared.verdict === 'undecided') return undecided(reading, evidence.reason ?? '', null, evidence);
  if (compared.verdict === 'agrees') {
    return {
      verdict: 'agrees',
      slip: null,
      slips: [],
      kinKey: null,
      reading,
      message: messageOf('agrees', evidence),
      evidence,
    };
  }
  if (answer.ambiguous && anotherReadingAgrees(request, context, wanted, answer)) {
    return undecided(reading, 'ambiguous notation', form ?? null);
  }
  const { slips, kinKey } = explain(request, context, referenceTree, wanted, tree, given, compared);
  const message = compared.message ?? messageOf('differs', evidence, slips[0]);
  return { verdict: 'differs', slip: slips[0] ?? null, slips, kinKey, reading, message, evidence };
}

/** Naming the mistake may use up the work limit; the verdict stands. */
function explain(
  request: CheckRequest,
  context: Context,
  referenceTree: AnswerTree,
  wanted: AnswerValue,
  tree: AnswerTree,
  given: AnswerValue,
  compared: Comparison,
): { slips: readonly string[]; kinKey: string | null } {
  let slips: readonly string[] = [];
  try {
    const compare = (x: AnswerValue, y: AnswerValue): boolean => compareTo(context, x, y).verdict === 'agrees';
    const point = compared.point ?? context.points.at(0);
    const trial = { request, context, referenceTree, reference: wanted, answerTree: tree, answer: given, compare };
    if (point) slips = findSlips({ ...trial, point });
    return { slips, kinKey: kinKeyOf(context, wanted, given, slips, compare) };
  } catch (error) {
    failureOf(error);
    return { slips, kinKey: slips[0] === undefined ? null : `slip:${slips[0]}` };
  }
}

/** Exactly, or within the tolerance the caller gives. */
function compareTo(context: Context, wanted: AnswerValue, given: AnswerValue): Comparison {
  const { tolerance } = context.options;
  return tolerance ? compareWithin(context, tolerance, wanted, given) : compareValues(context, wanted, given);
}

function anotherReadingAgrees(
  request: CheckRequest,
  context: Context,
  wanted: AnswerValue,
  answer: ParseResult,
): boolean {
  return answer.alternatives.some((tree) => {
    try {
      return compareTo(context, wanted, answerValue(context.environment, request.kind, tree)).verdict === 'agrees';
    } catch (error) {
      failureOf(error);
      return false;
    }
  });
}

function properties(context: Context, given: AnswerValue): Pick<Evidence, 'hermitian' | 'unitary'> {
  const { reportHermitian, reportUnitary } = context.options;
  if ((!reportHermitian && !reportUnitary) || (given.kind !== 'operator' && given.kind !== 'pauli')) return {};
  return {
    ...(reportHermitian && { hermitian: isHermitian(context, given.matrix) }),
    ...(reportUnitary && { unitary: isUnitary(context, given.matrix) }),
  };
}

function decideQuantity(
  request: CheckRequest,
  context: Context,
  referenceTree: AnswerTree,
  answer: ParseResult,
): Answered | { error: string } {
  if (referenceTree.node !== 'quantity') return { error: 'The reference is not a quantity.' };
  const wanted: QuantityNode = referenceTree;
  const size = realValue(context.environment, wanted);
  if (size === null) return { error: 'The reference has no real value.' };
  if (size === 0 && (request.options?.tolerance?.relative !== undefined || !request.options?.tolerance)) {
    return { error: 'A relative tolerance needs a reference that is not zero.' };
  }
  if (answer.tree?.node !== 'quantity') return unreadable(request.answer, answer.diagnostics[0]);
  const reading = printLatex(answer.tree);
  try {
    const { tolerance } = request.options ?? {};
    const compared = compareQuantities(context.environment, tolerance, wanted, answer.tree);
    const evidence = compared.evidence();
    if (compared.verdict === 'undecided') return undecided(reading, evidence.reason ?? '', null, evidence);
    if (compared.verdict === 'differs' && answer.ambiguous) {
      const other = answer.alternatives.some(
        (tree) =>
          tree.node === 'quantity' &&
          compareQuantities(context.environment, tolerance, wanted, tree).verdict === 'agrees',
      );
      if (other) return undecided(reading, 'ambiguous notation', null);
    }
    const { verdict, slips } = compared;
    const slip = slips[0] ?? null;
    const message = compared.message ?? messageOf(verdict, evidence, slip ?? undefined);
    return { verdict, slip, slips, kinKey: slip && `slip:${slip}`, reading, message, evidence };
  } catch (error) {
    const failure = failureOf(error);
    if (failure.type !== 'nowhere') return undecided(reading, failure.message, null);
    return unreadable(request.answer, nowhere(failure, request.answer));
  }
}

function nowhere(failure: Failure, text: string): Diagnostic {
  return {
    code: 'division-by-zero',
    span: { start: 0, end: [...text].length },
    message: `This is defined nowhere: ${failure.message}.`,
  };
}

function unreadable(text: string, diagnostic: Diagnostic | undefined): Answered {
  const message = diagnostic?.message ?? 'The answer cannot be read.';
  const hint = diagnostic?.hint === undefined ? '' : ` ${diagnostic.hint}`;
  const evidence: Evidence = {
    test: 'reading',
    reason: message,
    ...(diagnostic && { code: diagnostic.code, span: [diagnostic.span.start, diagnostic.span.end] as const }),
  };
  return {
    verdict: 'unreadable',
    slip: null,
    slips: [],
    kinKey: unreadableKinKey(text),
    reading: '',
    message: message + hint,
    evidence,
  };
}

function undecided(
  reading: string,
  reason: string,
  form: Evidence['form'] | null,
  evidence: Evidence = { test: 'none', reason, ...(form && { form }) },
): Answered {
  return {
    verdict: 'undecided',
    slip: null,
    slips: [],
    kinKey: null,
    reading,
    message: `A person has to decide: ${reason}.`,
    evidence,
  };
}
