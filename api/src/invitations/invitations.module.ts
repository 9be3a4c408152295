import { Module } from '@nestjs/common';
import { MailModule } from '../mail/mail.module.js';
import { PeopleModule } from '../people/people.module.js';
import { SettingsModule } from '../settings/settings.module.js';
import { FirstAdministratorService } from './first-administrator.service.js';
import { InvitationsController } from './invitations.controller.js';
import { InvitationsService } from './invitations.service.js';

@Module({
  imports: [MailModule, PeopleModule, SettingsModule],
  controllers: [InvitationsController],
  providers: [FirstAdministratorService, InvitationsService],
  exports: [FirstAdministratorService],
})
export class InvitationsModule {}
