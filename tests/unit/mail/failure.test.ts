import { describe, expect, it } from 'vitest';
import { mailFailure } from '@/lib/mail/failure';

const reported = (message: string, fields: object) => Object.assign(new Error(message), fields);

describe('what came of a mail that was not taken', () => {
  it('is final when the server refuses the address for good, in its own words', () => {
    const error = reported('Can’t send mail - all recipients were rejected: 550 5.1.1 No such person here', { code: 'EENVELOPE', command: 'RCPT TO', responseCode: 550, response: '550 5.1.1 No such person here\r\n250 more' });
    expect(mailFailure(error)).toEqual({ sentence: 'The mail server refused it: 550 5.1.1 No such person here', isFinal: true });
  });

  it.each([
    ['put off', { command: 'RCPT TO', responseCode: 451, response: '451 Later' }, 'The mail server put it off: 451 Later'],
    ['refused for what is in it', { command: 'DATA', responseCode: 554, response: '554 Too large' }, 'The mail server refused it: 554 Too large'],
    ['refused for its sender', { command: 'MAIL FROM', responseCode: 550, response: '550 Not you' }, 'The mail server refused it: 550 Not you'],
    ['not let in', { code: 'EAUTH', command: 'AUTH PLAIN', responseCode: 535, response: '535 Wrong password' }, 'The mail server refused to let us sign in: 535 Wrong password'],
    ['out of time', { code: 'ETIMEDOUT' }, 'The mail server did not answer in time.'],
    ['cut off', { code: 'ECONNECTION' }, 'The mail server closed the connection before it had answered.'],
  ])('is worth another try when it was %s', (_what, fields, sentence) => expect(mailFailure(reported('Words of ours', fields))).toEqual({ sentence, isFinal: false }));

  it('tells a server that is not there from one that closes', () => {
    expect(mailFailure(reported('connect ECONNREFUSED 127.0.0.1:9', { code: 'ESOCKET' })).sentence).toBe('The mail server can’t be reached: nothing listens there.');
  });

  it('is neutral about what is none of the server’s', () => {
    for (const error of [new Error('select * from mail'), undefined, 'words', null]) expect(mailFailure(error)).toEqual({ sentence: 'The mail could not be handed to the mail server.', isFinal: false });
  });

  it('keeps to the first line, and to a length', () => {
    const { sentence } = mailFailure(reported('', { command: 'DATA', responseCode: 451, response: `451 ${'x'.repeat(5_000)}\nsecond` }));
    expect(sentence.length).toBeLessThan(350);
    expect(sentence).not.toContain('second');
  });
});
