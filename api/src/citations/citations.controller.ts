import { Body, Controller, Get, HttpCode, Param, Post, Query, type StreamableFile } from '@nestjs/common';
import {
  ApiBadRequestResponse,
  ApiNotFoundResponse,
  ApiOkResponse,
  ApiOperation,
  ApiProduces,
  ApiTags,
} from '@nestjs/swagger';
import { CurrentActor } from '../common/access/current-actor.decorator.js';
import { Permission } from '../common/access/permission.decorator.js';
import type { Actor } from '../common/actor.js';
import { RevisionParams } from '../revisions/dto/revision-params.dto.js';
import { CitationsService } from './citations.service.js';
import { CitationExportQuery } from './dto/citation-export.dto.js';
import { ReadingBody, ReadingResponse } from './dto/reading.dto.js';

@ApiTags('Citations')
@Controller()
export class CitationsController {
  constructor(private readonly citations: CitationsService) {}

  @Post('citations/reading')
  @Permission('correlation.submit')
  @HttpCode(200)
  @ApiOperation({
    operationId: 'readCitations',
    summary: 'Reads BibTeX, RIS or CSL-JSON into citation items; keeps nothing',
  })
  @ApiOkResponse({ type: ReadingResponse })
  @ApiBadRequestResponse({ description: 'The text cannot be taken as references; the reason with its line' })
  read(@CurrentActor() actor: Actor, @Body() { text, format }: ReadingBody): ReadingResponse {
    return this.citations.read(actor, text, format);
  }

  @Get('correlations/:slug/revisions/:number/citations')
  @Permission('register.read')
  @ApiOperation({ operationId: 'exportCitations', summary: 'The sources of a revision as a file' })
  @ApiProduces(
    'application/x-bibtex',
    'application/x-research-info-systems',
    'application/vnd.citationstyles.csl+json',
  )
  @ApiOkResponse({ schema: { type: 'string', format: 'binary' } })
  @ApiNotFoundResponse({ description: 'There is no such revision that the caller may see' })
  file(
    @CurrentActor() actor: Actor,
    @Param() { slug, number }: RevisionParams,
    @Query() { format }: CitationExportQuery,
  ): StreamableFile {
    return this.citations.file(actor, slug, number, format);
  }
}
