import { applyDecorators, Body, Controller, Param, Post, UseInterceptors } from '@nestjs/common';
import {
  ApiConflictResponse,
  ApiCreatedResponse,
  ApiHeader,
  ApiNotFoundResponse,
  ApiOperation,
  ApiTags,
  ApiUnprocessableEntityResponse,
} from '@nestjs/swagger';
import { CurrentActor } from '../common/access/current-actor.decorator.js';
import { Permission } from '../common/access/permission.decorator.js';
import type { Actor } from '../common/actor.js';
import { Sheet } from '../correlations/dto/sheet.dto.js';
import { IfMatch } from '../correlations/if-match.decorator.js';
import { SheetEtag } from '../correlations/sheet-etag.interceptor.js';
import { RevisionParams } from '../revisions/dto/revision-params.dto.js';
import {
  ApprovalBody,
  CommentBody,
  ReasonBody,
  ReviewBody,
  SubmissionBody,
  WithdrawalBody,
} from './dto/review-bodies.dto.js';
import { ReviewsService } from './reviews.service.js';

const Life = (operationId: string, summary: string) =>
  applyDecorators(
    ApiOperation({ operationId, summary }),
    ApiCreatedResponse({ type: Sheet, description: 'The sheet as it stands now' }),
    ApiNotFoundResponse({ description: 'There is no such revision that the caller may see' }),
    ApiConflictResponse({ description: "The revision's standing or content does not allow it" }),
  );

@ApiTags('Review and approval')
@Controller('correlations/:slug/revisions/:number')
@UseInterceptors(SheetEtag)
export class ReviewsController {
  constructor(private readonly reviews: ReviewsService) {}

  @Post('submission')
  @Permission('correlation.submit')
  @Life('submitRevision', 'Puts a draft into review, once the machine check passes')
  @ApiUnprocessableEntityResponse({ description: 'The sheet does not reproduce its own worked checks' })
  submit(@CurrentActor() actor: Actor, @Param() path: RevisionParams, @Body() body: SubmissionBody): Sheet {
    return this.reviews.submit(actor, path, body);
  }

  @Post('reviews')
  @Permission('correlation.review')
  @Life('reviewRevision', "A reviewer's verdict on the present content")
  @ApiHeader({
    name: 'If-Match',
    required: false,
    description: 'Hash of the content that was read, in quotes',
  })
  review(
    @CurrentActor() actor: Actor,
    @Param() path: RevisionParams,
    @Body() body: ReviewBody,
    @IfMatch() ifMatch: string | undefined,
  ): Sheet {
    return this.reviews.review(actor, path, body, ifMatch);
  }

  @Post('comments')
  @Permission('correlation.comment')
  @Life('commentOnRevision', 'A remark on one field, or on the whole')
  comment(@CurrentActor() actor: Actor, @Param() path: RevisionParams, @Body() body: CommentBody): Sheet {
    return this.reviews.comment(actor, path, body.field, body.text);
  }

  @Post('approval')
  @Permission('correlation.approve')
  @Life('approveRevision', "An authority's signature on the present content, with the password once more")
  approve(
    @CurrentActor() actor: Actor,
    @Param() path: RevisionParams,
    @Body() body: ApprovalBody,
  ): Promise<Sheet> {
    return this.reviews.approve(actor, path, body);
  }

  @Post('suspension')
  @Permission('correlation.suspend')
  @Life('suspendRevision', 'Takes a revision out of use while a problem is looked into')
  suspend(@CurrentActor() actor: Actor, @Param() path: RevisionParams, @Body() body: ReasonBody): Sheet {
    return this.reviews.suspend(actor, path, body.reason);
  }

  @Post('reinstatement')
  @Permission('correlation.suspend')
  @Life('reinstateRevision', 'Puts a suspended revision back into use')
  reinstate(@CurrentActor() actor: Actor, @Param() path: RevisionParams, @Body() body: ReasonBody): Sheet {
    return this.reviews.reinstate(actor, path, body.reason);
  }

  @Post('withdrawal')
  @Permission('correlation.withdraw')
  @Life('withdrawRevision', 'Takes a revision out of use for good')
  withdraw(@CurrentActor() actor: Actor, @Param() path: RevisionParams, @Body() body: WithdrawalBody): Sheet {
    return this.reviews.withdraw(actor, path, body.reason, body.class);
  }
}
