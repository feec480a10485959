import { formatCredit } from '@/lib/domain/credit';
import { verdictSigns } from '@/lib/domain/verdict';
import {
  appealInWords,
  appealRuleInWords,
  changeInWords,
  reportCaution,
  slipAsSentence,
} from '@/lib/presenters/report-words';
import type { ReportedItem, ReportedPart, ScoreReportContent } from '@/lib/presenters/score-report';
import { renderLetter, type LetterPart, type RenderedLetter } from './letter';

/** A score report to be mailed: its revision (1 is the first), why it is sent, and where its page is. */
export type ScoreReportLetter = { content: ScoreReportContent; revision: number; reason: string; link: string };

/**
 * The mail of a score report: part by part what was asked, typed, read, found and credited. Formulas stand as typed
 * text: a mail reader that drops MathML's elements and keeps their text would show ħ/2 as ħ2.
 */
export function scoreReportMail({ content, revision, reason, link }: ScoreReportLetter): RenderedLetter {
  const { course, set } = content;
  const name = `${course.code}, set ${set.number}: ${set.title}`;
  const isFirst = revision === 1;
  return renderLetter({
    subject: isFirst ? `Score report for ${name}` : `Corrected score report for ${name}`,
    title: `${isFirst ? 'Score report' : 'Corrected score report'} for set ${set.number}, ${set.title}`,
    parts: [
      { kind: 'note', text: `${course.code} ${course.title}, for ${content.student}` },
      { kind: 'paragraph', text: reason },
      ...changesOf(content, isFirst),
      ...totalLine(content),
      { kind: 'link', label: 'Read the report with its formulas typeset', href: link },
      ...content.items.flatMap(itemParts),
      ...closing(content),
    ],
  });
}

function changesOf({ changes }: ScoreReportContent, isFirst: boolean): LetterPart[] {
  if (isFirst) return [];
  if (changes.length === 0) return [{ kind: 'strong', text: 'No credit has changed since the last report.' }];
  return [
    { kind: 'strong', text: 'Changed since the last report:' },
    { kind: 'list', lines: changes.map(changeInWords) },
  ];
}

function totalLine({ total }: ScoreReportContent): LetterPart[] {
  if (total === null) return [];
  const { partsWaiting } = total;
  const waiting =
    partsWaiting === 0
      ? ''
      : `, with ${partsWaiting} ${partsWaiting === 1 ? 'part' : 'parts'} still being marked and not counted yet`;
  return [
    { kind: 'strong', text: `Total: ${formatCredit(total.credit)} of ${formatCredit(total.outOf)} marks${waiting}.` },
  ];
}

function itemParts(item: ReportedItem): LetterPart[] {
  const heading: LetterPart = { kind: 'heading', text: `Question ${item.position}: ${item.title}` };
  if (item.prompt === '') {
    return [
      heading,
      { kind: 'paragraph', text: `You did not open this question: 0 of ${formatCredit(item.outOf)} marks.` },
    ];
  }
  return [heading, { kind: 'markdown', source: item.prompt }, ...item.parts.flatMap(partLines)];
}

function partLines(part: ReportedPart): LetterPart[] {
  const asked: LetterPart[] = [
    { kind: 'subheading', text: `Part ${part.key}` },
    { kind: 'markdown', source: part.prompt },
    ...(part.answer === null ? [] : [{ kind: 'typed' as const, label: 'You wrote', text: part.answer }]),
    ...(part.readingPlain === ''
      ? []
      : [{ kind: 'labelled' as const, label: 'Read as, in words', text: part.readingPlain }]),
  ];
  const outOf = formatCredit(part.outOf);
  switch (part.state) {
    case 'no-answer':
      return [...asked, { kind: 'strong', text: `No answer: 0 of ${outOf} marks.` }];
    case 'waiting':
      return [
        ...asked,
        { kind: 'strong', text: `Still being marked (${outOf} marks). You get a corrected report when it is.` },
      ];
    case 'marked':
      return [...asked, { kind: 'strong', text: markedLine(part, outOf) }, ...remarks(part)];
  }
}

function markedLine({ verdict, credit }: ReportedPart, outOf: string): string {
  const found = verdict === null ? '' : `${verdictSigns[verdict].sign} ${verdictSigns[verdict].word}: `;
  return `${found}${formatCredit(credit)} of ${outOf} marks.`;
}

function remarks({ slip, followThrough, comment, appeal, markedBy }: ReportedPart): LetterPart[] {
  return [
    ...(slip === null ? [] : [{ kind: 'paragraph' as const, text: slipAsSentence(slip) }]),
    ...(followThrough
      ? [{ kind: 'paragraph' as const, text: 'Right given your own earlier answer, which this part builds on.' }]
      : []),
    ...(appeal ? [{ kind: 'paragraph' as const, text: appealInWords(appeal) }] : []),
    ...(comment === '' ? [] : [{ kind: 'markdown' as const, label: 'The grader’s comment', source: comment }]),
    ...(markedBy === 'checker' ? [{ kind: 'note' as const, text: 'Marked by the checker.' }] : []),
  ];
}

function closing({ course, appeals }: ScoreReportContent): LetterPart[] {
  const until = appeals.until === null ? '' : ` until ${momentIn(course.timeZone, appeals.until)}`;
  return [
    { kind: 'heading', text: 'If you think a part is marked wrongly' },
    {
      kind: 'paragraph',
      text: `You can appeal each part once on the report’s page${until}; say why, and a person looks at it again. ${appealRuleInWords(appeals.mayLower)}`,
    },
    ...(course.notice.trim() === ''
      ? []
      : [{ kind: 'markdown' as const, label: 'A notice from your course', source: course.notice }]),
    { kind: 'note', text: reportCaution },
  ];
}

/** "Friday, 4 December 2026 at 18:00 GMT", in the course's own zone. */
function momentIn(zone: string, instant: string): string {
  return new Intl.DateTimeFormat('en-GB', {
    weekday: 'long',
    day: 'numeric',
    month: 'long',
    year: 'numeric',
    hour: '2-digit',
    minute: '2-digit',
    timeZoneName: 'short',
    timeZone: zone,
  }).format(new Date(instant));
}
