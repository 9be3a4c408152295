import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { NOTICE_KINDS } from '../src/common/notice-kinds.js';
import { Writer } from '../src/database/write.js';
import { NoticesService, type Notice } from '../src/notices/notices.service.js';
import { createTestApp, type TestApp } from './support/create-test-app.js';
import { rowCounts } from './support/office.js';
import { journalTail, lettersIn } from './support/outbox.js';
import { signedInWith, type SignedIn } from './support/people.js';
import { problemOf } from './support/problem-of.js';

interface Listed {
  readonly items: { id: number; kind: string; text: string; href: string; at: string; read: boolean }[];
  readonly unread: number;
  readonly nextCursor: string | null;
}

let office: TestApp;
let anna: SignedIn;
let berta: SignedIn;

beforeAll(async () => {
  office = await createTestApp({ settings: { origin: 'http://register.office.example' } });
  anna = await signedInWith(office, 'engineer');
  berta = await signedInWith(office, 'reviewer');
});
afterAll(() => office.close());

function tell(people: readonly SignedIn[], notice: Partial<Notice> = {}): void {
  const { app } = office;
  app.get(Writer).writeUnjournalled('mail-delivery', (tx, at) => {
    app.get(NoticesService).tell(
      tx,
      at,
      people.map(({ actor }) => actor.id),
      { kind: 'comment', text: 'Somebody commented on the tube.', href: '/register/tube', ...notice },
    );
  });
}

const list = async ({ agent }: SignedIn, query = ''): Promise<Listed> =>
  (await agent.get(`/api/notices${query}`).expect(200)).body as Listed;

describe('a notice', () => {
  it('is for those it is for, each once, and goes out by mail', async () => {
    tell([anna, anna], { text: 'One\r\nBcc: all@office.example\nline' });
    const { items, unread } = await list(anna);
    expect(items).toMatchObject([
      { kind: 'comment', text: 'One Bcc: all@office.example line', href: '/register/tube', read: false },
    ]);
    expect(Object.keys(items[0] ?? {})).toEqual(['id', 'kind', 'text', 'href', 'at', 'read']);
    expect(unread).toBe(1);
    expect((await list(berta)).items).toEqual([]);
    const letters = lettersIn(office, anna.email);
    expect(letters).toHaveLength(1);
    expect(letters[0]?.subject).toBe('Merestone: a comment');
    expect(letters[0]?.body).toContain('See http://register.office.example/register/tube');
    expect(letters[0]?.body).toContain('http://register.office.example/account');
  });

  it('is read by its owner alone, once and for all', async () => {
    const { items } = await list(anna);
    const id = items[0]?.id ?? 0;
    await berta.agent.post(`/api/notices/${id}/reading`).expect(404);
    const { body } = await anna.agent.post(`/api/notices/${id}/reading`).expect(201);
    expect(body).toMatchObject({ id, read: true });
    expect(journalTail(office, 1)).toMatchObject([{ act: 'notice.read', subject: `notices/${id}` }]);
    const before = rowCounts({ test: office });
    await anna.agent.post(`/api/notices/${id}/reading`).expect(201);
    expect(rowCounts({ test: office })).toEqual(before);
    expect((await list(anna)).unread).toBe(0);
    for (const wrong of ['x', '-1', '1e3', '9'.repeat(16)]) {
      await anna.agent.post(`/api/notices/${wrong}/reading`).expect(400);
    }
  });

  it('with a key is told once, however often it is tried', async () => {
    for (let times = 0; times < 3; times += 1) {
      tell([anna, berta], { kind: 'reminder', once: 'review-due/tube/1/30-days' });
    }
    const reminders = (await list(anna)).items.filter(({ kind }) => kind === 'reminder');
    expect(reminders).toHaveLength(1);
    expect(lettersIn(office, berta.email)).toHaveLength(1);
  });

  it('is not for somebody who left, and leads nowhere else', async () => {
    const gone = await signedInWith(office, 'engineer');
    office.connection.sqlite.prepare('UPDATE person SET active = 0 WHERE id = ?').run(gone.actor.id);
    tell([gone]);
    expect(lettersIn(office, gone.email)).toEqual([]);
    for (const href of ['https://evil.example', '//evil.example', 'javascript:alert(1)', '/a b', '']) {
      expect(() => tell([anna], { href })).toThrow(/path of the screens/);
    }
  });

  it('is cut where it is too long, between characters', async () => {
    tell([berta], { text: '🪨'.repeat(800) });
    expect([...((await list(berta)).items[0]?.text ?? '')]).toHaveLength(500);
  });
});

describe('the list', () => {
  it('comes in pages, the latest first', async () => {
    const many = await signedInWith(office, 'engineer');
    for (let n = 0; n < 5; n += 1) tell([many], { text: `Number ${n}` });
    const first = await list(many, '?limit=2');
    const second = await list(many, `?limit=2&cursor=${first.nextCursor ?? ''}`);
    const third = await list(many, `?limit=2&cursor=${second.nextCursor ?? ''}`);
    const texts = [...first.items, ...second.items, ...third.items].map(({ text }) => text);
    expect(texts).toEqual([4, 3, 2, 1, 0].map((n) => `Number ${n}`));
    expect([first.unread, third.nextCursor]).toEqual([5, null]);
    for (const query of ['?limit=0', '?limit=201', '?cursor=x', '?limit=2&limit=3', '?person=x']) {
      await many.agent.get(`/api/notices${query}`).expect(400);
    }
  });
});

describe('what comes by mail', () => {
  it('is everything until somebody chooses otherwise, kind by kind', async () => {
    const chooser = await signedInWith(office, 'engineer');
    const everything = Object.fromEntries(NOTICE_KINDS.map((kind) => [kind, true]));
    const shown = await chooser.agent.get('/api/notices/preferences').expect(200);
    expect(shown.body).toEqual({ mail: everything });
    const put = (mail: unknown) => chooser.agent.put('/api/notices/preferences').send({ mail });
    const { body } = await put({ comment: false, 'review-asked': false }).expect(200);
    expect(body).toEqual({ mail: { ...everything, comment: false, 'review-asked': false } });
    expect(journalTail(office, 1)).toMatchObject([{ act: 'notices.chosen' }]);

    tell([chooser], { kind: 'comment' });
    tell([chooser], { kind: 'review-asked' });
    tell([chooser], { kind: 'approval' });
    expect(lettersIn(office, chooser.email).map(({ subject }) => subject)).toEqual([
      'Merestone: an approval',
    ]);
    expect((await list(chooser)).items).toHaveLength(3);

    await put({ comment: true }).expect(200);
    tell([chooser], { kind: 'comment' });
    expect(lettersIn(office, chooser.email)).toHaveLength(2);
  });

  it.each([
    [{ comment: 'no' }, 'mail.comment'],
    [{ comment: null }, 'mail.comment'],
    [{ gossip: false }, 'mail.gossip'],
    [[], 'mail'],
    ['all', 'mail'],
    [undefined, 'mail'],
  ])('is not chosen by %j', async (mail, field) => {
    const before = rowCounts({ test: office });
    const answer = await anna.agent.put('/api/notices/preferences').send({ mail }).expect(400);
    expect(problemOf(answer).fields?.[0]?.field).toBe(field);
    expect(rowCounts({ test: office })).toEqual(before);
  });
});
