import { createHash, randomUUID } from 'node:crypto';
import { mkdir, open, readFile, rename } from 'node:fs/promises';
import { dirname, join } from 'node:path';
import { Injectable } from '@nestjs/common';
import { Config } from '../config/config.js';

/** Documents in the data folder, each under the SHA-256 of its bytes. They are added and read, never changed. */
@Injectable()
export class DocumentStoreService {
  private readonly folder: string;

  constructor(config: Config) {
    this.folder = join(config.dataFolder, 'attachments');
  }

  /** Keeps the bytes for good before it returns, the same bytes once. Returns their SHA-256, hex. */
  async put(bytes: Buffer): Promise<string> {
    const sha256 = hashOf(bytes);
    const file = this.fileOf(sha256);
    await mkdir(dirname(file), { recursive: true, mode: 0o700 });
    // Written anew even where they are kept already: what was altered on disk is right again.
    const unfinished = `${file}.${randomUUID()}.part`;
    const handle = await open(unfinished, 'wx', 0o600);
    try {
      await handle.writeFile(bytes);
      await handle.sync();
    } finally {
      await handle.close();
    }
    await rename(unfinished, file);
    await syncFolder(dirname(file));
    return sha256;
  }

  /** The bytes as they were put. Throws when they are gone or no longer what they were. */
  async get(sha256: string): Promise<Buffer> {
    const bytes = await readFile(this.fileOf(sha256));
    if (hashOf(bytes) !== sha256) throw new Error(`The document ${sha256} was altered on disk.`);
    return bytes;
  }

  private fileOf(sha256: string): string {
    if (!/^[0-9a-f]{64}$/.test(sha256)) throw new Error('A document is named by its SHA-256.');
    return join(this.folder, sha256.slice(0, 2), sha256);
  }
}

function hashOf(bytes: Buffer): string {
  return createHash('sha256').update(bytes).digest('hex');
}

/** Without this the new name may be lost with the power. */
async function syncFolder(folder: string): Promise<void> {
  const handle = await open(folder, 'r');
  try {
    await handle.sync();
  } finally {
    await handle.close();
  }
}
