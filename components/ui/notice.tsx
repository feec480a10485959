import type { ReactNode } from 'react';

export type NoticeTone = 'info' | 'caution' | 'error';

const tones: Record<NoticeTone, { line: string; word: string }> = {
  info: { line: 'border-blue', word: 'Note' },
  caution: { line: 'border-ochre', word: 'Caution' },
  error: { line: 'border-madder', word: 'Not done' },
};

export interface NoticeProps {
  readonly tone?: NoticeTone;
  /** Replaces the tone's own word, which stands first so that colour is never alone. */
  readonly title?: string;
  readonly children: ReactNode;
}

/** Something to know before going on. An error is announced at once. */
export function Notice({ tone = 'info', title, children }: NoticeProps) {
  const { line, word } = tones[tone];
  return (
    <div
      role={tone === 'error' ? 'alert' : 'note'}
      className={`max-w-measure border-l-4 bg-wash px-4 py-2.5 text-small ${line}`}
    >
      <span className="font-semibold">{title ?? word}. </span>
      {children}
    </div>
  );
}
