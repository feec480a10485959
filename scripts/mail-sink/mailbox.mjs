import { createWriteStream, mkdirSync, readdirSync } from 'node:fs';
import { readFile, rename, rm } from 'node:fs/promises';
import path from 'node:path';
import { pipeline } from 'node:stream/promises';
import PostalMime from 'postal-mime';

const fileName = /^\d{13}-\d{6}$/;

/**
 * Received mail as files: one .eml each, named for the time and order of arrival, so that nothing but the folder needs
 * to be kept.
 *
 * @param {string} folder made where it is missing, readable by its owner only
 */
export function openMailbox(folder) {
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  /** Heads of the mails read so far, by id: a mail never changes. */
  const heads = new Map();
  let count = 0;

  const ids = () =>
    readdirSync(folder)
      .filter((name) => name.endsWith('.eml'))
      .map((name) => name.slice(0, -4))
      .filter((id) => fileName.test(id))
      .sort()
      .reverse();

  return {
    /** Keeps one mail; it appears in the list when it is whole. */
    async keep(stream) {
      count += 1;
      const id = `${Date.now()}-${String(count % 1_000_000).padStart(6, '0')}`;
      const draft = path.join(folder, `${id}.part`);
      try {
        await pipeline(stream, createWriteStream(draft, { mode: 0o600, flags: 'wx' }));
        await rename(draft, path.join(folder, `${id}.eml`));
      } catch (error) {
        await rm(draft, { force: true });
        throw error;
      }
      return id;
    },
    /** Heads of mails, newest first: those to an address where one is given. */
    async list({ to = null, from = 0, limit = 200 } = {}) {
      const found = [];
      for (const id of ids()) {
        if (!heads.has(id)) heads.set(id, headOf(id, await parse(await readFile(path.join(folder, `${id}.eml`)))));
        const head = heads.get(id);
        if (to === null || head.to.some((address) => address.toLowerCase() === to.toLowerCase())) found.push(head);
      }
      return { total: found.length, mails: found.slice(from, from + limit) };
    },
    /** One mail with its texts, or null. */
    async read(id) {
      const bytes = await this.raw(id);
      if (bytes === null) return null;
      const mail = await parse(bytes);
      return { ...headOf(id, mail), text: mail.text ?? '', html: mail.html ?? '' };
    },
    /** The bytes of one mail as they came, or null. */
    async raw(id) {
      if (!fileName.test(id)) return null;
      try {
        return await readFile(path.join(folder, `${id}.eml`));
      } catch (error) {
        if (error.code === 'ENOENT') return null;
        throw error;
      }
    },
  };
}

const parse = (bytes) => PostalMime.parse(bytes);

function headOf(id, mail) {
  return {
    id,
    receivedAt: new Date(Number(id.slice(0, 13))).toISOString(),
    messageId: mail.messageId ?? null,
    from: mail.from?.address ?? '',
    to: (mail.to ?? []).map(({ address }) => address ?? ''),
    subject: mail.subject ?? '',
  };
}
