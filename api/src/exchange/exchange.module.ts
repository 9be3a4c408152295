import { Module } from '@nestjs/common';
import { CorrelationsModule } from '../correlations/correlations.module.js';
import { RevisionsModule } from '../revisions/revisions.module.js';
import { ExchangeController } from './exchange.controller.js';
import { JournalsReadModel } from './journals.read-model.js';
import { RegisterExchangeService } from './register-exchange.service.js';
import { RegisterExportReadModel } from './register-export.read-model.js';
import { RegisterImportRepository } from './register-import.repository.js';
import { SheetExchangeService } from './sheet-exchange.service.js';

@Module({
  imports: [RevisionsModule, CorrelationsModule],
  controllers: [ExchangeController],
  providers: [
    JournalsReadModel,
    RegisterExchangeService,
    RegisterExportReadModel,
    RegisterImportRepository,
    SheetExchangeService,
  ],
})
export class ExchangeModule {}
