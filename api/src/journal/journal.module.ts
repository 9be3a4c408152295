import { Module } from '@nestjs/common';
import { CheckpointService } from './checkpoint.service.js';
import { JournalController } from './journal.controller.js';
import { JournalRepository } from './journal.repository.js';
import { JournalService } from './journal.service.js';

@Module({
  controllers: [JournalController],
  providers: [JournalRepository, JournalService, CheckpointService],
})
export class JournalModule {}
