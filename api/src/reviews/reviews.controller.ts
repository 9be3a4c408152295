import { Body, Controller, Param, Post, UseInterceptors } from '@nestjs/common';
import { ApiHeader, ApiTags, ApiUnprocessableEntityResponse } from '@nestjs/swagger';
import { CurrentActor } from '../common/access/current-actor.decorator.js';
import { Permission } from '../common/access/permission.decorator.js';
import type { Actor } from '../common/actor.js';
import { Sheet } from '../correlations/dto/sheet.dto.js';
import { IfMatch } from '../correlations/if-match.decorator.js';
import { SheetEtag } from '../correlations/sheet-etag.interceptor.js';
import { RevisionParams } from '../revisions/dto/revision-params.dto.js';
import {
  ApprovalBody,
  NoteBody,
  ReasonBody,
  ReviewBody,
  SubmissionBody,
  SuspensionBody,
  WithdrawalBody,
} from './dto/review-bodies.dto.js';
import { Life } from './life.decorator.js';
import { ReviewsService } from './reviews.service.js';

@ApiTags('Review and approval')
@Controller('correlations/:slug/revisions/:number')
@UseInterceptors(SheetEtag)
export class ReviewsController {
  constructor(private readonly reviews: ReviewsService) {}

  @Post('submission')
  @Permission('correlation.submit')
  @Life('submitRevision', 'Puts a draft into review, once the machine check passes')
  @ApiUnprocessableEntityResponse({
    description: 'The machine found errors: named in `fields`, whole in `inspection`',
  })
  submit(@CurrentActor() actor: Actor, @Param() path: RevisionParams, @Body() body: SubmissionBody): Sheet {
    return this.reviews.submit(actor, path, body);
  }

  @Post('iterations')
  @Permission('correlation.submit')
  @Life('putRevisionForward', 'Says that a revision in review is ready again, after changes or answers')
  @ApiUnprocessableEntityResponse({ description: 'The machine found errors' })
  putForward(@CurrentActor() actor: Actor, @Param() path: RevisionParams, @Body() body: NoteBody): Sheet {
    return this.reviews.putForward(actor, path, body.note);
  }

  @Post('assignments')
  @Permission('correlation.review')
  @Life('takeReview', 'Takes a review from the desk')
  take(@CurrentActor() actor: Actor, @Param() path: RevisionParams): Sheet {
    return this.reviews.take(actor, path);
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

  @Post('decline')
  @Permission('correlation.approve')
  @Life('declineRevision', "An authority's no to a revision in review")
  decline(@CurrentActor() actor: Actor, @Param() path: RevisionParams, @Body() body: ReasonBody): Sheet {
    return this.reviews.decline(actor, path, body.reason);
  }

  @Post('suspension')
  @Permission('correlation.suspend')
  @Life('suspendRevision', 'Takes a revision out of use while a problem is looked into')
  suspend(@CurrentActor() actor: Actor, @Param() path: RevisionParams, @Body() body: SuspensionBody): Sheet {
    return this.reviews.suspend(actor, path, body);
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
    return this.reviews.withdraw(actor, path, body);
  }
}
