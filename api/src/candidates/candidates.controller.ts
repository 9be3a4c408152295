import { Body, Controller, HttpCode, Post } from '@nestjs/common';
import { ApiBadRequestResponse, ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { CurrentActor } from '../common/access/current-actor.decorator.js';
import { Permission } from '../common/access/permission.decorator.js';
import type { Actor } from '../common/actor.js';
import { CandidatesService } from './candidates.service.js';
import { CandidatesBody } from './dto/candidates-body.dto.js';
import { CandidatesResponse } from './dto/candidates-response.dto.js';

@ApiTags('Evaluation')
@Controller('candidates')
export class CandidatesController {
  constructor(private readonly candidates: CandidatesService) {}

  @Post()
  @HttpCode(200)
  @Permission('correlation.evaluate')
  @ApiOperation({ operationId: 'findCandidates', summary: 'Every sheet of a geometry held against one duty' })
  @ApiOkResponse({ type: CandidatesResponse })
  @ApiBadRequestResponse({ description: 'A name, a unit or a value cannot be used' })
  find(@CurrentActor() actor: Actor, @Body() body: CandidatesBody): CandidatesResponse {
    return this.candidates.find(actor, body);
  }
}
