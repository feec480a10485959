/** The name of a part's answer in the form of its question. */
export function answerName(partKey: string): string {
  return `answer.${partKey}`;
}

/** The name of the hidden field with the revision a part was saved under. */
export function revisionName(partKey: string): string {
  return `revision.${partKey}`;
}

/** What a button of the form asks for: one part or all of them, and whether unreadable answers go to a person. */
export interface Press {
  /** The letter of a part, or `all`. */
  readonly part: string;
  readonly confirmUnreadable: boolean;
}

/** The value of the button named `press`. */
export function pressValue({ part, confirmUnreadable }: Press): string {
  return confirmUnreadable ? `${part}:unreadable` : part;
}

export function readPress(value: string): Press {
  const [part = 'all', word] = value.split(':');
  return { part, confirmUnreadable: word === 'unreadable' };
}

/** The bare form as inputs of the services, not yet validated. */
export function readHandInForm(form: FormData): {
  drafts: { drawId: string; partKey: string; text: string; baseRevision: number }[];
  handIn: Record<string, unknown>;
} {
  const drawId = textOf(form, 'drawId');
  const press = readPress(textOf(form, 'press'));
  const drafts = [...form.keys()]
    .filter((name) => name.startsWith('answer.'))
    .map((name) => name.slice('answer.'.length))
    .map((partKey) => ({
      drawId,
      partKey,
      // A form sends line ends as CRLF, whatever was typed.
      text: textOf(form, answerName(partKey)).replaceAll('\r\n', '\n'),
      baseRevision: Number(textOf(form, revisionName(partKey)) || 0),
    }));
  const asked = drafts.filter(({ partKey }) => press.part === 'all' || press.part === partKey);
  return {
    drafts,
    handIn: {
      drawId,
      clientKey: textOf(form, 'clientKey'),
      confirmUnreadable: press.confirmUnreadable,
      answers: asked.map(({ partKey, text }) => ({ partKey, text })),
    },
  };
}

function textOf(form: FormData, name: string): string {
  const value = form.get(name);
  return typeof value === 'string' ? value : '';
}
