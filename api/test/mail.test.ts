import { createServer, type AddressInfo, type Server, type Socket } from 'node:net';
import { afterEach, describe, expect, it } from 'vitest';
import { Writer } from '../src/database/write.js';
import { backOffMinutes } from '../src/mail/back-off.js';
import { MailDelivery } from '../src/mail/mail-delivery.js';
import { MailService } from '../src/mail/mail.service.js';
import type { OutboxResponse } from '../src/mail/dto/outbox-response.dto.js';
import { createTestApp, type TestApp } from './support/create-test-app.js';
import { signedInWith } from './support/people.js';

let closing: (() => Promise<unknown>)[] = [];
afterEach(async () => {
  for (const close of closing.reverse()) await close();
  closing = [];
});

async function office(settings: Parameters<typeof createTestApp>[0] = {}): Promise<TestApp> {
  const app = await createTestApp(settings);
  closing.push(() => app.close());
  return app;
}

function post({ app }: TestApp): void {
  app.get(Writer).writeUnjournalled('mail-delivery', (tx, at) => {
    app
      .get(MailService)
      .post(tx, at, { to: 'anna@office.example', subject: 'Two\r\nlines', body: 'Good morning' });
  });
}

async function outbox(app: TestApp): Promise<OutboxResponse['items']> {
  const { agent } = await signedInWith(app, 'administrator');
  return ((await agent.get('/api/mail/outbox').expect(200)).body as OutboxResponse).items;
}

/** A mail server that says just enough of SMTP (RFC 5321) to take a letter, or refuses every one. */
async function mailServer(taking: boolean): Promise<{ url: string; letters: string[]; server: Server }> {
  const letters: string[] = [];
  const server = createServer((socket) => converse(socket, taking, letters));
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  closing.push(() => new Promise((resolve) => server.close(resolve)));
  return {
    url: `smtp://127.0.0.1:${(server.address() as AddressInfo).port}/?ignoreTLS=true`,
    letters,
    server,
  };
}

function converse(socket: Socket, taking: boolean, letters: string[]): void {
  let inLetter = false;
  let letter = '';
  socket.write('220 test\r\n');
  socket.on('data', (data) => {
    if (inLetter) letter += data.toString();
    if (inLetter && letter.endsWith('\r\n.\r\n')) {
      letters.push(letter);
      inLetter = false;
      socket.write('250 taken\r\n');
      return;
    }
    if (inLetter) return;
    const command = data.toString().slice(0, 4).toUpperCase();
    if (command === 'DATA') inLetter = true;
    if (command === 'QUIT') socket.end('221 bye\r\n');
    else if (command === 'MAIL' && !taking) socket.write('451 not now\r\n');
    else socket.write(command === 'DATA' ? '354 go on\r\n' : '250 ok\r\n');
  });
}

describe('without a mail server', () => {
  it('letters are kept where an administrator reads them', async () => {
    const app = await office();
    post(app);
    await app.app.get(MailDelivery).deliverDue();

    expect(await outbox(app)).toMatchObject([
      { to: 'anna@office.example', subject: 'Two lines', body: 'Good morning', state: 'local', tries: 0 },
    ]);
  });
});

describe('with a mail server', () => {
  it('letters are sent once', async () => {
    const { url, letters } = await mailServer(true);
    const app = await office({ settings: { smtpUrl: url } });
    post(app);
    await app.app.get(MailDelivery).deliverDue();
    await app.app.get(MailDelivery).deliverDue();

    expect(letters).toHaveLength(1);
    expect(letters[0]).toMatch(/To: anna@office\.example[\s\S]*Subject: Two lines[\s\S]*Good morning/);
    expect(await outbox(app)).toMatchObject([{ state: 'sent', tries: 1, lastError: null }]);
  });

  it('a refused letter is tried again later, after a restart too', async () => {
    const refusing = await mailServer(false);
    const first = await createTestApp({ settings: { smtpUrl: refusing.url } });
    post(first);
    await first.app.get(MailDelivery).deliverDue();
    await first.app.get(MailDelivery).deliverDue();
    const [refused] = await outbox(first);
    expect(refused).toMatchObject({ state: 'waiting', tries: 1 });
    expect(refused?.lastError).toContain('451');
    await first.stop();

    const { url, letters } = await mailServer(true);
    const second = await office({ settings: { smtpUrl: url, dataFolder: first.config.dataFolder } });
    second.clock.forward(backOffMinutes(1) + 0.1);
    await second.app.get(MailDelivery).deliverDue();

    expect(letters).toHaveLength(1);
    expect(await outbox(second)).toMatchObject([{ state: 'sent', tries: 2 }]);
  });

  it('a letter that nobody takes is given up in the end', async () => {
    const { url } = await mailServer(false);
    const app = await office({ settings: { smtpUrl: url } });
    post(app);
    for (let tries = 0; tries < 25; tries += 1) {
      await app.app.get(MailDelivery).deliverDue();
      app.clock.forward(6 * 60 + 1);
    }

    expect(await outbox(app)).toMatchObject([{ state: 'failed', tries: 20 }]);
  });
});

describe('the pause between tries', () => {
  it('doubles, up to six hours', () => {
    expect([1, 2, 3, 9, 10, 20].map(backOffMinutes)).toEqual([1, 2, 4, 256, 360, 360]);
  });
});
