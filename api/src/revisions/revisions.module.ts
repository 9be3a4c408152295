import { Module } from '@nestjs/common';
import { DefinitionsService } from './definitions.service.js';
import { NamesReadModel } from './names.read-model.js';
import { RevisionRepository } from './revision.repository.js';
import { RevisionsService } from './revisions.service.js';

/** Revisions of correlations and property equations: what the features of the register stand on. */
@Module({
  providers: [RevisionRepository, NamesReadModel, RevisionsService, DefinitionsService],
  exports: [RevisionsService, DefinitionsService],
})
export class RevisionsModule {}
