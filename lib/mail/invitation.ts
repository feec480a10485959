import { renderLetter, type RenderedLetter } from './letter';

/** The mail that invites a person to Halfmark; its link sets their first password. */
export function invitationMail(input: {
  name: string;
  /** Who invited them, and into what; null where the service itself did. */
  invitedBy: string | null;
  courseNames: readonly string[];
  link: string;
  /** Until when the link works, in words. */
  worksUntil: string;
}): RenderedLetter {
  const who = input.invitedBy === null ? 'You have been given' : `${input.invitedBy} has given you`;
  const where = input.courseNames.length === 0 ? '' : ` for ${listed(input.courseNames)}`;
  return renderLetter({
    subject: `Your Halfmark account${where}`,
    title: `Welcome to Halfmark, ${input.name}`,
    parts: [
      { kind: 'paragraph', text: `${who} an account${where}. Choose a password to begin.` },
      { kind: 'link', label: 'Choose a password', href: input.link },
      {
        kind: 'note',
        text:
          `The link works once, until ${input.worksUntil}. After that, ask for a new one with “Forgotten your ` +
          'password?” on the sign-in page.',
      },
      { kind: 'note', text: 'If you did not expect this, do nothing: without the link nobody can use the account.' },
    ],
  });
}

function listed(names: readonly string[]): string {
  return new Intl.ListFormat('en-GB', { type: 'conjunction' }).format(names);
}
