import { Module } from '@nestjs/common';
import { GeometriesModule } from '../geometries/geometries.module.js';
import { PropertyEquationsModule } from '../property-equations/property-equations.module.js';
import { RevisionsModule } from '../revisions/revisions.module.js';
import { CandidatesController } from './candidates.controller.js';
import { CandidatesService } from './candidates.service.js';

@Module({
  imports: [RevisionsModule, PropertyEquationsModule, GeometriesModule],
  controllers: [CandidatesController],
  providers: [CandidatesService],
})
export class CandidatesModule {}
