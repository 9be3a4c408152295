import { Body, Controller, Get, Param, Post, Put, Query } from '@nestjs/common';
import {
  ApiCreatedResponse,
  ApiNotFoundResponse,
  ApiOkResponse,
  ApiOperation,
  ApiTags,
  ApiUnauthorizedResponse,
} from '@nestjs/swagger';
import { CurrentActor } from '../common/access/current-actor.decorator.js';
import { SignedIn } from '../common/access/signed-in.decorator.js';
import type { Actor } from '../common/actor.js';
import { ListNoticesDto, NoticeChoicesDto, NoticeParams } from './dto/notices-query.dto.js';
import { NoticeChoices, NoticeItem, NoticesResponse } from './dto/notices-response.dto.js';
import { OwnNoticesService } from './own-notices.service.js';

@ApiTags('Notices')
@ApiUnauthorizedResponse({ description: 'Not signed in' })
@Controller('notices')
export class NoticesController {
  constructor(private readonly notices: OwnNoticesService) {}

  @Get()
  @SignedIn()
  @ApiOperation({ operationId: 'listNotices', summary: "The caller's own notices" })
  @ApiOkResponse({ type: NoticesResponse })
  list(@CurrentActor() actor: Actor, @Query() query: ListNoticesDto): NoticesResponse {
    return this.notices.list(actor, query);
  }

  @Get('preferences')
  @SignedIn()
  @ApiOperation({ operationId: 'getNoticePreferences', summary: 'Which notices come by mail, too' })
  @ApiOkResponse({ type: NoticeChoices })
  choices(@CurrentActor() actor: Actor): NoticeChoices {
    return this.notices.choices(actor);
  }

  @Put('preferences')
  @SignedIn()
  @ApiOperation({ operationId: 'setNoticePreferences', summary: 'Choose which notices come by mail' })
  @ApiOkResponse({ type: NoticeChoices })
  choose(@CurrentActor() actor: Actor, @Body() body: NoticeChoicesDto): NoticeChoices {
    return this.notices.choose(actor, body.mail);
  }

  @Post(':id/reading')
  @SignedIn()
  @ApiOperation({ operationId: 'readNotice', summary: 'Say that a notice was read' })
  @ApiCreatedResponse({ type: NoticeItem })
  @ApiNotFoundResponse({ description: 'The caller has no such notice' })
  read(@CurrentActor() actor: Actor, @Param() path: NoticeParams): NoticeItem {
    return this.notices.read(actor, Number(path.id));
  }
}
