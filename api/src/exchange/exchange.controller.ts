import { Controller, Get, Header, HttpCode, Param, Post, UseInterceptors } from '@nestjs/common';
import { FileInterceptor } from '@nestjs/platform-express';
import {
  ApiBadRequestResponse,
  ApiBody,
  ApiConflictResponse,
  ApiConsumes,
  ApiCreatedResponse,
  ApiNotFoundResponse,
  ApiOkResponse,
  ApiOperation,
  ApiPayloadTooLargeResponse,
  ApiTags,
} from '@nestjs/swagger';
import { CurrentActor } from '../common/access/current-actor.decorator.js';
import { Permission } from '../common/access/permission.decorator.js';
import { Public } from '../common/access/public.decorator.js';
import type { Actor } from '../common/actor.js';
import { Sheet } from '../correlations/dto/sheet.dto.js';
import { RevisionParams } from '../revisions/dto/revision-params.dto.js';
import { ImportedRegister } from './dto/imported-register.dto.js';
import { RegisterExchangeService } from './register-exchange.service.js';
import type { ExchangedRegister } from './register-format.js';
import { SheetExchangeService } from './sheet-exchange.service.js';
import { SHEET_FILE_SCHEMA, type ExchangedSheet } from './sheet-format.js';
import { UploadedJson } from './uploaded-json.decorator.js';

const MEBIBYTE = 1024 * 1024;
const oneFile = (mebibytes: number) =>
  FileInterceptor('file', {
    limits: { fileSize: mebibytes * MEBIBYTE, files: 1, fields: 0, parts: 1, headerPairs: 20 },
  });
const JSON_FILE = { schema: { type: 'object', properties: { file: { type: 'string', format: 'binary' } } } };
const ANY_OBJECT = { schema: { type: 'object', additionalProperties: true } };

@ApiTags('Exchange')
@Controller()
export class ExchangeController {
  constructor(
    private readonly sheets: SheetExchangeService,
    private readonly register: RegisterExchangeService,
  ) {}

  @Get('schemas/sheet.json')
  @Public()
  @ApiOperation({ operationId: 'getSheetSchema', summary: 'The JSON Schema of a sheet as a file' })
  @ApiOkResponse(ANY_OBJECT)
  schema(): Readonly<Record<string, unknown>> {
    return SHEET_FILE_SCHEMA;
  }

  @Get('correlations/:slug/revisions/:number/sheet.json')
  @Permission('register.read')
  @Header('Content-Disposition', 'attachment; filename="sheet.json"')
  @ApiOperation({ operationId: 'downloadSheet', summary: 'A revision as a file' })
  @ApiOkResponse(ANY_OBJECT)
  @ApiNotFoundResponse({ description: 'There is no such revision that the caller may see' })
  file(@CurrentActor() actor: Actor, @Param() path: RevisionParams): ExchangedSheet {
    return this.sheets.file(actor, path);
  }

  @Post('exchange/sheets')
  @Permission('correlation.draft')
  @UseInterceptors(oneFile(1))
  @ApiOperation({
    operationId: 'uploadSheet',
    summary: 'Brings a sheet in as a draft: the file, or its JSON as the body',
  })
  @ApiConsumes('multipart/form-data', 'application/json')
  @ApiBody(JSON_FILE)
  @ApiCreatedResponse({ type: Sheet })
  @ApiBadRequestResponse({ description: 'The file does not hold; each fault with its path' })
  @ApiConflictResponse({ description: 'Another revision is still being worked on, or the slug is taken' })
  @ApiPayloadTooLargeResponse({ description: 'The file is larger than 1 MB' })
  bring(@CurrentActor() actor: Actor, @UploadedJson() value: object): Sheet {
    return this.sheets.bring(actor, value);
  }

  @Get('exchange/register.json')
  @Permission('register.export')
  @Header('Content-Disposition', 'attachment; filename="register.json"')
  @ApiOperation({
    operationId: 'exportRegister',
    summary:
      'The whole register with every iteration, standing, verdict, comment and signature, and its journals',
  })
  @ApiOkResponse(ANY_OBJECT)
  export(): ExchangedRegister {
    return this.register.file();
  }

  @Post('exchange/register')
  @Permission('register.import')
  @HttpCode(201)
  @UseInterceptors(oneFile(128))
  @ApiOperation({
    operationId: 'importRegister',
    summary: 'Brings a whole register in, where there is none yet',
  })
  @ApiConsumes('multipart/form-data', 'application/json')
  @ApiBody(JSON_FILE)
  @ApiCreatedResponse({ type: ImportedRegister })
  @ApiBadRequestResponse({ description: 'The file does not hold; each fault with its path' })
  @ApiConflictResponse({ description: 'This register is not empty' })
  @ApiPayloadTooLargeResponse({ description: 'The file is larger than 128 MB' })
  import(@CurrentActor() actor: Actor, @UploadedJson() value: object): ImportedRegister {
    return this.register.bring(actor, value);
  }
}
