import nodemailer from 'nodemailer';
import { messageIdOf } from './message-id';

export interface Mail {
  /** Its Message-ID is made of it: the same at every attempt. */
  id: string;
  to: string;
  subject: string;
  text: string;
  attachments?: { filename: string; content: Uint8Array }[];
}

export interface Mailer {
  /** Hands the mail to the server; throws when it isn't taken, so that the job that sends it is tried again. */
  send(mail: Mail): Promise<void>;
  close(): void;
}

export interface MailTimeouts {
  /** Until the connection stands. */
  connectionMs: number;
  /** From then until the server's greeting. */
  greetingMs: number;
  /** The whole of it. A server may take its time over the text, so that this is most of what its job has. */
  totalMs: number;
}

/** All within the time that the queue gives a job (45 s), so that no other worker ever begins what this one is at. */
export const TIMEOUTS: MailTimeouts = { connectionMs: 10_000, greetingMs: 10_000, totalMs: 40_000 };

/**
 * @param url `smtp://` or `smtps://`, with user and password where the server asks for them
 * @param from the sender, as "Carryover <carryover@example.org>"
 */
export function createMailer(url: string, from: string, { connectionMs, greetingMs, totalMs }: MailTimeouts = TIMEOUTS): Mailer {
  const transport = nodemailer.createTransport({ url, connectionTimeout: connectionMs, greetingTimeout: greetingMs, socketTimeout: totalMs }, { from });
  return {
    async send({ id, to, subject, text, attachments }) {
      const attached = attachments?.map(({ filename, content }) => ({ filename, content: Buffer.from(content) }));
      await transport.sendMail({ messageId: messageIdOf(id, from), to, subject, text, attachments: attached, signal: AbortSignal.timeout(totalMs) });
    },
    close: () => transport.close(),
  };
}
