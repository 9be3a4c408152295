import { Module } from '@nestjs/common';
import { AppointmentsModule } from '../appointments/appointments.module.js';
import { GeometriesModule } from '../geometries/geometries.module.js';
import { PropertyEquationsModule } from '../property-equations/property-equations.module.js';
import { RevisionsModule } from '../revisions/revisions.module.js';
import { CorrelationListReadModel } from './correlation-list.read-model.js';
import { CorrelationListService } from './correlation-list.service.js';
import { CorrelationsController } from './correlations.controller.js';
import { CorrelationsService } from './correlations.service.js';
import { DifferencesController } from './differences.controller.js';
import { DifferencesService } from './differences.service.js';
import { DraftingService } from './drafting.service.js';
import { SheetReadModel } from './sheet.read-model.js';
import { SheetService } from './sheet.service.js';

@Module({
  imports: [RevisionsModule, GeometriesModule, PropertyEquationsModule, AppointmentsModule],
  controllers: [DifferencesController, CorrelationsController],
  providers: [
    CorrelationListReadModel,
    CorrelationListService,
    CorrelationsService,
    DifferencesService,
    DraftingService,
    SheetReadModel,
    SheetService,
  ],
  exports: [DraftingService, SheetService],
})
export class CorrelationsModule {}
