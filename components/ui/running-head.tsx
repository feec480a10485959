import Link from 'next/link';
import { Fragment, type ReactNode } from 'react';
import { NavLine, type NavItem } from './nav-line';
import { WordmarkSign } from './wordmark';

/** A step of the place: its words, and where they lead when they lead anywhere. */
export interface HeadStep {
  readonly label: string;
  readonly href?: string;
}

export interface RunningHeadProps {
  /** Course and set, outermost first, e.g. `[{label: 'PHY 342', href: …}, {label: 'Set 4, Spin in a field'}]`. */
  readonly steps?: readonly HeadStep[];
  /** The page itself, set bold. */
  readonly place: string;
  /** Right side: what a person wants to know at a glance ("item 15 · 42 waiting"). */
  readonly status?: ReactNode;
  /** The line of words below the head. */
  readonly nav?: readonly NavItem[];
  /** Right end of that line: who is signed in, and the way out. */
  readonly account?: ReactNode;
  readonly home?: string;
}

/** The running head of every page, as in a book: course, set and place, with the pages of the course as a line of words. */
export function RunningHead({ steps = [], place, status, nav = [], account, home = '/' }: RunningHeadProps) {
  return (
    <header className="running-head px-(--gutter) print:px-0">
      <div className="flex flex-col gap-x-6 gap-y-1 pt-4 pb-3 sm:grid sm:grid-cols-[1fr_auto] sm:items-baseline lg:grid-cols-[1fr_auto_1fr]">
        <Link
          href={home}
          className="inline-flex items-center gap-2.5 justify-self-start py-0.5 font-semibold text-ink no-underline"
        >
          <WordmarkSign />
          Halfmark
        </Link>
        <nav
          aria-label="Place"
          className="text-small text-grey sm:order-last sm:col-span-2 lg:order-none lg:col-span-1"
        >
          {steps.map((step) => (
            <Fragment key={step.label}>
              {step.href ? (
                <Link href={step.href} className="text-grey hover:text-blue">
                  {step.label}
                </Link>
              ) : (
                step.label
              )}
              <span aria-hidden="true"> · </span>
            </Fragment>
          ))}
          <strong aria-current="page" className="font-semibold text-ink">
            {place}
          </strong>
        </nav>
        <div className="text-small text-grey sm:text-end">{status}</div>
      </div>
      {nav.length > 0 || account ? (
        <div className="no-print flex flex-wrap items-baseline justify-between gap-x-8 gap-y-1 pb-2 text-small">
          <NavLine items={nav} label="Pages" />
          {account ? <div className="text-grey">{account}</div> : null}
        </div>
      ) : null}
    </header>
  );
}
