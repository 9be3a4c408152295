import type { AddressInfo } from 'node:net';
import { SMTPServer } from 'smtp-server';

export interface ReceivedLetter {
  readonly from: string;
  readonly to: readonly string[];
  /** As it came over the wire. */
  readonly raw: string;
  /** The text, decoded. */
  readonly text: string;
}

/** What a mail server says no with, such as 451 for now or 550 for good. */
export interface Refusal {
  readonly code: number;
  readonly to?: string;
}

/** A real mail server on this machine, which keeps what it takes. */
export interface MailServer {
  readonly url: string;
  readonly port: number;
  readonly letters: ReceivedLetter[];
  refusal: Refusal | undefined;
  close(): Promise<void>;
}

export async function openMailServer(port = 0): Promise<MailServer> {
  const letters: ReceivedLetter[] = [];
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS', 'AUTH'],
    disableReverseLookup: true,
    logger: false,
    onRcptTo: ({ address }, _session, done) => {
      const { refusal } = mailServer;
      const refused = refusal !== undefined && (refusal.to ?? address) === address;
      done(refused ? Object.assign(new Error('not taken'), { responseCode: refusal.code }) : null);
    },
    onData: (stream, session, done) => {
      const chunks: Buffer[] = [];
      stream.on('data', (chunk: Buffer) => chunks.push(chunk));
      stream.on('end', () => {
        const raw = Buffer.concat(chunks).toString('utf8');
        const { mailFrom, rcptTo } = session.envelope;
        letters.push({
          from: mailFrom === false ? '' : mailFrom.address,
          to: rcptTo.map(({ address }) => address),
          raw,
          text: textOf(raw),
        });
        done();
      });
    },
  });
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, '127.0.0.1', resolve);
  });
  // A client that goes away in the middle is no failure of the test.
  server.on('error', () => undefined);
  const at = (server.server.address() as AddressInfo).port;
  const mailServer: MailServer = {
    url: `smtp://127.0.0.1:${at}/?ignoreTLS=true`,
    port: at,
    letters,
    refusal: undefined,
    close: () => new Promise((resolve) => server.close(resolve)),
  };
  return mailServer;
}

/** The body of a letter of one part, freed of its transfer encoding (RFC 2045, 6.7 and 6.8). */
function textOf(raw: string): string {
  const [head = '', ...parts] = raw.split('\r\n\r\n');
  const body = parts.join('\r\n\r\n');
  if (/^content-transfer-encoding: base64/im.test(head)) return Buffer.from(body, 'base64').toString('utf8');
  if (!/^content-transfer-encoding: quoted-printable/im.test(head)) return body;
  const bytes = body
    .replaceAll('=\r\n', '')
    .replaceAll(/=([0-9A-F]{2})/g, (_, hex: string) => String.fromCharCode(Number.parseInt(hex, 16)));
  return Buffer.from(bytes, 'latin1').toString('utf8');
}
