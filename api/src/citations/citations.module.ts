import { Module } from '@nestjs/common';
import { RevisionsModule } from '../revisions/revisions.module.js';
import { CitationsController } from './citations.controller.js';
import { CitationsReadModel } from './citations.read-model.js';
import { CitationsService } from './citations.service.js';

@Module({
  imports: [RevisionsModule],
  controllers: [CitationsController],
  providers: [CitationsReadModel, CitationsService],
})
export class CitationsModule {}
