import { Controller, Get, Param, Query } from '@nestjs/common';
import { ApiNotFoundResponse, ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { CurrentActor } from '../common/access/current-actor.decorator.js';
import { Permission } from '../common/access/permission.decorator.js';
import type { Actor } from '../common/actor.js';
import { DifferencesService } from './differences.service.js';
import { DifferencesQuery, DifferencesResponse } from './dto/differences.dto.js';

@ApiTags('Register')
@Controller('correlations/:slug/differences')
export class DifferencesController {
  constructor(private readonly differences: DifferencesService) {}

  @Get()
  @Permission('register.read')
  @ApiOperation({
    operationId: 'compareRevisions',
    summary: 'What changed between two revisions, field by field',
  })
  @ApiOkResponse({ type: DifferencesResponse })
  @ApiNotFoundResponse({ description: 'There is none of this name and number that the caller may see' })
  between(
    @CurrentActor() actor: Actor,
    @Param('slug') slug: string,
    @Query() query: DifferencesQuery,
  ): DifferencesResponse {
    return this.differences.between(actor, slug, query);
  }
}
