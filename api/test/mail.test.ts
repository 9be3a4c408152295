import { createServer, type AddressInfo } from 'node:net';
import { afterEach, describe, expect, it } from 'vitest';
import { Writer } from '../src/database/write.js';
import { backOffMinutes } from '../src/mail/back-off.js';
import { MailDelivery } from '../src/mail/mail-delivery.js';
import { MailService } from '../src/mail/mail.service.js';
import type { Letter } from '../src/mail/letter.js';
import type { OutboxResponse } from '../src/mail/dto/outbox-response.dto.js';
import { ScheduleService } from '../src/schedule/schedule.service.js';
import { createTestApp, type TestApp } from './support/create-test-app.js';
import { openMailServer, type MailServer } from './support/mail-server.js';
import { lettersIn } from './support/outbox.js';
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

async function mailServer(port?: number): Promise<MailServer> {
  const server = await openMailServer(port);
  closing.push(() => server.close());
  return server;
}

function post({ app }: TestApp, overrides: Partial<Letter> = {}): void {
  app.get(Writer).writeUnjournalled('mail-delivery', (tx, at) => {
    app.get(MailService).post(tx, at, {
      to: 'anna@office.example',
      subject: 'Two\r\nlines',
      body: 'Good morning',
      ...overrides,
    });
  });
}

const deliver = ({ app }: TestApp): Promise<void> => app.get(MailDelivery).deliverDue();

async function outbox(app: TestApp): Promise<OutboxResponse['items']> {
  const { agent } = await signedInWith(app, 'administrator');
  return ((await agent.get('/api/mail/outbox').expect(200)).body as OutboxResponse).items;
}

const LINK = `http://register.office.example/invitation/${'x'.repeat(43)}`;

describe('without a mail server', () => {
  it('letters are kept where an administrator reads them, links too', async () => {
    const app = await office();
    post(app, { link: LINK });
    await deliver(app);

    expect(await outbox(app)).toMatchObject([
      {
        to: 'anna@office.example',
        subject: 'Two lines',
        body: `Good morning\n\n${LINK}\n`,
        state: 'local',
        tries: 0,
      },
    ]);
  });
});

describe('with a mail server', () => {
  it('letters are sent soon after the act they tell of, once', async () => {
    const server = await mailServer();
    const app = await office({ settings: { smtpUrl: server.url, origin: 'http://register.office.example' } });
    post(app, { body: 'Grüße aus Lübeck, µ = 1.8e-5' });
    await expect.poll(() => server.letters.length).toBe(1);
    await deliver(app);
    await app.app.get(ScheduleService).tick();

    expect(server.letters).toHaveLength(1);
    const [letter] = server.letters;
    expect(letter).toMatchObject({ from: 'no-reply@register.office.example', to: ['anna@office.example'] });
    expect(letter?.raw).toMatch(/^Subject: Two lines\r$/m);
    expect(letter?.raw).toMatch(/^Auto-Submitted: auto-generated\r$/m);
    expect(letter?.raw).toMatch(/^Content-Type: text\/plain; charset=utf-8/m);
    expect(letter?.text.trim()).toBe('Grüße aus Lübeck, µ = 1.8e-5');
    expect(await outbox(app)).toMatchObject([{ state: 'sent', tries: 1, lastError: null }]);
  });

  it('a link goes out whole, and is nowhere afterwards', async () => {
    const server = await mailServer();
    const app = await office({ settings: { smtpUrl: server.url } });
    server.refusal = { code: 451 };
    post(app, { link: LINK });
    await deliver(app);
    expect((await outbox(app))[0]).toMatchObject({ state: 'waiting', body: 'Good morning' });
    server.refusal = undefined;
    app.clock.forward(backOffMinutes(1) + 0.1);
    await deliver(app);

    expect(server.letters[0]?.text).toContain(`\n${LINK}`);
    expect((await outbox(app))[0]).toMatchObject({ state: 'sent', body: 'Good morning' });
    expect(JSON.stringify(lettersIn(app))).not.toContain('invitation');
  });

  it('nothing of an act that failed is sent', async () => {
    const server = await mailServer();
    const app = await office({ settings: { smtpUrl: server.url } });
    expect(() =>
      app.app.get(Writer).writeUnjournalled('mail-delivery', (tx, at) => {
        app.app.get(MailService).post(tx, at, { to: 'anna@office.example', subject: 'No', body: 'No' });
        throw new Error('in the middle of the act');
      }),
    ).toThrow('in the middle');
    await new Promise((resolve) => setTimeout(resolve, 50));
    await deliver(app);
    expect([server.letters, lettersIn(app)]).toEqual([[], []]);
  });

  it('a letter not taken for now is tried again later, after a restart too', async () => {
    const server = await mailServer();
    server.refusal = { code: 451 };
    const first = await createTestApp({ settings: { smtpUrl: server.url } });
    post(first);
    await deliver(first);
    await deliver(first);
    const [refused] = await outbox(first);
    expect(refused).toMatchObject({ state: 'waiting', tries: 1 });
    expect(refused?.lastError).toContain('not taken');
    await first.stop();

    server.refusal = undefined;
    const second = await office({ settings: { smtpUrl: server.url, dataFolder: first.config.dataFolder } });
    await deliver(second);
    expect(server.letters).toHaveLength(0);
    second.clock.forward(backOffMinutes(1) + 0.1);
    await second.app.get(ScheduleService).tick();

    expect(server.letters).toHaveLength(1);
    expect(await outbox(second)).toMatchObject([{ state: 'sent', tries: 2 }]);
  });

  it('a server that is away holds everything up and loses nothing', async () => {
    const gone = await openMailServer();
    await gone.close();
    const app = await office({ settings: { smtpUrl: gone.url } });
    for (const to of ['anna@office.example', 'berta@office.example']) post(app, { to });
    await deliver(app);
    // The second one is not even tried while nobody answers.
    expect((await outbox(app)).map(({ tries }) => tries).sort()).toEqual([0, 1]);

    const back = await mailServer(gone.port);
    app.clock.forward(backOffMinutes(1) + 0.1);
    await deliver(app);
    expect(back.letters.flatMap(({ to }) => to).sort()).toEqual([
      'anna@office.example',
      'berta@office.example',
    ]);
  });

  it('a server that hangs up in the middle is one that is away', async () => {
    const rude = createServer((socket) => socket.end());
    await new Promise<void>((resolve) => rude.listen(0, '127.0.0.1', resolve));
    closing.push(() => new Promise((resolve) => rude.close(resolve)));
    const url = `smtp://127.0.0.1:${(rude.address() as AddressInfo).port}`;
    const app = await office({ settings: { smtpUrl: url } });
    post(app);
    await deliver(app);
    expect(await outbox(app)).toMatchObject([{ state: 'waiting', tries: 1 }]);
  });

  it('an address refused for good is given up at once and holds up nobody else', async () => {
    const server = await mailServer();
    server.refusal = { code: 550, to: 'gone@office.example' };
    const app = await office({ settings: { smtpUrl: server.url } });
    post(app, { to: 'gone@office.example', link: LINK });
    post(app, { to: 'anna@office.example' });
    await deliver(app);

    const states = Object.fromEntries((await outbox(app)).map(({ to, state }) => [to, state]));
    expect(states).toEqual({ 'gone@office.example': 'failed', 'anna@office.example': 'sent' });
    expect(lettersIn(app, 'gone@office.example')[0]?.link).toBeNull();
  });

  it('a letter that nobody takes is given up in the end', async () => {
    const server = await mailServer();
    server.refusal = { code: 451 };
    const app = await office({ settings: { smtpUrl: server.url } });
    post(app);
    for (let tries = 0; tries < 25; tries += 1) {
      await deliver(app);
      app.clock.forward(6 * 60 + 1);
    }

    expect(await outbox(app)).toMatchObject([{ state: 'failed', tries: 20 }]);
    await deliver(app);
    expect(await outbox(app)).toMatchObject([{ tries: 20 }]);
  });
});

describe('a letter', () => {
  it.each([
    'anna@office.example\r\nBcc: all@office.example',
    'anna@office.example\nX: y',
    'anna@office.example, all@office.example',
    'Anna <anna@office.example>',
    'anna@office.example\u2028',
    'anna office.example',
    '',
  ])('is not written to %j', async (to) => {
    const app = await office();
    expect(() => post(app, { to })).toThrow(/Mail cannot be sent/);
    expect(lettersIn(app)).toEqual([]);
  });

  it('has a subject of one line, and no header of somebody else', async () => {
    const server = await mailServer();
    const app = await office({ settings: { smtpUrl: server.url } });
    post(app, {
      subject: 'A\r\nBcc: all@office.example\u0000\u2028B',
      body: 'Text\r\n.\r\nMAIL FROM:<x@y.example>',
    });
    await deliver(app);

    expect(server.letters).toHaveLength(1);
    const head = server.letters[0]?.raw.split('\r\n\r\n')[0] ?? '';
    expect(head).toMatch(/^Subject: A Bcc: all@office\.example B\r$/m);
    expect(head).not.toMatch(/^Bcc:/m);
    expect(server.letters[0]?.to).toEqual(['anna@office.example']);
    expect(server.letters[0]?.text).toContain('MAIL FROM:<x@y.example>');
  });
});

describe('the pause between tries', () => {
  it('doubles, up to six hours', () => {
    expect([1, 2, 3, 9, 10, 20].map(backOffMinutes)).toEqual([1, 2, 4, 256, 360, 360]);
  });
});
