import { Module } from '@nestjs/common';
import { MailModule } from '../mail/mail.module.js';
import { PeopleModule } from '../people/people.module.js';
import { SettingsModule } from '../settings/settings.module.js';
import { OwnSessionsController } from './own-sessions.controller.js';
import { OwnSessionsService } from './own-sessions.service.js';
import { SessionController } from './session.controller.js';
import { SessionRepository } from './session.repository.js';
import { SessionService } from './session.service.js';
import { SessionStore } from './session.store.js';
import { SignInPassport } from './sign-in-passport.js';

@Module({
  imports: [MailModule, PeopleModule, SettingsModule],
  controllers: [SessionController, OwnSessionsController],
  providers: [SessionRepository, SessionService, OwnSessionsService, SessionStore, SignInPassport],
  exports: [SessionStore, SignInPassport, OwnSessionsService],
})
export class SessionModule {}
