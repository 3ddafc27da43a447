import { mkdirSync, readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { simpleParser } from 'mailparser';
import { writeWhole } from '../lib/files.mjs';

/**
 * @typedef {{ id: string, to: string, from: string, subject: string, date: string, text: string, links: string[] }} Letter
 */

/** @param {import('mailparser').AddressObject | import('mailparser').AddressObject[] | undefined} address */
const addressText = (address) => [address ?? []].flat().map(({ text }) => text).join(', ');

/**
 * Mail kept as files, so that it is still there after a restart.
 * @param {string} folder
 */
export function mailbox(folder) {
  mkdirSync(folder, { recursive: true });
  let count = 0;
  const ids = () => readdirSync(folder).filter((file) => file.endsWith('.eml')).map((file) => file.slice(0, -4)).sort().reverse();

  /** @param {string} id @returns {Promise<Letter>} */
  async function read(id) {
    const mail = await simpleParser(readFileSync(join(folder, `${id}.eml`)));
    const text = mail.text ?? '';
    return {
      id,
      to: addressText(mail.to),
      from: addressText(mail.from),
      subject: mail.subject ?? '(no subject)',
      date: (mail.date ?? new Date(Number(id.split('-')[0]))).toISOString(),
      text,
      links: text.match(/https?:\/\/[^\s<>"')\]]+/g) ?? [],
    };
  }

  return {
    /** @param {string} source the message as it came over the wire */
    keep(source) {
      count += 1;
      writeWhole(join(folder, `${Date.now()}-${String(count).padStart(4, '0')}.eml`), source);
    },
    /** The newest first. */
    letters: () => Promise.all(ids().map(read)),
    /** @param {string} id @returns {Promise<Letter | undefined>} */
    letter: async (id) => (ids().includes(id) ? read(id) : undefined),
  };
}
