import { renderLetter, type RenderedLetter } from './letter';

/** The mail with which a person who forgot their password sets a new one. */
export function passwordResetMail(input: { name: string; link: string; worksUntil: string }): RenderedLetter {
  return renderLetter({
    subject: 'A new password for Halfmark',
    title: 'Choose a new password',
    parts: [
      {
        kind: 'paragraph',
        text: `Hello ${input.name}, someone asked for a new password for your Halfmark account with this address.`,
      },
      { kind: 'link', label: 'Choose a new password', href: input.link },
      {
        kind: 'note',
        text: `The link works once, until ${input.worksUntil}. Setting a new password signs you out everywhere else.`,
      },
      { kind: 'note', text: 'If it was not you, do nothing: your password stays as it is.' },
    ],
  });
}
