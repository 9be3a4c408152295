import { Injectable } from '@nestjs/common';
import type { Actor } from '../common/actor.js';
import type { Tx } from '../database/connection.js';

/** Somebody was made inactive, or is no technical authority any more. */
export interface Departure {
  readonly personId: string;
  readonly from: 'office' | 'authority';
  readonly by: Actor;
  readonly at: string;
  readonly reason: string;
}

export type Follower = (tx: Tx, departure: Departure) => void;

/** What else must happen when somebody leaves, in the same transaction: each feature adds its part. */
@Injectable()
export class Departures {
  private readonly followers: Follower[] = [];

  follow(follower: Follower): void {
    this.followers.push(follower);
  }

  tell(tx: Tx, departure: Departure): void {
    for (const follower of this.followers) follower(tx, departure);
  }
}
