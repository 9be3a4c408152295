import { Module } from '@nestjs/common';
import { NoticesModule } from '../notices/notices.module.js';
import { PeopleModule } from '../people/people.module.js';
import { RevisionsModule } from '../revisions/revisions.module.js';
import { ProblemReportsController } from './problem-reports.controller.js';
import { ProblemReportsRepository } from './problem-reports.repository.js';
import { ProblemReportsService } from './problem-reports.service.js';

@Module({
  imports: [RevisionsModule, PeopleModule, NoticesModule],
  controllers: [ProblemReportsController],
  providers: [ProblemReportsRepository, ProblemReportsService],
  exports: [ProblemReportsService],
})
export class ProblemReportsModule {}
