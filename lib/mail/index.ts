import nodemailer from 'nodemailer';

export interface Mail {
  to: string;
  subject: string;
  text: string;
}

export interface Mailer {
  /** Hands the mail to the server; throws when it isn't taken, so that the job that sends it is tried again. */
  send(mail: Mail): Promise<void>;
  close(): void;
}

/**
 * @param url `smtp://` or `smtps://`, with user and password where the server asks for them
 * @param from the sender, as "Carryover <carryover@example.org>"
 */
export function createMailer(url: string, from: string): Mailer {
  const transport = nodemailer.createTransport(url, { from });
  return {
    send: async (mail) => void (await transport.sendMail(mail)),
    close: () => transport.close(),
  };
}
