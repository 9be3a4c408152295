import { Injectable } from '@nestjs/common';
import type { Request, RequestHandler, Response } from 'express';
import passport from 'passport';
import { Strategy } from 'passport-local';
import type { Actor } from '../common/actor.js';
import { PeopleService } from '../people/people.service.js';
import { actorFrom } from '../people/person.js';

/** Passport of this one server: who signs in with address and password, and who a session belongs to. */
@Injectable()
export class SignInPassport {
  private readonly passport = new passport.Passport();

  constructor(people: PeopleService) {
    this.passport.use(
      new Strategy({ usernameField: 'email', passwordField: 'password' }, (email, password, done) => {
        people.withCredentials(email, password).then(
          (person) => {
            done(null, person === undefined ? false : actorFrom(person));
          },
          (error: unknown) => {
            done(error);
          },
        );
      }),
    );
    this.passport.serializeUser((actor, done) => {
      done(null, actor.id);
    });
    // Asked at every request, so that somebody made inactive is out at once.
    this.passport.deserializeUser((id: string, done) => {
      done(null, people.activeActor(id) ?? false);
    });
  }

  /** Puts the session's person on the request. Comes after the session itself. */
  middleware(): RequestHandler {
    return this.passport.session() as RequestHandler;
  }

  /** Whoever the credentials in the body belong to. */
  authenticate(request: Request, response: Response): Promise<Actor | undefined> {
    return new Promise((resolve, reject) => {
      const settle = (error: unknown, actor?: Actor | false | null): void => {
        if (error === null || error === undefined)
          resolve(actor === false ? undefined : (actor ?? undefined));
        else reject(asError(error));
      };
      const handle = this.passport.authenticate('local', settle) as RequestHandler;
      void handle(request, response, settle);
    });
  }

  /** Begins a session under a new id. */
  admit(request: Request, actor: Actor): Promise<void> {
    return new Promise((resolve, reject) => {
      request.logIn(actor, (error: unknown) => {
        if (error === null || error === undefined) resolve();
        else reject(asError(error));
      });
    });
  }
}

function asError(error: unknown): Error {
  return error instanceof Error ? error : new Error(String(error));
}
