import { join } from 'node:path';
import {
  Injectable,
  Logger,
  type OnApplicationBootstrap,
  type OnApplicationShutdown,
  type OnModuleInit,
} from '@nestjs/common';
import { Config } from '../config/config.js';
import { Writer } from '../database/write.js';
import { journalSize, storedNodes } from '../database/append-to-journal.js';
import { checkpointText } from './checkpoint-text.js';
import { JournalRepository } from './journal.repository.js';
import { rootHash } from './merkle-tree.js';
import { loadSigningKey, type SigningKey } from './signing-key.js';

const EVERY_MS = 10 * 60_000;

/** Signs the journal's head: at the start, every ten minutes if it grew, before a verification, and at the end. */
@Injectable()
export class CheckpointService implements OnModuleInit, OnApplicationBootstrap, OnApplicationShutdown {
  private readonly logger = new Logger('Journal');
  private readonly key: SigningKey;
  private timer: NodeJS.Timeout | undefined;

  constructor(
    private readonly journal: JournalRepository,
    private readonly writer: Writer,
    config: Config,
  ) {
    this.key = loadSigningKey(join(config.dataFolder, 'journal.key'));
  }

  onModuleInit(): void {
    const known = this.journal.keys();
    if (known.some(({ keyId }) => keyId === this.key.keyId)) return;
    if (known.length > 0)
      this.logger.warn('The journal gets a new signing key; the former one was not found.');
    this.writer.writeUnjournalled('checkpoint', (tx, at) => {
      this.journal.insertKey(tx, { keyId: this.key.keyId, pem: this.key.publicPem, since: at });
    });
  }

  onApplicationBootstrap(): void {
    this.trySigningHead();
    this.timer = setInterval(() => this.trySigningHead(), EVERY_MS);
    this.timer.unref();
  }

  onApplicationShutdown(): void {
    clearInterval(this.timer);
    this.trySigningHead();
  }

  /** Signs the present head unless that was done already. */
  signHead(): void {
    this.writer.writeUnjournalled('checkpoint', (tx, at) => {
      const size = journalSize(tx);
      if (size <= this.journal.lastCheckpointSize(tx)) return;
      const root = rootHash(size, storedNodes(tx)).toString('hex');
      const text = checkpointText({ size, root, at });
      const signature = this.key.sign(text);
      this.journal.insertCheckpoint(tx, { size, root, at, keyId: this.key.keyId, text, signature });
    });
  }

  /** Signs the head if it can: a damaged journal must not keep the office from working. Its verification tells. */
  trySigningHead(): void {
    try {
      this.signHead();
    } catch (error) {
      this.logger.error(
        `No checkpoint could be signed: ${error instanceof Error ? error.message : String(error)}`,
      );
    }
  }
}
