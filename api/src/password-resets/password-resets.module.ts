import { Module } from '@nestjs/common';
import { MailModule } from '../mail/mail.module.js';
import { PeopleModule } from '../people/people.module.js';
import { SessionModule } from '../session/session.module.js';
import { SettingsModule } from '../settings/settings.module.js';
import { PasswordResetsController } from './password-resets.controller.js';
import { PasswordResetsService } from './password-resets.service.js';

@Module({
  imports: [MailModule, PeopleModule, SessionModule, SettingsModule],
  controllers: [PasswordResetsController],
  providers: [PasswordResetsService],
})
export class PasswordResetsModule {}
