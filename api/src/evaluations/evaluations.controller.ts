import { Body, Controller, Get, HttpCode, Param, Post } from '@nestjs/common';
import {
  ApiBadRequestResponse,
  ApiConflictResponse,
  ApiNotFoundResponse,
  ApiOkResponse,
  ApiOperation,
  ApiTags,
  ApiUnprocessableEntityResponse,
} from '@nestjs/swagger';
import { CurrentActor } from '../common/access/current-actor.decorator.js';
import { Permission } from '../common/access/permission.decorator.js';
import type { Actor } from '../common/actor.js';
import { EvaluationBody } from './dto/evaluation-body.dto.js';
import type { EvaluationResponse } from './dto/evaluation-response.dto.js';
import { EVALUATION_SCHEMA, KeptEvaluation } from './dto/kept-evaluation.dto.js';
import { EvaluationsService } from './evaluations.service.js';

@ApiTags('Evaluation')
@Controller()
export class EvaluationsController {
  constructor(private readonly evaluations: EvaluationsService) {}

  @Post('correlations/:slug/evaluations')
  @HttpCode(200)
  @Permission('correlation.evaluate')
  @ApiOperation({ operationId: 'evaluateCorrelation', summary: 'A coefficient for a duty, with every step' })
  @ApiOkResponse({ schema: EVALUATION_SCHEMA })
  @ApiBadRequestResponse({ description: 'Inputs are missing, unknown, over-determined or in a wrong unit' })
  @ApiConflictResponse({ description: 'The revision is not in use' })
  @ApiUnprocessableEntityResponse({
    description: 'Outside a bound: findings, and sheets to turn to. No number',
  })
  evaluate(
    @CurrentActor() actor: Actor,
    @Param('slug') slug: string,
    @Body() body: EvaluationBody,
  ): EvaluationResponse {
    return this.evaluations.evaluate(actor, slug, body);
  }

  @Get('evaluations/:id')
  @Permission('register.read')
  @ApiOperation({ operationId: 'getEvaluation', summary: 'A kept evaluation, with what was asked' })
  @ApiOkResponse({ type: KeptEvaluation })
  @ApiNotFoundResponse({ description: 'There is none of this id among those the caller may see' })
  kept(@CurrentActor() actor: Actor, @Param('id') id: string): KeptEvaluation {
    return this.evaluations.kept(actor, id);
  }
}
