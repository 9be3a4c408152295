import { Injectable } from '@nestjs/common';
import type { Request, Response } from 'express';
import { ANONYMOUS_ACTOR, type Actor } from '../common/actor.js';
import { AttemptLimiter } from '../common/attempt-limiter.js';
import { ApiProblem } from '../common/problem.js';
import { Config } from '../config/config.js';
import { Writer } from '../database/write.js';
import { DEMO_PASSWORD, demoPeople } from '../people/demo-people.js';
import { OfficeService } from '../people/office.service.js';
import { PeopleService } from '../people/people.service.js';
import { normalEmail } from '../people/person.js';
import {
  demoPeopleResponse,
  sessionResponse,
  type DemoPeopleResponse,
  type SessionResponse,
} from './dto/session-response.dto.js';
import { sessionCookieName, sessionCookieOptions } from './session-cookie.js';
import { SessionStore } from './session.store.js';
import { SignInPassport } from './sign-in-passport.js';

@Injectable()
export class SessionService {
  constructor(
    private readonly passport: SignInPassport,
    private readonly store: SessionStore,
    private readonly people: PeopleService,
    private readonly office: OfficeService,
    private readonly limiter: AttemptLimiter,
    private readonly writer: Writer,
    private readonly config: Config,
  ) {}

  /** Whoever the address belongs to or not: the same words, the same work and one journal row. */
  async signIn(email: string, request: Request, response: Response): Promise<SessionResponse> {
    const { windowSeconds, perAddress, perPerson } = this.config.signInLimits;
    const address = request.ip ?? 'unknown';
    const attempt = this.limiter.begin([
      { key: `address:${address}`, limit: perAddress, windowSeconds },
      { key: `email:${normalEmail(email)}`, limit: perPerson, windowSeconds },
    ]);
    const actor = await this.passport.authenticate(request, response);
    if (actor === undefined) {
      // Not what was typed: people type their password into the wrong field, and the journal keeps everything.
      const known = this.people.byEmail(email);
      this.writer.write(ANONYMOUS_ACTOR, 'session.refused', () => ({
        subject: known === undefined ? 'session' : `people/${known.id}`,
        detail: { address },
        result: undefined,
      }));
      throw new ApiProblem('sign-in-refused', 'The address or the password is not right.');
    }
    attempt.succeed();
    this.writer.write(actor, 'session.started', () => ({
      subject: `people/${actor.id}`,
      detail: { address },
      result: undefined,
    }));
    await this.passport.admit(request, actor);
    this.store.describe(request.sessionID, agentOf(request));
    return this.current(actor);
  }

  current(actor: Actor): SessionResponse {
    const person = this.people.byId(actor.id);
    if (person === undefined) throw new ApiProblem('not-signed-in', 'Sign in first.');
    return sessionResponse(person);
  }

  async signOut(actor: Actor, request: Request, response: Response): Promise<void> {
    await new Promise<void>((resolve, reject) => {
      request.session.destroy((error: unknown) => {
        if (error === null || error === undefined) resolve();
        else reject(error instanceof Error ? error : new Error('The session could not be ended.'));
      });
    });
    this.writer.write(actor, 'session.ended', () => ({
      subject: `people/${actor.id}`,
      detail: {},
      result: undefined,
    }));
    response.clearCookie(sessionCookieName(this.config), sessionCookieOptions(this.config));
  }

  /** The invented people, by role, for the sign-in page of a demo office. */
  demoPeople(): DemoPeopleResponse {
    if (!this.office.isDemo()) throw new ApiProblem('not-found', 'This is not a demo office.');
    return demoPeopleResponse(demoPeople(this.people.list()), DEMO_PASSWORD);
  }
}

const LONGEST_AGENT = 200;

function agentOf(request: Request): string {
  return oneLine(request.headers['user-agent'] ?? '').slice(0, LONGEST_AGENT);
}

/** Nothing in it may look like a line of its own. */
function oneLine(text: string): string {
  return text.replaceAll(/[\s\p{C}]+/gu, ' ').trim();
}
