import { createHash, randomBytes } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock.js';
import { ApiProblem } from '../common/problem.js';
import type { Tx } from '../database/connection.js';
import { OneTimeLinkRepository, type LinkPurpose, type LinkRow } from './one-time-link.repository.js';

const TOKEN_BYTES = 32;
const HOUR_MS = 3_600_000;
const HOURS: Record<LinkPurpose, number> = {
  'first-administrator': 7 * 24,
  invitation: 7 * 24,
  'password-reset': 1,
};
const TOKEN = /^[A-Za-z0-9_-]{43}$/;

/** Tokens that let somebody in once: 256 random bits, kept as their hash alone. */
@Injectable()
export class OneTimeLinkService {
  constructor(
    private readonly links: OneTimeLinkRepository,
    private readonly clock: Clock,
  ) {}

  /** A new token; whatever the person still had for this purpose is void from now on. */
  make(tx: Tx, at: string, purpose: LinkPurpose, personId: string | null): string {
    const token = randomBytes(TOKEN_BYTES).toString('base64url');
    this.links.replace(tx, personId, purpose, at);
    this.links.insert(tx, {
      tokenHash: hashOf(token),
      purpose,
      personId,
      madeAt: at,
      expiresAt: new Date(Date.parse(at) + HOURS[purpose] * HOUR_MS).toISOString(),
    });
    return token;
  }

  /** What a token is good for; throws `not-found`, the same for one never made, used, replaced or expired. */
  look(token: string, purposes: readonly LinkPurpose[]): LinkRow {
    return this.find(token, purposes, this.clock.now().toISOString());
  }

  /** The same inside the act that uses it: of two at once only the first finds it. */
  use(tx: Tx, at: string, token: string, purposes: readonly LinkPurpose[]): LinkRow {
    const link = this.find(token, purposes, at, tx);
    this.links.use(tx, link.tokenHash, at);
    return link;
  }

  /** Voids what somebody still has for this purpose. */
  void(tx: Tx, at: string, purpose: LinkPurpose, personId: string | null): void {
    this.links.replace(tx, personId, purpose, at);
  }

  private find(token: string, purposes: readonly LinkPurpose[], at: string, tx?: Tx): LinkRow {
    const link = TOKEN.test(token) ? this.links.live(hashOf(token), at, tx) : undefined;
    if (link === undefined || !purposes.includes(link.purpose)) {
      throw new ApiProblem('not-found', 'This link does not hold, or not any more. Ask for a new one.');
    }
    return link;
  }
}

function hashOf(token: string): string {
  return createHash('sha256').update(token).digest('hex');
}
