import { signLink } from '@/lib/auth/link-token';
import { environment } from '@/lib/env';
import { invitationMail } from '@/lib/mail/invitation';
import { type RenderedLetter } from '@/lib/mail/letter';
import { passwordResetMail } from '@/lib/mail/password-reset';
import { handOff, type HandOffMail } from '@/lib/mail/transport';
import { absolute, paths } from '@/lib/paths';
import { accountMailOf, type AccountMail } from '@/lib/queries/account-mail';
import { type JobHandler } from './job-handler';

/**
 * Mails the link of an invitation or of a forgotten password. A link that was used, replaced or has run out is passed
 * over. Unlike a score report this mail may come twice (its link works once), so a hand-off cut short is tried again.
 */
export const sendAccountMail: JobHandler<'send-account-mail'> = (payload) =>
  sendAccountMailBy(handOff, payload, new Date());

/** The same with a mail server and a clock of the caller's. */
export async function sendAccountMailBy(
  send: HandOffMail,
  { linkTokenId }: { linkTokenId: string },
  now: Date,
): Promise<void> {
  const mail = await accountMailOf(linkTokenId, now);
  if (mail === null) return;
  const { appUrl } = environment();
  const result = await send({
    ...letterFor(mail, appUrl, linkTokenId),
    to: { name: mail.name, address: mail.email },
    messageId: `<link.${linkTokenId}@${new URL(appUrl).hostname}>`,
  });
  if (result.outcome !== 'accepted') throw new Error(`The mail was not taken: ${result.reason}.`);
}

function letterFor(mail: AccountMail, appUrl: string, linkTokenId: string): RenderedLetter {
  const token = signLink(mail.purpose, linkTokenId, environment().sessionSecret);
  const path = mail.purpose === 'invitation' ? paths.invitation(token) : paths.newPassword(token);
  const link = absolute(appUrl, path);
  const worksUntil = inWords(mail.expiresAt, mail.timeZone);
  return mail.purpose === 'invitation'
    ? invitationMail({ ...mail, link, worksUntil })
    : passwordResetMail({ ...mail, link, worksUntil });
}

/** "Tuesday 15 December, 10:00 GMT": a moment with the zone it is told in. */
function inWords(at: Date, timeZone: string): string {
  return new Intl.DateTimeFormat('en-GB', {
    weekday: 'long',
    day: 'numeric',
    month: 'long',
    hour: '2-digit',
    minute: '2-digit',
    timeZone,
    timeZoneName: 'short',
  })
    .format(at)
    .replace(' at ', ', ');
}
