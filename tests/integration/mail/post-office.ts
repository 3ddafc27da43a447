import type { Socket } from 'node:net';
import { setTimeout as sleep } from 'node:timers/promises';
import { SMTPServer } from 'smtp-server';

/** What a mail server does with whoever comes. */
export type Manner =
  | 'takes'
  /** Says nothing for a while, before its greeting or after the text. */
  | 'greets late'
  | 'answers late'
  | 'puts off'
  | 'refuses the address'
  | 'closes after the text';

export interface Letter {
  to: string;
  messageId: string;
  text: string;
}

const LATE_MS = 2_000;

const answer = (message: string, responseCode: number) => Object.assign(new Error(message), { responseCode });

/** A mail server on a port of its own, whose manners a test chooses, and which can be down. */
export class PostOffice {
  port = 0;
  manner: Manner = 'takes';
  /** Manners towards one address. */
  readonly towards = new Map<string, Manner>();
  /** Every text that came in whole, taken or not. */
  readonly seen: Letter[] = [];
  /** Those that it said 250 to. */
  readonly taken: Letter[] = [];
  #server: SMTPServer | undefined;
  readonly #sockets = new Set<Socket>();

  async open(): Promise<this> {
    const server = new SMTPServer({
      authOptional: true,
      disabledCommands: ['STARTTLS'],
      onConnect: (_session, done) => void (this.manner === 'greets late' ? sleep(LATE_MS) : Promise.resolve()).then(() => done()),
      onRcptTo: ({ address }, _session, done) => {
        const manner = this.#towards(address);
        if (manner === 'puts off') return done(answer('4.2.0 Come again later', 451));
        if (manner === 'refuses the address') return done(answer('5.1.1 Nobody of this name', 550));
        done();
      },
      onData: (stream, session, done) => {
        let text = '';
        stream.on('data', (chunk: Buffer) => (text += chunk.toString()));
        stream.on('end', () => {
          const to = session.envelope.rcptTo[0]?.address ?? '';
          void this.#take({ to, messageId: /^Message-ID: (\S+)/im.exec(text)?.[1] ?? '', text: text.replace(/=\r?\n/g, '') }, session.remotePort, done);
        });
      },
    });
    // One that left in the middle is part of the test.
    server.on('error', () => undefined);
    server.server.on('connection', (socket: Socket) => {
      this.#sockets.add(socket);
      socket.on('close', () => this.#sockets.delete(socket));
    });
    this.#server = server;
    await new Promise<void>((resolve) => {
      const listening = server.listen(this.port, '127.0.0.1', () => {
        this.port = (listening.address() as { port: number }).port;
        resolve();
      });
    });
    return this;
  }

  async close(): Promise<void> {
    for (const socket of this.#sockets) socket.destroy();
    await new Promise<void>((resolve) => (this.#server ? this.#server.close(() => resolve()) : resolve()));
    this.#server = undefined;
  }

  get url(): string {
    return `smtp://127.0.0.1:${this.port}`;
  }

  /** Until whoever was here has left. */
  async untilEmpty(): Promise<void> {
    while (this.#sockets.size > 0) await sleep(5);
  }

  readonly takenBy = (address: string) => this.taken.filter(({ to }) => to === address);
  readonly seenFor = (address: string) => this.seen.filter(({ to }) => to === address);

  #towards(address: string): Manner {
    return this.towards.get(address) ?? this.manner;
  }

  async #take(letter: Letter, callersPort: number, done: (error?: Error) => void): Promise<void> {
    this.seen.push(letter);
    const manner = this.#towards(letter.to);
    if (manner === 'closes after the text') {
      for (const socket of this.#sockets) socket.destroy();
      return;
    }
    if (manner === 'answers late') {
      await sleep(LATE_MS);
      // Whoever has given up hears no 250.
      if (![...this.#sockets].some(({ remotePort }) => remotePort === callersPort)) return;
    }
    this.taken.push(letter);
    done();
  }
}
