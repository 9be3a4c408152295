import { Module } from '@nestjs/common';
import { PropertyEquationsModule } from '../property-equations/property-equations.module.js';
import { RevisionsModule } from '../revisions/revisions.module.js';
import { AlternativesService } from './alternatives.service.js';
import { EvaluationsController } from './evaluations.controller.js';
import { EvaluationsRepository } from './evaluations.repository.js';
import { EvaluationsService } from './evaluations.service.js';

@Module({
  imports: [RevisionsModule, PropertyEquationsModule],
  controllers: [EvaluationsController],
  providers: [EvaluationsService, AlternativesService, EvaluationsRepository],
})
export class EvaluationsModule {}
