import { Module } from '@nestjs/common';
import { PeopleModule } from '../people/people.module.js';
import { SessionController } from './session.controller.js';
import { SessionRepository } from './session.repository.js';
import { SessionService } from './session.service.js';
import { SessionStore } from './session.store.js';
import { SignInPassport } from './sign-in-passport.js';

@Module({
  imports: [PeopleModule],
  controllers: [SessionController],
  providers: [SessionRepository, SessionService, SessionStore, SignInPassport],
  exports: [SessionStore, SignInPassport],
})
export class SessionModule {}
