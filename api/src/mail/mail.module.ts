import { Module } from '@nestjs/common';
import { ScheduleModule } from '../schedule/schedule.module.js';
import { MailController } from './mail.controller.js';
import { MailDelivery } from './mail-delivery.js';
import { MailRepository } from './mail.repository.js';
import { MailService } from './mail.service.js';
import { MailTransport } from './mail-transport.js';
import { OutboxService } from './outbox.service.js';

@Module({
  imports: [ScheduleModule],
  controllers: [MailController],
  providers: [MailRepository, MailTransport, MailService, MailDelivery, OutboxService],
  exports: [MailService],
})
export class MailModule {}
