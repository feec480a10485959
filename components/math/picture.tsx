import { type ReactNode, useId } from 'react';

export interface PictureTable {
  readonly head: readonly string[];
  readonly rows: readonly (readonly string[])[];
}

export interface PictureProps {
  /** Caption above the picture and its name for a screen reader. */
  readonly title: string;
  /** What the picture shows, in a sentence. */
  readonly description: string;
  /** Width and height of the drawing in its own units; it shrinks with the page and never grows beyond them. */
  readonly size: readonly [width: number, height: number];
  /** The same figures as words. */
  readonly table: PictureTable;
  /** Whether there is an answer beside the reference, and whether it differs. */
  readonly answer?: 'agrees' | 'differs';
  /** SVG content. */
  readonly children: ReactNode;
}

/** The frame of every picture: caption, drawing with title and description, key, and the table behind it. */
export function Picture({ title, description, size: [width, height], table, answer, children }: PictureProps) {
  const id = useId();
  return (
    <figure className="text-small">
      <figcaption className="mb-1.5 text-note text-grey">{title}</figcaption>
      <svg
        viewBox={`0 0 ${width} ${height}`}
        role="img"
        aria-labelledby={`${id}-title ${id}-description`}
        style={{ maxWidth: width }}
        className="w-full fill-ink font-serif text-[13px]"
      >
        <title id={`${id}-title`}>{title}</title>
        <desc id={`${id}-description`}>{description}</desc>
        {children}
      </svg>
      {answer ? (
        <p className="mt-1 flex gap-x-5 text-note text-grey">
          <Key className="border-grey" words="reference" />
          <Key
            className={`figure-key-answer ${answer === 'agrees' ? 'border-verdigris' : 'border-madder'}`}
            words={`answer, ${answer}`}
          />
        </p>
      ) : null}
      <details className="no-print mt-1 text-note text-grey">
        <summary className="w-fit">As a table</summary>
        <table className="mt-1 border-collapse">
          <thead>
            <tr>
              {table.head.map((word) => (
                <th key={word} scope="col" className="pe-5 text-start font-normal">
                  {word}
                </th>
              ))}
            </tr>
          </thead>
          <tbody className="text-ink">
            {table.rows.map(([name, ...figures]) => (
              <tr key={name} className="border-t border-hairline">
                <th scope="row" className="pe-5 text-start font-normal">
                  {name}
                </th>
                {figures.map((figure, column) => (
                  <td key={table.head[column + 1]} className="pe-5">
                    {figure}
                  </td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      </details>
    </figure>
  );
}

function Key({ className, words }: { className: string; words: string }) {
  return (
    <span className="inline-flex items-center gap-1.5">
      <span aria-hidden="true" className={`inline-block w-4 border-t-[6px] ${className}`} />
      {words}
    </span>
  );
}
