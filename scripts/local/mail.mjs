import { createServer } from 'node:http';
import { SMTPServer } from 'smtp-server';
import { letterPage, listPage, notFoundPage } from './mail-page.mjs';
import { mailbox } from './mailbox.mjs';

/**
 * Stand-in for a mail server on one machine: takes everything, delivers nothing, shows what it took.
 * Usage: node mail.mjs <folder> <smtp port> <page port>
 */
const [folder, smtpPort, pagePort] = process.argv.slice(2);
const box = mailbox(folder);
const host = '127.0.0.1';

const smtp = new SMTPServer({
  authOptional: true,
  disabledCommands: ['STARTTLS'],
  logger: false,
  onData(stream, _session, done) {
    /** @type {Buffer[]} */
    const chunks = [];
    stream.on('data', (chunk) => chunks.push(chunk));
    stream.on('end', () => {
      box.keep(Buffer.concat(chunks).toString('utf8'));
      done();
    });
  },
});
smtp.on('error', (error) => console.error(error.message));

const pages = createServer(async (request, response) => {
  const path = new URL(request.url ?? '/', `http://${host}`).pathname.slice(1);
  if (path === 'letters.json') {
    response.setHeader('content-type', 'application/json').end(JSON.stringify(await box.letters()));
    return;
  }
  const letter = path === '' ? undefined : await box.letter(path);
  response.statusCode = path === '' || letter ? 200 : 404;
  response.setHeader('content-type', 'text/html; charset=utf-8').setHeader('content-security-policy', "default-src 'none'; style-src 'unsafe-inline'");
  response.end(path === '' ? listPage(await box.letters()) : letter ? letterPage(letter) : notFoundPage());
});

// The page opens last: whoever waits for it may send mail at once.
smtp.listen(Number(smtpPort), host, () => pages.listen(Number(pagePort), host));
