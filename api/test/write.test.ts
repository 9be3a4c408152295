import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { SYSTEM_ACTOR } from '../src/common/actor.js';
import { openSqlite } from '../src/database/connection.js';
import { mail } from '../src/database/schema/mail.js';
import { Writer, type Written } from '../src/database/write.js';
import { createTestApp, type TestApp } from './support/create-test-app.js';

let office: TestApp;
let writer: Writer;

beforeAll(async () => {
  office = await createTestApp();
  writer = office.app.get(Writer);
});
afterAll(() => office.close());

const count = (table: string): unknown =>
  office.connection.sqlite.prepare(`SELECT count(*) FROM ${table}`).pluck().get();

const letter = (id: string) =>
  ({ id, to: 'a@office.example', subject: 's', body: 'b', writtenAt: 'now', state: 'local' }) as const;

const written = <T>(result: T): Written<T> => ({ subject: 'test', detail: {}, result });

describe('an act', () => {
  it('writes its rows and its journal row together, with the same time', () => {
    const at = writer.write(SYSTEM_ACTOR, 'person.added', (tx, moment) => {
      tx.insert(mail).values(letter('together')).run();
      return { subject: 'people/x', detail: { note: 'ü', nothing: undefined }, result: moment };
    });

    const entry = office.connection.sqlite
      .prepare<[], { entry: string }>('SELECT entry FROM journal ORDER BY "index" DESC LIMIT 1')
      .get();
    expect(JSON.parse(entry?.entry ?? '')).toEqual({
      format: 1,
      index: 0,
      at,
      actor: { id: 'system', name: 'Merestone' },
      act: 'person.added',
      subject: 'people/x',
      detail: { note: 'ü' },
    });
  });

  it('leaves nothing behind when it fails, whether in its work or in its journal row', () => {
    const before = [count('mail'), count('journal'), count('journal_node')];

    expect(() =>
      writer.write(SYSTEM_ACTOR, 'person.added', (tx) => {
        tx.insert(mail).values(letter('failing')).run();
        throw new Error('changed my mind');
      }),
    ).toThrow('changed my mind');
    expect(() =>
      writer.write(SYSTEM_ACTOR, 'person.added', (tx) => {
        tx.insert(mail).values(letter('unsayable')).run();
        return { subject: 'test', detail: { value: Number.NaN }, result: 1 };
      }),
    ).toThrow();

    expect([count('mail'), count('journal'), count('journal_node')]).toEqual(before);
  });

  it('cannot be nested in another', () => {
    const before = count('journal');
    expect(() =>
      writer.write(SYSTEM_ACTOR, 'person.added', () =>
        written(writer.write(SYSTEM_ACTOR, 'person.added', () => written(1))),
      ),
    ).toThrow(/nested/);
    expect(count('journal')).toBe(before);
  });

  it('cannot wait for anything in the middle', () => {
    const before = count('journal');
    const waiting = async (): Promise<number> => Promise.resolve(1);
    expect(() => writer.writeUnjournalled('mail-delivery', () => waiting())).toThrow(/promise/i);
    expect(count('journal')).toBe(before);
  });

  it('holds the write lock from its first line on', () => {
    const other = openSqlite(office.databaseFile);
    other.pragma('busy_timeout = 0');
    writer.write(SYSTEM_ACTOR, 'person.added', () => {
      expect(() => other.exec("UPDATE mail SET subject = 'x'")).toThrow(/locked/);
      return written(undefined);
    });
    other.close();
  });
});
