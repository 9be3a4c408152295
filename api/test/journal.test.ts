import { createPublicKey, verify } from 'node:crypto';
import { readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';
import type BetterSqlite from 'better-sqlite3';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { openSqlite } from '../src/database/connection.js';
import type {
  CheckpointsResponse,
  JournalResponse,
  VerificationResponse,
} from '../src/journal/dto/journal-response.dto.js';
import { leafHash, nodeHash } from '../src/journal/merkle-tree.js';
import { createTestApp, type TestApp } from './support/create-test-app.js';
import { addPerson, signedInWith, type Agent } from './support/people.js';
import { problemOf } from './support/problem-of.js';

async function officeWithEntries(): Promise<{ office: TestApp; auditor: Agent; raw: BetterSqlite.Database }> {
  const office = await createTestApp();
  for (let count = 0; count < 9; count += 1) await addPerson(office);
  const { agent } = await signedInWith(office, 'auditor');
  return { office, auditor: agent, raw: openSqlite(office.databaseFile) };
}

const verification = async (auditor: Agent): Promise<VerificationResponse> =>
  (await auditor.post('/api/journal/verification').expect(200)).body as VerificationResponse;

describe('reading the journal', () => {
  let office: TestApp;
  let auditor: Agent;
  let raw: BetterSqlite.Database;

  beforeAll(async () => {
    ({ office, auditor, raw } = await officeWithEntries());
  });
  afterAll(async () => {
    raw.close();
    await office.close();
  });

  const page = async (query: string): Promise<JournalResponse> =>
    (await auditor.get(`/api/journal${query}`).expect(200)).body as JournalResponse;

  it('pages through every entry once, the latest first', async () => {
    const seen: number[] = [];
    let cursor: string | null = null;
    do {
      const { items, nextCursor, size } = await page(`?limit=4${cursor === null ? '' : `&cursor=${cursor}`}`);
      expect(size).toBe(11);
      seen.push(...items.map(({ index }) => index));
      cursor = nextCursor;
    } while (cursor !== null);

    expect(seen).toEqual([10, 9, 8, 7, 6, 5, 4, 3, 2, 1, 0]);
  });

  it('tells who did what to what, with the leaf hash of the stored text', async () => {
    const { items } = await page('?limit=1');
    const [item] = items;
    const stored = raw.prepare<[], { entry: string }>('SELECT entry FROM journal WHERE "index" = 10').get();

    expect(item).toMatchObject({ act: 'session.started', subject: `people/${item?.actor.id ?? ''}` });
    expect(item?.leaf).toBe(leafHash(stored?.entry ?? '').toString('hex'));
  });

  it('can be narrowed to one subject', async () => {
    const [first] = (await page('?limit=1')).items;
    const { items } = await page(`?subject=${first?.subject ?? ''}`);

    expect(items.map(({ act }) => act)).toEqual(['session.started', 'person.added']);
  });

  it.each([
    ['cursor', 'x'],
    ['cursor', '-1'],
    ['cursor', '1e3'],
    ['limit', '0'],
    ['limit', '201'],
    ['limit', '1.5'],
    ['page', '2'],
  ])('refuses %s=%s', async (field, value) => {
    const answer = await auditor.get(`/api/journal?${field}=${value}`).expect(400);
    expect(problemOf(answer).fields?.map((entry) => entry.field)).toEqual([field]);
  });

  it('refuses a parameter that was given twice', async () => {
    const answer = await auditor.get('/api/journal?limit=5&limit=6').expect(400);
    expect(problemOf(answer).fields?.[0]?.field).toBe('limit');
  });

  it('has checkpoints that can be checked without the program', async () => {
    expect(await verification(auditor)).toEqual({ ok: true, entries: 11 });
    const { items, publicKeys } = (await auditor.get('/api/journal/checkpoints').expect(200))
      .body as CheckpointsResponse;
    const [head] = items;
    const key = publicKeys.find(({ keyId }) => keyId === head?.keyId);

    expect(head?.size).toBe(11);
    expect(head?.text).toBe(
      `Merestone journal\n11\n${Buffer.from(head?.root ?? '', 'hex').toString('base64')}\n${head?.at ?? ''}\n`,
    );
    const signed = verify(
      null,
      Buffer.from(head?.text ?? ''),
      createPublicKey(key?.pem ?? ''),
      Buffer.from(head?.signature ?? '', 'base64'),
    );
    expect(signed).toBe(true);
    expect((await page('')).root).toBe(head?.root);
  });

  it('keeps its signing key to itself', async () => {
    const file = join(office.config.dataFolder, 'journal.key');
    expect(statSync(file).mode & 0o777).toBe(0o600);
    const { text } = await auditor.get('/api/journal/checkpoints');
    expect(text).not.toContain(readFileSync(file, 'utf8').split('\n')[1]);
  });
});

describe('a journal that was tampered with', () => {
  let office: TestApp;
  let auditor: Agent;
  let raw: BetterSqlite.Database;

  beforeEach(async () => {
    ({ office, auditor, raw } = await officeWithEntries());
    expect(await verification(auditor)).toEqual({ ok: true, entries: 11 });
    const triggers = raw
      .prepare<[], { name: string }>(
        "SELECT name FROM sqlite_schema WHERE type = 'trigger' AND name LIKE 'journal%'",
      )
      .all();
    for (const { name } of triggers) raw.exec(`DROP TRIGGER ${name}`);
  });
  afterEach(async () => {
    raw.close();
    await office.close();
  });

  it.each([0, 4, 10])('names entry %i when its text was altered', async (index) => {
    raw.prepare(`UPDATE journal SET entry = replace(entry, '"act"', '"akt"') WHERE "index" = ?`).run(index);
    expect(await verification(auditor)).toMatchObject({
      ok: false,
      entries: index,
      firstFault: { index, kind: 'altered' },
    });
  });

  it.each([0, 4, 10])('names entry %i when it was removed', async (index) => {
    raw.prepare('DELETE FROM journal WHERE "index" = ?').run(index);
    expect(await verification(auditor)).toMatchObject({ ok: false, firstFault: { index, kind: 'missing' } });
  });

  it('names an entry that was removed with the later ones moved up', async () => {
    raw.exec(
      'DELETE FROM journal WHERE "index" = 4; UPDATE journal SET "index" = "index" - 1 WHERE "index" > 4',
    );
    expect(await verification(auditor)).toMatchObject({ firstFault: { index: 4, kind: 'missing' } });
  });

  it('names an entry that was put in with the later ones moved down', async () => {
    raw.exec(
      'UPDATE journal SET "index" = -"index" WHERE "index" >= 4; UPDATE journal SET "index" = 1 - "index" WHERE "index" < 0',
    );
    raw.prepare('INSERT INTO journal ("index", entry) VALUES (4, ?)').run('{"act":"person.added"}');
    expect(await verification(auditor)).toMatchObject({ firstFault: { index: 4, kind: 'inserted' } });
  });

  it('names an entry that was put in at the end', async () => {
    raw.prepare('INSERT INTO journal ("index", entry) VALUES (11, ?)').run('{"act":"person.added"}');
    expect(await verification(auditor)).toMatchObject({ firstFault: { index: 11, kind: 'inserted' } });
  });

  it('names an entry that was put in before the first', async () => {
    raw.prepare('INSERT INTO journal ("index", entry) VALUES (-1, ?)').run('{"act":"person.added"}');
    expect(await verification(auditor)).toMatchObject({ firstFault: { index: -1, kind: 'inserted' } });
  });

  it('is found out when the last entries went with their hashes, by the checkpoint over them', async () => {
    raw.exec(
      'DELETE FROM journal WHERE "index" >= 8; DELETE FROM journal_node WHERE (position + 1) << level > 8',
    );
    expect(await verification(auditor)).toMatchObject({
      ok: false,
      entries: 8,
      firstFault: { index: 8, kind: 'missing' },
    });
  });

  it('names the last entry under a stored hash that does not follow from the entries', async () => {
    raw.exec("UPDATE journal_node SET hash = x'00' WHERE level = 2 AND position = 1");
    expect(await verification(auditor)).toMatchObject({ firstFault: { index: 7, kind: 'tree' } });
  });

  it('is found out when an entry and all hashes were rewritten, by the checkpoint', async () => {
    raw.prepare(`UPDATE journal SET entry = replace(entry, 'Person', 'Nobody') WHERE "index" = 3`).run();
    rewriteHashes(raw);
    expect(await verification(auditor)).toMatchObject({ firstFault: { index: 10, kind: 'checkpoint' } });
  });

  it('is found out when a checkpoint was rewritten to fit, by its signature', async () => {
    raw.exec(`UPDATE journal_checkpoint SET at = '2020-01-01T00:00:00.000Z',
      text = 'Merestone journal' WHERE size = 11`);
    const { firstFault } = await verification(auditor);
    expect(firstFault).toMatchObject({ index: 10, kind: 'checkpoint' });
    expect(firstFault?.message).toContain('signature');
  });

  it('does not take a key that is not the one its id stands for', async () => {
    raw.exec(`UPDATE journal_key SET pem =
      '-----BEGIN PUBLIC KEY-----' || char(10) || 'MCowBQYDK2VwAyEA11qYAYKxCrfVS/7TyWQHOg7hcvPapiMlrwIaaPcHURo=' ||
      char(10) || '-----END PUBLIC KEY-----'`);
    expect(await verification(auditor)).toMatchObject({ firstFault: { kind: 'checkpoint' } });
  });

  it('can still be read', async () => {
    raw.prepare('INSERT INTO journal ("index", entry) VALUES (11, ?)').run('{}');
    raw.exec('DELETE FROM journal_node WHERE level > 0');
    const { items, root } = (await auditor.get('/api/journal').expect(200)).body as JournalResponse;
    expect(items[0]).toMatchObject({ index: 11, act: '', subject: '' });
    expect(root).toBeNull();
  });

  it('still takes new entries, and the fault stays', async () => {
    raw.exec('DELETE FROM journal WHERE "index" = 10');
    await addPerson(office);
    expect(await verification(auditor)).toMatchObject({
      ok: false,
      firstFault: { index: 10, kind: 'missing' },
    });
  });
});

/** Computes every stored hash anew, as somebody would who can write the whole file. */
function rewriteHashes(raw: BetterSqlite.Database): void {
  const entries = raw.prepare<[], { entry: string }>('SELECT entry FROM journal ORDER BY "index"').all();
  let hashes = entries.map(({ entry }) => leafHash(entry));
  for (let level = 0; hashes.length > 0; level += 1) {
    const update = raw.prepare('UPDATE journal_node SET hash = ? WHERE level = ? AND position = ?');
    for (const [position, hash] of hashes.entries()) update.run(hash, level, position);
    hashes = hashes.flatMap((left, index) => {
      const right = hashes[index + 1];
      return index % 2 === 0 && right !== undefined ? [nodeHash(left, right)] : [];
    });
  }
}

describe('the life of a journal', () => {
  it('goes on over a restart, with a checkpoint signed at the end and the same key', async () => {
    const { office, raw } = await officeWithEntries();
    raw.close();
    await office.stop();
    const after = openSqlite(office.databaseFile);
    expect(after.prepare('SELECT max(size) AS size FROM journal_checkpoint').get()).toEqual({ size: 11 });
    after.close();

    const again = await createTestApp({ settings: { dataFolder: office.config.dataFolder } });
    const { agent } = await signedInWith(again, 'authority');
    expect(await verification(agent)).toEqual({ ok: true, entries: 13 });
    const { publicKeys } = (await agent.get('/api/journal/checkpoints')).body as CheckpointsResponse;
    expect(publicKeys).toHaveLength(1);
    await again.close();
  });
});
