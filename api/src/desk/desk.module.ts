import { Module } from '@nestjs/common';
import { AppointmentsModule } from '../appointments/appointments.module.js';
import { RevisionsModule } from '../revisions/revisions.module.js';
import { SettingsModule } from '../settings/settings.module.js';
import { DeskController } from './desk.controller.js';
import { DeskReadModel } from './desk.read-model.js';
import { DeskService } from './desk.service.js';

@Module({
  imports: [RevisionsModule, AppointmentsModule, SettingsModule],
  controllers: [DeskController],
  providers: [DeskReadModel, DeskService],
})
export class DeskModule {}
