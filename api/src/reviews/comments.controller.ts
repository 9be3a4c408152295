import { Body, Controller, Param, Post, UseInterceptors } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { CurrentActor } from '../common/access/current-actor.decorator.js';
import { Permission } from '../common/access/permission.decorator.js';
import type { Actor } from '../common/actor.js';
import { Sheet } from '../correlations/dto/sheet.dto.js';
import { SheetEtag } from '../correlations/sheet-etag.interceptor.js';
import { RevisionParams } from '../revisions/dto/revision-params.dto.js';
import { CommentParams } from './dto/comment-params.dto.js';
import { CommentBody, TextBody } from './dto/review-bodies.dto.js';
import { Life } from './life.decorator.js';
import { ReviewsService } from './reviews.service.js';

@ApiTags('Review and approval')
@Controller('correlations/:slug/revisions/:number/comments')
@UseInterceptors(SheetEtag)
export class CommentsController {
  constructor(private readonly reviews: ReviewsService) {}

  @Post()
  @Permission('correlation.comment')
  @Life('commentOnRevision', 'A remark on one field, or on the whole')
  comment(@CurrentActor() actor: Actor, @Param() path: RevisionParams, @Body() body: CommentBody): Sheet {
    return this.reviews.comment(actor, path, body.field, body.text);
  }

  @Post(':id/answers')
  @Permission('correlation.comment')
  @Life('answerComment', 'What is to be said to a comment')
  answer(@CurrentActor() actor: Actor, @Param() path: CommentParams, @Body() body: TextBody): Sheet {
    return this.reviews.answer(actor, path, path.id, body.text);
  }

  @Post(':id/resolution')
  @Permission('correlation.comment')
  @Life('resolveComment', 'Settles a comment: by whoever made it, or by the originator once it has an answer')
  resolve(@CurrentActor() actor: Actor, @Param() path: CommentParams): Sheet {
    return this.reviews.resolve(actor, path, path.id);
  }
}
