import { Body, Controller, Get, Param, Post } from '@nestjs/common';
import {
  ApiConflictResponse,
  ApiCreatedResponse,
  ApiNotFoundResponse,
  ApiOkResponse,
  ApiOperation,
  ApiTags,
} from '@nestjs/swagger';
import { CurrentActor } from '../common/access/current-actor.decorator.js';
import { Permission } from '../common/access/permission.decorator.js';
import type { Actor } from '../common/actor.js';
import {
  CorrelationParams,
  ProblemReport,
  ProblemReportAnswerBody,
  ProblemReportBody,
  ProblemReportParams,
  ProblemReportsResponse,
} from './dto/problem-report.dto.js';
import { ProblemReportsService } from './problem-reports.service.js';

@ApiTags('Problem reports')
@Controller()
export class ProblemReportsController {
  constructor(private readonly reports: ProblemReportsService) {}

  @Get('correlations/:slug/problem-reports')
  @Permission('register.read')
  @ApiOperation({ operationId: 'listProblemReports', summary: 'What was found wrong with a correlation' })
  @ApiOkResponse({ type: ProblemReportsResponse })
  @ApiNotFoundResponse({ description: 'There is none of this name that the caller may see' })
  list(@CurrentActor() actor: Actor, @Param() { slug }: CorrelationParams): ProblemReportsResponse {
    return this.reports.list(actor, slug);
  }

  @Post('correlations/:slug/problem-reports')
  @Permission('problem-report.file')
  @ApiOperation({ operationId: 'fileProblemReport', summary: 'Reports a problem with a revision' })
  @ApiCreatedResponse({ type: ProblemReport })
  @ApiNotFoundResponse({ description: 'There is no such revision that the caller may see' })
  @ApiConflictResponse({ description: 'The revision was never approved: it takes comments instead' })
  file(
    @CurrentActor() actor: Actor,
    @Param() { slug }: CorrelationParams,
    @Body() body: ProblemReportBody,
  ): ProblemReport {
    return this.reports.file(actor, slug, body);
  }

  @Post('problem-reports/:id/answer')
  @Permission('problem-report.answer')
  @ApiOperation({ operationId: 'answerProblemReport', summary: 'Says what was found, and closes the report' })
  @ApiCreatedResponse({ type: ProblemReport })
  @ApiConflictResponse({ description: 'It was answered already' })
  answer(
    @CurrentActor() actor: Actor,
    @Param() { id }: ProblemReportParams,
    @Body() body: ProblemReportAnswerBody,
  ): ProblemReport {
    return this.reports.answer(actor, id, body);
  }
}
