import { URLSearchParams } from 'node:url';

const escapes = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };

/** Text as it may stand in HTML, in an attribute too. */
export function escapeHtml(text) {
  return String(text).replace(/[&<>"']/g, (sign) => escapes[sign]);
}

const style = `
  :root { color-scheme: light dark; --paper: #fbf8f1; --ink: #1f2430; --line: #cfc8b6; --link: #243f73; }
  @media (prefers-color-scheme: dark) { :root { --paper: #1b2220; --ink: #e8e6de; --line: #47514e; --link: #9db8ec; } }
  body { margin: 0 auto; max-width: 60rem; padding: 1rem; background: var(--paper); color: var(--ink); font: 1rem/1.5 serif; }
  a { color: var(--link); } table { border-collapse: collapse; width: 100%; }
  th, td { text-align: left; padding: .4rem .8rem .4rem 0; border-bottom: 1px solid var(--line); vertical-align: top; overflow-wrap: anywhere; }
  pre { white-space: pre-wrap; } iframe { width: 100%; height: 40rem; border: 1px solid var(--line); background: #fff; }
`;

function page(title, body) {
  return `<!doctype html><html lang="en"><meta charset="utf-8"><meta name="viewport" content="width=device-width">
<title>${escapeHtml(title)}</title><style>${style}</style><main><h1>${escapeHtml(title)}</h1>${body}</main></html>`;
}

/** The list of mails, newest first. */
export function listPage({ total, mails }, { to, from, limit }) {
  const rows = mails.map(
    (mail) =>
      `<tr><td>${escapeHtml(mail.receivedAt.replace('T', ' ').slice(0, 19))}</td><td>${escapeHtml(mail.to.join(', '))}</td>` +
      `<td><a href="/mails/${mail.id}">${escapeHtml(mail.subject || '(no subject)')}</a></td></tr>`,
  );
  const query = (start) =>
    `/?${escapeHtml(new URLSearchParams({ ...(to ? { to } : {}), from: String(start) }).toString())}`;
  const older = from + limit < total ? `<p><a href="${query(from + limit)}">Older</a></p>` : '';
  const search = `<form><label>To <input name="to" type="email" value="${escapeHtml(to ?? '')}"></label> <button>Show</button></form>`;
  const table = `<table><tr><th>Received (UTC)</th><th>To</th><th>Subject</th></tr>${rows.join('')}</table>`;
  const nothing = '<p>No mail yet. Whatever Halfmark sends appears here and nowhere else.</p>';
  return page('Mail from Halfmark', `${search}${total === 0 ? nothing : `<p>${total} in all.</p>${table}${older}`}`);
}

/** One mail: its head, its HTML in a frame that may do nothing, its text. */
export function mailPage(mail) {
  const facts = [
    ['Received', `${mail.receivedAt.replace('T', ' ').slice(0, 19)} UTC`],
    ['From', mail.from],
    ['To', mail.to.join(', ')],
    ['Message-ID', mail.messageId ?? ''],
  ];
  const head = facts.map(([name, value]) => `<tr><th>${name}</th><td>${escapeHtml(value)}</td></tr>`).join('');
  const frame = mail.html
    ? `<h2>As HTML</h2><iframe title="The mail as HTML" sandbox="allow-popups" src="/mails/${mail.id}.html"></iframe>`
    : '';
  return page(
    mail.subject || '(no subject)',
    `<p><a href="/">All mail</a> · <a href="/mails/${mail.id}.eml">As it came</a></p><table>${head}</table>${frame}` +
      `<h2>As text</h2><pre>${escapeHtml(mail.text)}</pre>`,
  );
}
