// @vitest-environment happy-dom
import { act, cleanup, fireEvent, render, screen, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { type ActionResult } from '@/app/_server/action-result';
import { KeeperProvider } from '@/app/(student)/work/[setId]/_components/keeper-context';
import { Question } from '@/app/(student)/work/[setId]/_components/question';
import { type StudentPart, type StudentQuestion } from '@/lib/presenters/student-set';
import { type HandInInput, type HandInResult } from '@/lib/services/hand-in-answers';

const refresh = vi.fn();
const handIn = vi.fn<(input: HandInInput) => Promise<ActionResult<HandInResult>>>();

vi.mock('next/navigation', () => ({ useRouter: () => ({ refresh }) }));
vi.mock('@/app/(student)/work/[setId]/actions', () => ({
  handIn: (input: HandInInput) => handIn(input),
  handInForm: vi.fn(),
}));

function part(key: string, change: Partial<StudentPart> = {}): StudentPart {
  return {
    key,
    prompt: `Prompt ${key}`,
    marks: '3',
    kind: 'scalar',
    reading: { kind: 'scalar', symbols: { omega: 'positive' }, options: {} },
    attemptsAllowed: 3,
    attemptsLeft: 3,
    handedIn: null,
    unsent: null,
    revision: 0,
    ...change,
  };
}

const submitted: StudentPart['handedIn'] = {
  text: '2 omega',
  attempt: 1,
  receipt: 'ABCD-EFGH-JKLM',
  submittedAt: '2026-12-01T19:14:00.000Z',
  readable: true,
  byStaff: false,
  verdict: null,
};

function show(parts: StudentPart[], locked: Record<string, string> = {}) {
  const question: StudentQuestion = { drawId: 'draw-1', place: 1, title: 'A question', prompt: '', marks: '9', parts };
  const kept = parts.map(({ key, unsent, handedIn, revision }) => ({
    drawId: 'draw-1',
    partKey: key,
    text: unsent ?? handedIn?.text ?? '',
    revision,
  }));
  return render(
    <KeeperProvider parts={kept} closesAt={null}>
      <Question
        question={question}
        zone="Europe/Oslo"
        head="A question"
        headMargin="9 marks in all."
        prompts={Object.fromEntries(parts.map(({ key, prompt }) => [key, prompt]))}
        choices={Object.fromEntries(parts.map(({ key, reading }) => [key, reading.options.choices ?? []]))}
        locked={locked}
        formKey="6f1f3c7e-5a0e-4a3e-9b55-0f4d8a2f7c11"
      />
    </KeeperProvider>,
  );
}

const row = (key: string) => screen.getByRole('region', { name: `Question 1, part ${key}` });
const field = (key: string) => screen.getByRole('textbox', { name: `Answer to question 1, part ${key}` });
const type = (key: string, value: string) => fireEvent.change(field(key), { target: { value } });
const button = (name: string | RegExp) => screen.getByRole('button', { name });
const press = (name: string | RegExp) =>
  act(async () => {
    fireEvent.click(button(name));
    await Promise.resolve();
  });
const sent = () => handIn.mock.calls.map(([input]) => input);

const ok = (input: HandInInput): ActionResult<HandInResult> => ({
  ok: true,
  value: {
    kind: 'handed-in',
    parts: input.answers.map(({ partKey, text }) => ({
      partKey,
      text,
      attempt: 1,
      attemptsLeft: 2,
      receipt: 'ABCD-EFGH-JKLM',
      submittedAt: submitted.submittedAt,
      revision: 1,
    })),
  },
});

beforeEach(() => {
  localStorage.clear();
  handIn.mockImplementation((input) => Promise.resolve(ok(input)));
  vi.stubGlobal(
    'fetch',
    vi.fn(() => Promise.resolve(Response.json({ kind: 'saved', revision: 1, savedAt: '' }))),
  );
});
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
  vi.clearAllMocks();
});

describe('a question of an open set', () => {
  it('offers to submit a part once something is typed, and submits it alone', async () => {
    show([part('a'), part('b')]);
    expect(screen.queryByRole('button', { name: /Submit/ })).toBeNull();
    type('a', 'omega');
    await press('Submit part a');
    expect(sent()).toEqual([
      {
        drawId: 'draw-1',
        answers: [{ partKey: 'a', text: 'omega' }],
        clientKey: expect.stringMatching(/^[0-9a-f-]{36}$/) as string,
        confirmUnreadable: false,
      },
    ]);
    expect(refresh).toHaveBeenCalledOnce();
  });

  it('does nothing at a second press while the first is on its way', async () => {
    let answer: () => void = () => undefined;
    handIn.mockImplementation((input) => new Promise((resolve) => (answer = () => resolve(ok(input)))));
    show([part('a')]);
    type('a', 'omega');
    await press('Submit part a');
    await press(/Submit part a/);
    expect(handIn).toHaveBeenCalledOnce();
    await act(async () => {
      answer();
      await Promise.resolve();
    });
  });

  it('submits all that is typed and not submitted at once, and leaves the rest', async () => {
    show([part('a'), part('b', { handedIn: submitted, attemptsLeft: 2 }), part('c')]);
    type('a', 'omega');
    type('c', '3 omega');
    expect(screen.getByText(/2 answers to question 1 are typed/)).toBeTruthy();
    await press('Submit question 1');
    expect(sent()[0]?.answers).toEqual([
      { partKey: 'a', text: 'omega' },
      { partKey: 'c', text: '3 omega' },
    ]);
  });

  it('shows what stands when something else is typed over it, and how many attempts there are', () => {
    show([part('a', { handedIn: submitted, attemptsLeft: 2 })]);
    expect(screen.queryByRole('button', { name: /Submit/ })).toBeNull();
    expect(row('a').textContent).toContain('receipt ABCD-EFGH-JKLM');
    expect(row('a').textContent).toContain('attempt 1 of 3');
    type('a', '2 omega + 1');
    expect(row('a').textContent).toContain('Submitted and standing: 2 omega');
    expect(button('Submit part a')).toBeTruthy();
  });

  it('offers choices as choices', async () => {
    const reading: StudentPart['reading'] = { kind: 'choice', symbols: {}, options: { choices: ['yes', 'no'] } };
    show([part('a', { kind: 'choice', reading })]);
    fireEvent.click(screen.getByRole('radio', { name: 'no' }));
    await press('Submit part a');
    expect(sent()[0]?.answers).toEqual([{ partKey: 'a', text: 'no' }]);
  });

  it('shows parts without attempts as they are, and never submits them', async () => {
    show([part('a', { unsent: 'typed', attemptsLeft: 0 }), part('b')], { a: 'None left here.' });
    expect(screen.getByText('None left here.')).toBeTruthy();
    type('b', 'omega');
    expect(screen.queryByRole('button', { name: 'Submit question 1' })).toBeNull();
    await press('Submit part b');
    expect(sent()[0]?.answers).toEqual([{ partKey: 'b', text: 'omega' }]);
  });

  it('says nothing of correctness unless it is told', () => {
    show([part('a', { handedIn: submitted }), part('b', { handedIn: { ...submitted, verdict: 'differs' } })]);
    expect(row('a').textContent).not.toMatch(/agrees|differs|undecided/i);
    expect(within(row('b')).getByText('Differs')).toBeTruthy();
  });
});

describe('an answer that cannot be read', () => {
  const ask: ActionResult<HandInResult> = {
    ok: true,
    value: { kind: 'ask', unreadable: [{ partKey: 'a', message: 'This bracket is not closed. Add ].' }] },
  };

  it('is asked about, and goes to a person when that is confirmed', async () => {
    handIn.mockResolvedValueOnce(ask);
    show([part('a')]);
    type('a', '[1, 2');
    await press('Submit part a');
    const alert = within(row('a')).getByRole('alert');
    expect(alert.textContent).toContain('This bracket is not closed. Add ].');
    expect(document.activeElement).toBe(alert);
    await press(/Submit all the same/);
    expect(sent().map(({ confirmUnreadable }) => confirmUnreadable)).toEqual([false, true]);
    expect(sent()[1]?.answers).toEqual([{ partKey: 'a', text: '[1, 2' }]);
  });

  it('can be mended: the question goes and the field has the focus', async () => {
    handIn.mockResolvedValueOnce(ask);
    show([part('a')]);
    type('a', '[1, 2');
    await press('Submit part a');
    await press('Mend it');
    expect(within(row('a')).queryByRole('alert')).toBeNull();
    expect(document.activeElement).toBe(field('a'));
  });
});

describe('when it fails', () => {
  it('says that the connection was lost, and presses again under the same key', async () => {
    handIn.mockRejectedValueOnce(new TypeError('Failed to fetch'));
    show([part('a')]);
    type('a', 'omega');
    await press('Submit part a');
    expect(within(row('a')).getByRole('alert').textContent).toContain('will be stored once');
    await press('Submit part a');
    const [first, second] = sent();
    expect(second?.clientKey).toBe(first?.clientKey);
    expect(within(row('a')).queryByRole('alert')).toBeNull();
  });

  it('makes another key for another text', async () => {
    handIn.mockRejectedValueOnce(new TypeError('Failed to fetch'));
    show([part('a')]);
    type('a', 'omega');
    await press('Submit part a');
    type('a', '2 omega');
    await press('Submit part a');
    const [first, second] = sent();
    expect(second?.clientKey).not.toBe(first?.clientKey);
  });

  it('leads to signing in when the session has ended, with everything kept', async () => {
    const message = 'Please sign in first.';
    handIn.mockResolvedValueOnce({ ok: false, code: 'signed-out', message, fields: { '': message } });
    show([part('a')]);
    type('a', 'omega');
    await press('Submit part a');
    const alert = within(row('a')).getByRole('alert');
    expect(
      within(alert)
        .getByRole('link', { name: /Sign in/ })
        .getAttribute('target'),
    ).toBe('_blank');
    expect(field('a')).toHaveProperty('value', 'omega');
    expect(localStorage.getItem('halfmark.unsent.draw-1/a')).toContain('omega');
  });

  it('tells a refusal in the server’s words', async () => {
    const message = 'This set is closed and takes no more answers.';
    handIn.mockResolvedValueOnce({ ok: false, code: 'wrong-state', message, fields: { '': message } });
    show([part('a')]);
    type('a', 'omega');
    await press('Submit part a');
    expect(within(row('a')).getByRole('alert').textContent).toContain(message);
  });
});
