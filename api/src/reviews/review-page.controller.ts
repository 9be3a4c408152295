import { Controller, Get, Param } from '@nestjs/common';
import { ApiNotFoundResponse, ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { CurrentActor } from '../common/access/current-actor.decorator.js';
import { Permission } from '../common/access/permission.decorator.js';
import type { Actor } from '../common/actor.js';
import { RevisionParams } from '../revisions/dto/revision-params.dto.js';
import { ReviewPage } from './dto/review-page.dto.js';
import { ReviewPageService } from './review-page.service.js';

@ApiTags('Review and approval')
@Controller('correlations/:slug/revisions/:number/review')
export class ReviewPageController {
  constructor(private readonly pages: ReviewPageService) {}

  @Get()
  @Permission('register.read')
  @ApiOperation({
    operationId: 'getReview',
    summary: 'The review of a revision: report, reviewers, verdicts, comments, iterations',
  })
  @ApiOkResponse({ type: ReviewPage })
  @ApiNotFoundResponse({ description: 'There is no such revision that the caller may see' })
  page(@CurrentActor() actor: Actor, @Param() path: RevisionParams): ReviewPage {
    return this.pages.page(actor, path);
  }
}
