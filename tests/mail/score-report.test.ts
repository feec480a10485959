import { describe, expect, it } from 'vitest';
import { scoreReportMail } from '@/lib/mail/score-report';
import { type ReportedPart, type ScoreReportContent } from '@/lib/presenters/score-report';

const part = (overrides: Partial<ReportedPart> = {}): ReportedPart => ({
  key: 'a',
  prompt: 'Find $[S_x, S_y]$.',
  state: 'marked',
  answer: 'i hbar S_z',
  readingLatex: '\\mathrm{i}\\hbar S_z',
  readingPlain: 'i*hbar*S_z',
  verdict: 'agrees',
  slip: null,
  credit: 3000,
  outOf: 3000,
  comment: '',
  markedBy: 'checker',
  followThrough: false,
  appeal: null,
  answerId: 'c6f2a3de-0000-4000-8000-000000000001',
  ...overrides,
});

const content = (parts: ReportedPart[], overrides: Partial<ScoreReportContent> = {}): ScoreReportContent => ({
  course: { code: 'PHY 342', title: 'Two-level systems', timeZone: 'Europe/London', notice: '' },
  set: { number: 2, title: 'Spin in a field' },
  student: 'Noor Applewick',
  items: [{ position: 1, title: 'Commutators', prompt: 'A spin with $n = 3$.', credit: 3000, outOf: 9000, parts }],
  total: { credit: 3000, outOf: 9000, partsWaiting: 0 },
  appeals: { until: '2026-12-22T18:00:00.000Z', mayLower: false },
  changes: [],
  ...overrides,
});

const link = 'http://127.0.0.1:3000/work/0c8f4f43-0000-4000-8000-000000000001/report';

const mailOf = (report: ScoreReportContent, { revision = 1, reason = 'Your scores are released.' } = {}) =>
  scoreReportMail({ content: report, revision, reason, link });

/** The words of both forms, without markup and line breaks, so that one expectation holds for both. */
function wordsOf(mail: { text: string; html: string }): string[] {
  const html = mail.html
    .replace(/<head>.*?<\/head>/s, ' ')
    .replace(/<[^>]+>/g, ' ')
    .replaceAll('&#39;', "'")
    .replaceAll('&quot;', '"')
    .replaceAll('&lt;', '<')
    .replaceAll('&gt;', '>')
    .replaceAll('&amp;', '&');
  return [mail.text, html].map((form) => form.replace(/\s+/g, ' '));
}

describe('the mail of a score report', () => {
  it('says the same in text and HTML: asked, written, read, found, credited', () => {
    const mail = mailOf(
      content([
        part(),
        part({
          key: 'b',
          prompt: 'Find the energies.',
          answer: '{omega}',
          readingPlain: '{omega}',
          verdict: 'differs',
          slip: 'only one of the two values is given',
          credit: 1500,
          comment: 'And the *other* one?',
          markedBy: 'person',
        }),
        part({ key: 'c', state: 'no-answer', answer: null, readingPlain: '', verdict: null, credit: 0 }),
      ]),
    );
    expect(mail.subject).toBe('Score report for PHY 342, set 2: Spin in a field');
    for (const words of wordsOf(mail)) {
      expect(words).toContain('for Noor Applewick');
      expect(words).toContain('Total: 3 of 9 marks.');
      expect(words).toContain('Question 1: Commutators');
      expect(words).toContain('i hbar S_z');
      expect(words).toContain('i*hbar*S_z');
      expect(words).toContain('≡ Agrees: 3 of 3 marks.');
      expect(words).toContain('≢ Differs: 1.5 of 3 marks.');
      expect(words).toContain('Likely slip: only one of the two values is given.');
      expect(words).toContain('No answer: 0 of 3 marks.');
      expect(words).toMatch(/until Tuesday,? 22 December 2026 at 18:00 GMT/);
      expect(words).toContain('it does not lower it');
      expect(words).toContain('you can always ask for a person');
      expect(words).toContain(link);
    }
  });

  it('gives every formula as text, none as markup that needs a stylesheet', () => {
    const mail = mailOf(content([part({ prompt: 'Find $\\frac{\\hbar}{2}$ and $$\\sigma_x$$' })]));
    expect(mail.html).toContain('<code>\\frac{\\hbar}{2}</code>');
    expect(mail.html).not.toMatch(/<math|<svg|katex/i);
    expect(mail.text).toContain('$\\frac{\\hbar}{2}$');
  });

  it('holds nothing remote: no picture, script, style sheet, form or address but its own link', () => {
    const mail = mailOf(
      content([part({ comment: '![x](https://elsewhere.example/a.png) <img src="https://elsewhere.example/b.png">' })]),
    );
    expect(mail.html).not.toMatch(/<(img|script|style|link|form|iframe|object|svg|video|base|meta http-equiv)\b/i);
    expect(mail.html).not.toMatch(/<[^>]*\s(src|srcset|background|on\w+)=|url\(|@import/i);
    const addresses = [...mail.html.matchAll(/\b(?:href|action)="([^"]*)"/g)].map(([, address]) => address);
    expect(new Set(addresses)).toEqual(new Set([link, 'https://elsewhere.example/a.png']));
  });

  it('escapes what people typed, in every place it stands', () => {
    const nasty = '<script>alert("1")</script>&\'';
    const mail = mailOf(
      content([part({ answer: nasty, readingPlain: nasty, slip: nasty, comment: nasty, prompt: nasty })], {
        student: nasty,
        set: { number: 2, title: nasty },
        course: { code: nasty, title: nasty, timeZone: 'UTC', notice: nasty },
      }),
      { reason: nasty },
    );
    expect(mail.html).not.toContain('<script');
    expect(mail.html.match(/&lt;script&gt;/g)?.length).toBeGreaterThan(8);
    expect(mail.text).toContain(nasty);
  });

  it('says what changed in a corrected report, or that no credit did', () => {
    const changed = mailOf(content([part()], { changes: [{ position: 1, key: 'a', before: null, after: 3000 }] }), {
      revision: 2,
      reason: 'A part that was still being marked has been marked.',
    });
    expect(changed.subject).toMatch(/^Corrected score report/);
    for (const words of wordsOf(changed)) {
      expect(words).toContain('Changed since the last report:');
      expect(words).toContain('Question 1, part a: 3 marks, before still being marked');
    }
    const same = mailOf(content([part({ appeal: { outcome: 'kept', sameGrader: true } })]), { revision: 2 });
    for (const words of wordsOf(same)) {
      expect(words).toContain('No credit has changed since the last report.');
      expect(words).toContain('looked at it again and kept the credit');
      expect(words).toContain('The course has no other grader');
    }
  });

  it('tells of a part still being marked neither verdict nor credit, and counts it apart', () => {
    const mail = mailOf(
      content([part({ state: 'waiting', verdict: null, credit: 0, markedBy: null })], {
        total: { credit: 0, outOf: 9000, partsWaiting: 1 },
      }),
    );
    for (const words of wordsOf(mail)) {
      expect(words).toContain('Still being marked (3 marks)');
      expect(words).toContain('with 1 part still being marked and not counted yet');
      expect(words).not.toMatch(/Agrees|Differs/);
    }
  });

  it('says that appeals may lower a credit where they may, and no total where the policy shows none', () => {
    const mail = mailOf(content([part()], { total: null, appeals: { until: null, mayLower: true } }));
    for (const words of wordsOf(mail)) {
      expect(words).toContain('may raise, keep or lower');
      expect(words).not.toContain('Total:');
    }
  });
});
