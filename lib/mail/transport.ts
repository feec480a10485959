import { createTransport, type SendMailOptions, type Transporter } from 'nodemailer';
import { environment } from '@/lib/env';

/** Patience with a mail server, in milliseconds: a job that hangs would hold up the others. */
const patience = { connectionTimeout: 10_000, greetingTimeout: 10_000, socketTimeout: 30_000 };

let shared: Transporter | undefined;

/**
 * The connection to the mail server that SMTP_URL names. In `npm start` without SMTP_URL that is the local sink.
 *
 * @throws Error where no mail server is set
 */
export function mailTransport(): Transporter {
  const { smtpUrl } = environment();
  if (smtpUrl === null) throw new Error('No mail can be sent: SMTP_URL is not set.');
  // Mail is made from our own text alone: it may neither read files nor fetch addresses.
  shared ??= createTransport({ url: smtpUrl, disableFileAccess: true, disableUrlAccess: true, ...patience });
  return shared;
}

/** What a mail server answered. */
export type HandOff =
  | { outcome: 'accepted' }
  /** The server said no, for good (5xx) or for now (4xx), before it took the message. */
  | { outcome: 'refused'; forNow: boolean; reason: string }
  /** The message may or may not have been taken: it must not be sent again by itself. */
  | { outcome: 'unknown'; reason: string };

/**
 * Hands one message to the mail server.
 *
 * Where the connection fails before the message was offered, the server has certainly not taken it; where it fails
 * after, nobody knows.
 */
export async function handOff(message: SendMailOptions): Promise<HandOff> {
  try {
    await mailTransport().sendMail({ from: environment().mailFrom, ...message });
    return { outcome: 'accepted' };
  } catch (error) {
    return readFailure(error);
  }
}

type SmtpError = { code?: unknown; command?: unknown; responseCode?: unknown };

/** Errors that nodemailer raises before any part of the message has left. */
const beforeMessage = new Set([
  'ECONNECTION',
  'EDNS',
  'ETLS',
  'EAUTH',
  'EENVELOPE',
  'ENOAUTH',
  'EOAUTH2',
  'ECONNREFUSED',
]);

/** Tells from an error of nodemailer how far the message got. */
export function readFailure(error: unknown): Exclude<HandOff, { outcome: 'accepted' }> {
  const { code, command, responseCode } = (error ?? {}) as SmtpError;
  const name = typeof code === 'string' ? code : 'no code';
  if (typeof responseCode === 'number') {
    return {
      outcome: 'refused',
      forNow: responseCode < 500,
      reason: `the mail server answered ${responseCode} (${name})`,
    };
  }
  const early = typeof command === 'string' && /^(CONN|EHLO|HELO|STARTTLS|AUTH|MAIL FROM|RCPT TO|API)/.test(command);
  if (early || beforeMessage.has(name))
    return { outcome: 'refused', forNow: true, reason: `no connection to the mail server (${name})` };
  return { outcome: 'unknown', reason: `the connection ended while the message was handed over (${name})` };
}
