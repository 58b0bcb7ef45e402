import { once } from 'node:events';
import type { AddressInfo } from 'node:net';
import { type ParsedMail, simpleParser } from 'mailparser';
import { SMTPServer } from 'smtp-server';

interface Caught {
  parsed: ParsedMail;
  recipients: string[];
}

/** A mail host on loopback that can be taken down, put up again on the same port, and told to refuse. */
export class SmtpHost {
  readonly caught: Caught[] = [];
  /** What it answers to letters; null takes them. */
  refusal: { responseCode: number } | null = null;
  port = 0;
  #server: SMTPServer | undefined;

  async up(): Promise<void> {
    this.#server = new SMTPServer({
      disabledCommands: ['AUTH', 'STARTTLS'],
      logger: false,
      onData: (stream, session, done) => {
        const recipients = session.envelope.rcptTo.map(({ address }) => address);
        void simpleParser(stream).then((parsed) => {
          if (this.refusal) return done(Object.assign(new Error('not this one'), this.refusal));
          this.caught.push({ parsed, recipients });
          return done();
        });
      },
    });
    const listener = this.#server.listen(this.port, '127.0.0.1');
    await once(listener, 'listening');
    this.port = (listener.address() as AddressInfo).port;
  }

  down(): Promise<void> {
    return new Promise((resolve) => this.#server?.close(() => resolve()) ?? resolve());
  }

  to(email: string): ParsedMail[] {
    return this.caught.filter(({ recipients }) => recipients.includes(email)).map(({ parsed }) => parsed);
  }
}
