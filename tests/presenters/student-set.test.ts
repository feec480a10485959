import { describe, expect, it } from 'vitest';
import { defaultSetPolicy } from '@/lib/domain/set-policy';
import { presentStudentSet, type QuestionSource } from '@/lib/presenters/student-set';
import { type AttemptRow } from '@/lib/queries/attempts-of-draws';
import { type OwnSet } from '@/lib/queries/own-set';
import { templateContentSchema } from '@/lib/templates/content';

const now = new Date('2026-12-01T12:00:00Z');

/** A template in which everything a student may not see says so. */
const content = templateContentSchema.parse({
  title: 'A spin in a field',
  prompt: 'With n = {{n}} and $H = {{n}}\\,\\omega S_z$.',
  solution: 'SECRET solution',
  parameters: [
    { type: 'integer', name: 'n', from: 770_001, to: 770_009 },
    { type: 'choice', name: 'hidden', values: ['99887766'] },
  ],
  constraints: ['n > 770000'],
  symbols: [
    { name: 'omega', domain: 'positive' },
    { name: 'theta', domain: { between: ['0', 'pi/88776655'] } },
  ],
  parts: [
    {
      key: 'a',
      prompt: 'Find the energies for n = {{n}}.',
      kind: 'eigenvalues',
      reference: 'eigenvalues(n omega 55443322 S_z)',
      options: { tolerance: { relative: 0.0123456 }, upToPhase: true },
      slips: [{ slip: 'sign', share: 321 }],
      expected: [{ id: 'secret-slip', expression: '77665544 omega', share: 654, sentence: 'SECRET sentence' }],
      weight: 2,
    },
    { key: 'b', prompt: 'Choose.', kind: 'choice', reference: 'yes', options: { choices: ['yes', 'no'] }, weight: 1 },
  ],
});

const question: QuestionSource = { drawId: 'draw-1', points: 9000, content, values: { n: '3', hidden: '99887766' } };

const set: OwnSet = {
  id: 'set-1',
  number: 4,
  title: 'Spin in a field',
  state: 'open',
  opensAt: new Date('2026-11-20T12:00:00Z'),
  closesAt: new Date('2026-12-04T17:00:00Z'),
  appealsUntil: null,
  attemptsAllowed: 3,
  policy: defaultSetPolicy,
  course: {
    id: 'course-1',
    departmentId: 'department-1',
    code: 'PHY 342',
    title: 'Two-level systems',
    term: 'Autumn',
    timeZone: 'Europe/Oslo',
    tasSeeOwnSectionsOnly: false,
    retentionMonths: 24,
    notice: '',
  },
  extendedUntil: null,
  releasedAt: null,
};

function attempt(change: Partial<AttemptRow> = {}): AttemptRow {
  return {
    answerId: 'answer-1',
    drawId: 'draw-1',
    partKey: 'a',
    attempt: 1,
    text: '±3ħω/2',
    stands: true,
    verdict: 'agrees',
    receipt: 'ABCD-EFGH-JKLM',
    submittedAt: new Date('2026-12-01T10:00:00Z'),
    source: 'typed',
    ...change,
  };
}

const present = (change: Partial<OwnSet> = {}, attempts: AttemptRow[] = [attempt()]) =>
  presentStudentSet({ ...set, ...change }, [question], { attempts, saved: [] }, now);

describe('what a student is given', () => {
  it('holds no reference, solution, slip, tolerance, range, constraint, other draw or other person', () => {
    const shown = JSON.stringify(present({ policy: { ...defaultSetPolicy, showVerdictAtOnce: true } }));
    for (const secret of [
      'SECRET',
      '55443322',
      '77665544',
      '99887766',
      '88776655',
      '770001',
      '770000',
      '0.0123456',
      '321',
      '654',
      'secret-slip',
      'reference',
      'solution',
      'evidence',
      'expected',
      'upToPhase',
      'seed',
      'answer-1',
      'department-1',
    ]) {
      expect(shown).not.toContain(secret);
    }
  });

  it('is exactly these fields of a part', () => {
    expect(present().questions[0]?.parts[0]).toEqual({
      key: 'a',
      prompt: 'Find the energies for n = $3$.',
      marks: '6',
      kind: 'eigenvalues',
      reading: { kind: 'eigenvalues', symbols: { omega: 'positive', theta: 'real' }, options: {} },
      attemptsAllowed: 3,
      attemptsLeft: 2,
      handedIn: {
        text: '±3ħω/2',
        attempt: 1,
        receipt: 'ABCD-EFGH-JKLM',
        submittedAt: '2026-12-01T10:00:00.000Z',
        readable: true,
        byStaff: false,
        verdict: null,
      },
      unsent: null,
      revision: 0,
    });
  });

  it('sets the drawn values into prompts, and gives the choices of a choice', () => {
    const [shown] = present().questions;
    expect(shown?.prompt).toContain('n = $3$');
    expect(shown?.prompt).toContain('$H = 3\\,\\omega S_z$');
    expect(shown?.parts[1]?.reading.options).toEqual({ choices: ['yes', 'no'] });
    expect(shown?.parts.map(({ marks }) => marks)).toEqual(['6', '3']);
  });
});

describe('the verdict', () => {
  it('is kept back unless the set tells it at once', () => {
    expect(present().questions[0]?.parts[0]?.handedIn?.verdict).toBeNull();
    const policy = { ...defaultSetPolicy, showVerdictAtOnce: true };
    expect(present({ policy }).questions[0]?.parts[0]?.handedIn?.verdict).toBe('agrees');
    expect(present({ policy }, [attempt({ verdict: null })]).questions[0]?.parts[0]?.handedIn?.verdict).toBe('waiting');
  });
});

describe('attempts and texts', () => {
  it('counts neither unreadable attempts nor those that wait and cannot be read', () => {
    const attempts = [
      attempt({ attempt: 1, stands: false, verdict: 'unreadable', text: '((' }),
      attempt({ attempt: 2, stands: false, verdict: 'differs' }),
      attempt({ attempt: 3, verdict: null, text: '{1, ' }),
    ];
    expect(present({}, attempts).questions[0]?.parts[0]?.attemptsLeft).toBe(2);
  });

  it('tells what was typed and not handed in, and only then', () => {
    const saved = (text: string) => [{ drawId: 'draw-1', partKey: 'a', text, revision: 4, savedAt: now }];
    const partWith = (text: string) =>
      presentStudentSet(set, [question], { attempts: [attempt()], saved: saved(text) }, now).questions[0]?.parts[0];
    expect(partWith('±3ħω/2')).toMatchObject({ unsent: null, revision: 4 });
    expect(partWith('±3ħω')).toMatchObject({ unsent: '±3ħω', revision: 4 });
  });

  it('passes over rows of other draws and parts', () => {
    const rows = [attempt({ drawId: 'draw-2' }), attempt({ partKey: 'b', text: 'no' })];
    expect(present({}, rows).questions[0]?.parts[0]?.handedIn).toBeNull();
    expect(present({}, rows).questions[0]?.parts[1]?.handedIn?.text).toBe('no');
  });
});

describe('the closing time', () => {
  it('is the student’s own', () => {
    const extended = present({ extendedUntil: new Date('2026-12-06T17:00:00Z') });
    expect(extended).toMatchObject({ closesAt: '2026-12-06T17:00:00.000Z', isExtended: true, takesAnswers: true });
    expect(present({ extendedUntil: new Date('2026-12-02T17:00:00Z') })).toMatchObject({ isExtended: false });
    expect(present({ closesAt: now })).toMatchObject({ takesAnswers: false });
  });
});
