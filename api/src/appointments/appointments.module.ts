import { Module } from '@nestjs/common';
import { GeometriesModule } from '../geometries/geometries.module.js';
import { NoticesModule } from '../notices/notices.module.js';
import { PeopleModule } from '../people/people.module.js';
import { ScheduleModule } from '../schedule/schedule.module.js';
import { SettingsModule } from '../settings/settings.module.js';
import { AppointmentEndsService } from './appointment-ends.service.js';
import { AppointmentRepository } from './appointment.repository.js';
import { AppointmentsController } from './appointments.controller.js';
import { AppointmentsService } from './appointments.service.js';

@Module({
  imports: [GeometriesModule, NoticesModule, PeopleModule, ScheduleModule, SettingsModule],
  controllers: [AppointmentsController],
  providers: [AppointmentRepository, AppointmentsService, AppointmentEndsService],
  exports: [AppointmentsService],
})
export class AppointmentsModule {}
