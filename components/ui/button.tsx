import Link from 'next/link';
import type { ButtonHTMLAttributes, ReactNode } from 'react';

export type ButtonLook = 'primary' | 'quiet' | 'danger' | 'plain';

const shape =
  'no-print inline-flex min-h-10 items-center justify-center gap-2 rounded-leaf border px-4 py-1.5 text-base leading-snug font-semibold no-underline';

const looks: Record<ButtonLook, string> = {
  primary: `${shape} border-blue bg-blue text-on-blue hover:border-ink`,
  quiet: `${shape} border-blue bg-transparent text-blue hover:bg-wash`,
  danger: `${shape} border-madder bg-transparent text-madder hover:bg-madder hover:text-on-madder`,
  plain:
    'no-print inline min-h-6 border-0 bg-transparent p-0 text-blue underline decoration-1 underline-offset-[0.22em] hover:decoration-2',
};

const disabledLook =
  'disabled:cursor-not-allowed disabled:opacity-60 aria-disabled:cursor-progress aria-disabled:opacity-60';

export interface ButtonProps extends ButtonHTMLAttributes<HTMLButtonElement> {
  /** One primary a page; `quiet` for the rest; `danger` for what cannot be undone; `plain` looks like a link. */
  readonly look?: ButtonLook;
  /** Work is under way: the button keeps its focus, says so, and a second press does nothing. */
  readonly pending?: boolean;
  readonly pendingWords?: string;
  readonly children: ReactNode;
}

/** A button. It is of type `button` unless told otherwise, so that it never submits a form by accident. */
export function Button({
  look = 'quiet',
  pending = false,
  pendingWords,
  className = '',
  type = 'button',
  onClick,
  children,
  ...rest
}: ButtonProps) {
  return (
    <button
      {...rest}
      type={pending ? 'button' : type}
      aria-disabled={pending || undefined}
      onClick={pending ? undefined : onClick}
      className={`${looks[look]} ${disabledLook} ${className}`}
    >
      {pending ? (pendingWords ?? children) : children}
      {pending ? <span aria-hidden="true">…</span> : null}
    </button>
  );
}

/** A link that leads to the next step and looks like a button. */
export function ButtonLink({
  look = 'quiet',
  href,
  children,
}: {
  look?: ButtonLook;
  href: string;
  children: ReactNode;
}) {
  return (
    <Link href={href} className={looks[look]}>
      {children}
    </Link>
  );
}
