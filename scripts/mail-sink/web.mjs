import http from 'node:http';
import { listPage, mailPage } from './pages.mjs';

const pagePolicy =
  "default-src 'none'; style-src 'unsafe-inline'; frame-src 'self'; form-action 'self'; base-uri 'none'";
/** A mail shown as HTML may show its own style and nothing else: no script, no picture from elsewhere, no form. */
const mailPolicy =
  "default-src 'none'; style-src 'unsafe-inline'; img-src data:; base-uri 'none'; form-action 'none'; sandbox allow-popups";

const html = (body, policy = pagePolicy) => ({
  status: 200,
  headers: { 'content-type': 'text/html; charset=utf-8', 'content-security-policy': policy },
  body,
});
const json = (value) => ({
  status: 200,
  headers: { 'content-type': 'application/json; charset=utf-8' },
  body: JSON.stringify(value),
});
const nothing = {
  status: 404,
  headers: { 'content-type': 'text/plain; charset=utf-8' },
  body: 'There is no such mail.\n',
};

/**
 * A read-only view of a mailbox on loopback: pages for a person, JSON for tests.
 *
 * `/` and `/mails.json` (both take ?to=ADDRESS&from=N), `/mails/ID`, `/mails/ID.json`, `/mails/ID.html`, `/mails/ID.eml`
 *
 * @param {ReturnType<typeof import('./mailbox.mjs').openMailbox>} mailbox
 */
export function mailServer(mailbox) {
  return http.createServer((request, response) => {
    answer(mailbox, request).then(
      ({ status, headers, body }) => {
        response.writeHead(status, { ...headers, 'x-content-type-options': 'nosniff', 'cache-control': 'no-store' });
        response.end(body);
      },
      (error) => {
        console.error('mail page:', error.message);
        response.writeHead(500).end();
      },
    );
  });
}

async function answer(mailbox, request) {
  // Only a browser that was pointed at this machine by its own name or address is served, not a page elsewhere whose
  // name was made to lead here.
  if (!/^(127\.0\.0\.1|localhost|\[::1\])(:\d+)?$/.test(request.headers.host ?? '')) {
    return { ...nothing, status: 421, body: 'This page is served at 127.0.0.1 only.\n' };
  }
  if (request.method !== 'GET' && request.method !== 'HEAD') return { ...nothing, status: 405, body: 'Read only.\n' };
  const url = new URL(request.url, 'http://127.0.0.1');
  const view = {
    to: url.searchParams.get('to') || null,
    from: Math.max(0, Number.parseInt(url.searchParams.get('from') ?? '0', 10) || 0),
    limit: 200,
  };
  if (url.pathname === '/') return html(listPage(await mailbox.list(view), view));
  if (url.pathname === '/mails.json') return json(await mailbox.list({ ...view, limit: 10_000 }));
  const [, id, form = ''] = /^\/mails\/(\d{13}-\d{6})(\.json|\.html|\.eml)?$/.exec(url.pathname) ?? [];
  return id === undefined ? nothing : oneMail(mailbox, id, form);
}

async function oneMail(mailbox, id, form) {
  if (form === '.eml') {
    const raw = await mailbox.raw(id);
    return raw === null
      ? nothing
      : {
          status: 200,
          headers: { 'content-type': 'message/rfc822', 'content-disposition': `attachment; filename="${id}.eml"` },
          body: raw,
        };
  }
  const mail = await mailbox.read(id);
  if (mail === null) return nothing;
  if (form === '.json') return json(mail);
  return form === '.html' ? html(mail.html, mailPolicy) : html(mailPage(mail));
}
