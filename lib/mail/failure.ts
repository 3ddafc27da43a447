/** What nodemailer says of a mail that wasn't taken, as far as it says it. */
interface Reported {
  code?: unknown;
  command?: unknown;
  response?: unknown;
  responseCode?: unknown;
}

export interface MailFailure {
  /** For an administrator: what happened, with the server's own words where it said any. */
  sentence: string;
  /** The server refuses this address for good, so that trying again would only annoy it. */
  isFinal: boolean;
}

const WITHOUT_AN_ANSWER: Readonly<Record<string, string>> = {
  ECONNREFUSED: 'The mail server can’t be reached: nothing listens there.',
  EDNS: 'The mail server can’t be found by its name.',
  ENOTFOUND: 'The mail server can’t be found by its name.',
  ETIMEDOUT: 'The mail server did not answer in time.',
  ETIMEOUT: 'The mail server did not answer in time.',
  EABORT: 'The mail server did not answer in time.',
  ABORT_ERR: 'The mail server did not answer in time.',
  ECONNRESET: 'The mail server broke the connection off.',
  ECONNECTION: 'The mail server closed the connection before it had answered.',
  ESOCKET: 'The connection to the mail server broke.',
  ETLS: 'No secure connection to the mail server came about.',
  EAUTH: 'The mail server refused to let us sign in.',
};

const MOST_CHARACTERS = 300;
const firstLine = (text: string) => text.split(/[\r\n]/, 1)[0]?.trim().slice(0, MOST_CHARACTERS) ?? '';

/** What came of handing a mail over, in words, and whether it is worth trying again. */
export function mailFailure(error: unknown): MailFailure {
  const { code, command, response, responseCode } = reported(error);
  if (typeof responseCode === 'number' && typeof response === 'string') {
    const said = firstLine(response);
    const isFinal = responseCode >= 500 && command === 'RCPT TO';
    if (code === 'EAUTH') return { sentence: `The mail server refused to let us sign in: ${said}`, isFinal };
    return { sentence: `The mail server ${responseCode >= 500 ? 'refused it' : 'put it off'}: ${said}`, isFinal };
  }
  return { sentence: (typeof code === 'string' && WITHOUT_AN_ANSWER[code]) || 'The mail could not be handed to the mail server.', isFinal: false };
}

/** An unanswered connection's own reason lies in a cause, or in its words. */
function reported(error: unknown): Reported {
  if (typeof error !== 'object' || error === null) return {};
  const known: Reported = error;
  if (known.code !== 'ESOCKET' && known.code !== 'ECONNECTION') return known;
  const words = error instanceof Error ? error.message : '';
  const inner = /\b(ECONNREFUSED|ENOTFOUND|ETIMEDOUT|ECONNRESET)\b/.exec(words)?.[1];
  return inner ? { ...known, code: inner } : known;
}
