import { Body, Controller, Get, Param, Post, Put, Query, UseInterceptors } from '@nestjs/common';
import {
  ApiBadRequestResponse,
  ApiConflictResponse,
  ApiCreatedResponse,
  ApiHeader,
  ApiNotFoundResponse,
  ApiOkResponse,
  ApiOperation,
  ApiTags,
} from '@nestjs/swagger';
import { CurrentActor } from '../common/access/current-actor.decorator.js';
import { Permission } from '../common/access/permission.decorator.js';
import type { Actor } from '../common/actor.js';
import { RevisionParams } from '../revisions/dto/revision-params.dto.js';
import { CorrelationListService } from './correlation-list.service.js';
import { CorrelationsService } from './correlations.service.js';
import { CorrelationPage } from './dto/correlation-page.dto.js';
import { CorrelationQuery } from './dto/correlation-query.dto.js';
import { DefinitionBody, NewCorrelationBody } from './dto/draft.dto.js';
import { Sheet } from './dto/sheet.dto.js';
import { IfMatch } from './if-match.decorator.js';
import { SheetEtag } from './sheet-etag.interceptor.js';
import { SheetService } from './sheet.service.js';

@ApiTags('Register')
@Controller('correlations')
export class CorrelationsController {
  constructor(
    private readonly list: CorrelationListService,
    private readonly sheets: SheetService,
    private readonly correlations: CorrelationsService,
  ) {}

  @Get()
  @Permission('register.read')
  @ApiOperation({ operationId: 'listCorrelations', summary: 'The register, searched and filtered' })
  @ApiOkResponse({ type: CorrelationPage })
  page(@CurrentActor() actor: Actor, @Query() query: CorrelationQuery): CorrelationPage {
    return this.list.page(actor, query);
  }

  @Post()
  @Permission('correlation.draft')
  @UseInterceptors(SheetEtag)
  @ApiOperation({ operationId: 'createCorrelation', summary: 'A new correlation as a draft' })
  @ApiCreatedResponse({ type: Sheet })
  @ApiBadRequestResponse({ description: 'The definition does not hold; each fault with its path' })
  @ApiConflictResponse({ description: 'The slug is taken' })
  create(@CurrentActor() actor: Actor, @Body() body: NewCorrelationBody): Sheet {
    return this.correlations.create(actor, body.slug, body.definition);
  }

  @Get(':slug')
  @Permission('register.read')
  @UseInterceptors(SheetEtag)
  @ApiOperation({
    operationId: 'getCorrelation',
    summary: 'The sheet: the approved revision, else the latest that the caller may see',
  })
  @ApiOkResponse({ type: Sheet })
  @ApiNotFoundResponse({ description: 'There is none of this name that the caller may see' })
  shown(@CurrentActor() actor: Actor, @Param('slug') slug: string): Sheet {
    return this.sheets.shown(actor, slug);
  }

  @Post(':slug/revisions')
  @Permission('correlation.draft')
  @UseInterceptors(SheetEtag)
  @ApiOperation({ operationId: 'createRevision', summary: 'A draft of the next revision' })
  @ApiCreatedResponse({ type: Sheet })
  @ApiConflictResponse({ description: 'Another revision is still being worked on' })
  next(@CurrentActor() actor: Actor, @Param('slug') slug: string, @Body() body: DefinitionBody): Sheet {
    return this.correlations.next(actor, slug, body.definition);
  }

  @Get(':slug/revisions/:number')
  @Permission('register.read')
  @UseInterceptors(SheetEtag)
  @ApiOperation({ operationId: 'getRevision', summary: 'The sheet of one revision' })
  @ApiOkResponse({ type: Sheet })
  @ApiNotFoundResponse({ description: 'There is none that the caller may see' })
  revision(@CurrentActor() actor: Actor, @Param() { slug, number }: RevisionParams): Sheet {
    return this.sheets.revision(actor, slug, number);
  }

  @Put(':slug/revisions/:number')
  @Permission('correlation.draft')
  @UseInterceptors(SheetEtag)
  @ApiOperation({
    operationId: 'editRevision',
    summary: 'Puts other content into a draft, or into one in review',
  })
  @ApiHeader({
    name: 'If-Match',
    required: true,
    description: 'Hash of the content that was edited, in quotes',
  })
  @ApiOkResponse({ type: Sheet })
  @ApiConflictResponse({ description: 'The content was changed in the meantime, or can no longer be' })
  edit(
    @CurrentActor() actor: Actor,
    @Param() { slug, number }: RevisionParams,
    @Body() body: DefinitionBody,
    @IfMatch() ifMatch: string | undefined,
  ): Sheet {
    return this.correlations.edit(actor, slug, number, body.definition, ifMatch);
  }
}
