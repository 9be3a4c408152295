import { Module } from '@nestjs/common';
import { RevisionsModule } from '../revisions/revisions.module.js';
import { PropertyEquationsController } from './property-equations.controller.js';
import { PropertyEquationsService } from './property-equations.service.js';
import { PropertyLibraryService } from './property-library.service.js';

@Module({
  imports: [RevisionsModule],
  controllers: [PropertyEquationsController],
  providers: [PropertyEquationsService, PropertyLibraryService],
  exports: [PropertyEquationsService, PropertyLibraryService],
})
export class PropertyEquationsModule {}
