import { Module } from '@nestjs/common';
import { PeopleModule } from '../people/people.module.js';
import { HealthController } from './health.controller.js';
import { HealthService } from './health.service.js';

@Module({ imports: [PeopleModule], controllers: [HealthController], providers: [HealthService] })
export class HealthModule {}
