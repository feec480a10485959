/*
 * The local mail sink: takes every mail on loopback, delivers none, keeps each as a file and shows them on a page. It
 * stands in for a mail server wherever SMTP_URL is not set, and never listens to another machine.
 *
 * HALFMARK_MAIL_FOLDER, HALFMARK_SMTP_PORT, HALFMARK_MAIL_PAGE_PORT
 */
import { SMTPServer } from 'smtp-server';
import { openMailbox } from './mailbox.mjs';
import { mailServer } from './web.mjs';

const host = '127.0.0.1';
const largestMail = 10 * 1024 * 1024;

const mailbox = openMailbox(process.env.HALFMARK_MAIL_FOLDER);

const smtp = new SMTPServer({
  banner: 'Halfmark mail sink',
  authOptional: true,
  disabledCommands: ['AUTH', 'STARTTLS'],
  disableReverseLookup: true,
  size: largestMail,
  onData(stream, _session, done) {
    mailbox.keep(stream).then(
      () =>
        done(stream.sizeExceeded ? Object.assign(new Error('The mail is too large.'), { responseCode: 552 }) : null),
      (error) => done(Object.assign(new Error('The mail could not be kept.'), { responseCode: 451, cause: error })),
    );
  },
});
smtp.on('error', (error) => console.error('mail sink:', error.message));

const pages = mailServer(mailbox);

await Promise.all([
  listening(smtp.server, () => smtp.listen(Number(process.env.HALFMARK_SMTP_PORT), host)),
  listening(pages, () => pages.listen(Number(process.env.HALFMARK_MAIL_PAGE_PORT), host)),
]);
process.send?.('ready');

for (const signal of ['SIGTERM', 'SIGINT', 'SIGHUP']) {
  process.on(signal, () => {
    pages.close();
    pages.closeAllConnections();
    smtp.close(() => process.exit(0));
    setTimeout(() => process.exit(0), 2_000).unref();
  });
}

function listening(server, listen) {
  return new Promise((resolve, reject) => {
    server.once('listening', resolve);
    server.once('error', reject);
    listen();
  });
}
