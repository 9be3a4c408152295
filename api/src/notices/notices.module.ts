import { Module } from '@nestjs/common';
import { MailModule } from '../mail/mail.module.js';
import { PeopleModule } from '../people/people.module.js';
import { SettingsModule } from '../settings/settings.module.js';
import { NoticeRepository } from './notice.repository.js';
import { NoticesController } from './notices.controller.js';
import { NoticesService } from './notices.service.js';
import { OwnNoticesService } from './own-notices.service.js';

@Module({
  imports: [MailModule, PeopleModule, SettingsModule],
  controllers: [NoticesController],
  providers: [NoticeRepository, NoticesService, OwnNoticesService],
  exports: [NoticesService],
})
export class NoticesModule {}
