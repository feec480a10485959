import Link from 'next/link';
import { LinkPending } from '@/components/ui/link-pending';
import { Section } from '@/components/ui/script-page';
import { TimeStamp } from '@/components/ui/time-stamp';
import { paths } from '@/lib/paths';
import { type OwnSetLine } from '@/lib/presenters/own-sets';

/**
 * The sets in one state, a row each, how much is submitted in the margin; nothing where there are none. The links are not
 * fetched beforehand: opening a set is what draws its questions.
 */
export function SetLines({ heading, lines }: { heading: string; lines: readonly OwnSetLine[] }) {
  return lines.map((line, index) => (
    <Section key={line.setId} label={line.name} margin={<Progress line={line} />}>
      {index === 0 ? <h2 className="mb-3">{heading}</h2> : null}
      <p className="text-small text-grey">
        {line.course.code} · {line.course.title}
      </p>
      <p className="text-lead font-semibold">
        <Link href={paths.workSet(line.setId)} prefetch={false}>
          {line.name}
          <LinkPending />
        </Link>
      </p>
      <p className="mt-0.5 text-small text-grey">
        <Closing line={line} />
      </p>
      {line.state === 'released' ? (
        <p className="mt-1.5">
          <Link href={paths.workReport(line.setId)} prefetch={false}>
            Read the score report
            <LinkPending />
          </Link>
        </p>
      ) : null}
    </Section>
  ));
}

function Closing({ line }: { line: OwnSetLine }) {
  if (line.closesAt === null) return line.state === 'open' ? 'has no closing time' : 'closed';
  return (
    <>
      {line.state === 'open' ? 'closes' : 'closed'} <TimeStamp at={line.closesAt} zone={line.course.timeZone} />
      {line.isExtended ? ', extended for you' : null}
    </>
  );
}

function Progress({ line }: { line: OwnSetLine }) {
  const isAll = line.partsHandedIn === line.parts;
  return (
    <p>
      <span className="text-mark font-semibold">{line.partsHandedIn}</span>{' '}
      <span className="text-small text-grey">
        of {line.parts} {line.parts === 1 ? 'part' : 'parts'} submitted
        {line.state === 'open' && isAll ? ', all done' : null}
      </span>
    </p>
  );
}
