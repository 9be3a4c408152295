import { Injectable } from '@nestjs/common';
import { hash, verify } from '@node-rs/argon2';
import { ApiProblem } from '../common/problem.js';
import { Config } from '../config/config.js';
import { passwordFault, type PasswordOwner } from './password-rules.js';

/** Hashes and checks passwords with argon2id, at the cost that the settings give. */
@Injectable()
export class PasswordService {
  /** Stands in for the hash of somebody who does not exist, so that the answer takes as long. */
  private decoy: Promise<string> | undefined;

  constructor(private readonly config: Config) {}

  /** The hash of a password that somebody chooses. Throws at the field `password` when it cannot be taken. */
  async choose(password: string, owner: PasswordOwner): Promise<string> {
    const fault = passwordFault(password, owner);
    if (fault !== undefined) throw ApiProblem.ofField('malformed', 'password', fault);
    return this.hash(password);
  }

  /** The password as an argon2id string in PHC form. */
  hash(password: string): Promise<string> {
    const { memoryKiB, passes, lanes } = this.config.passwordCost;
    return hash(composed(password), { memoryCost: memoryKiB, timeCost: passes, parallelism: lanes });
  }

  /** Whether the password fits. Without a hash to hold it against it does the same work and says no. */
  async fits(password: string, passwordHash: string | null | undefined): Promise<boolean> {
    this.decoy ??= this.hash('nobody has this password');
    const decoy = await this.decoy;
    const fits = await verify(passwordHash ?? decoy, composed(password));
    return fits && typeof passwordHash === 'string';
  }
}

/** Keyboards send an accented letter as one character or as two; both are the same password. */
function composed(password: string): string {
  return password.normalize('NFC');
}
