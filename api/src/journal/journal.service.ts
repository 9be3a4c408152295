import { Injectable } from '@nestjs/common';
import { Connection } from '../database/connection.js';
import { journalSize, MissingNodeError, storedNodes } from '../database/append-to-journal.js';
import { CheckpointService } from './checkpoint.service.js';
import {
  checkpointsResponse,
  journalItem,
  verificationResponse,
  type CheckpointsResponse,
  type JournalResponse,
  type VerificationResponse,
} from './dto/journal-response.dto.js';
import type { ListJournalDto } from './dto/list-journal.dto.js';
import { JournalRepository } from './journal.repository.js';
import { rootHash } from './merkle-tree.js';
import { verifyJournal } from './verify-journal.js';

const PAGE = 50;

@Injectable()
export class JournalService {
  constructor(
    private readonly journal: JournalRepository,
    private readonly checkpoints: CheckpointService,
    private readonly connection: Connection,
  ) {}

  list({ cursor, limit, subject }: ListJournalDto): JournalResponse {
    const size = journalSize(this.connection.reader);
    const wanted = Number(limit ?? PAGE);
    const rows = this.journal.latestBelow(Number(cursor ?? Number.MAX_SAFE_INTEGER), wanted + 1, subject);
    const items = rows.slice(0, wanted).map(journalItem);
    const last = items.at(-1);
    return {
      items,
      nextCursor: rows.length > wanted && last !== undefined ? String(last.index) : null,
      size,
      root: this.root(size),
    };
  }

  /** Signs the head of a journal found right, so that the next verification starts from more than this one did. */
  verify(): VerificationResponse {
    const verification = verifyJournal(this.journal);
    if (verification.ok) this.checkpoints.signHead();
    return verificationResponse(verification);
  }

  listCheckpoints(): CheckpointsResponse {
    return checkpointsResponse(this.journal.checkpoints(), this.journal.keys());
  }

  private root(size: number): string | null {
    try {
      return rootHash(size, storedNodes(this.connection.reader)).toString('hex');
    } catch (error) {
      if (error instanceof MissingNodeError) return null;
      throw error;
    }
  }
}
