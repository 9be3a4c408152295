import {
  Body,
  Controller,
  Get,
  Header,
  HttpCode,
  Param,
  Post,
  UploadedFile,
  UseInterceptors,
  type StreamableFile,
} from '@nestjs/common';
import { FileInterceptor } from '@nestjs/platform-express';
import {
  ApiBody,
  ApiConflictResponse,
  ApiConsumes,
  ApiCreatedResponse,
  ApiNotFoundResponse,
  ApiOkResponse,
  ApiOperation,
  ApiPayloadTooLargeResponse,
  ApiProduces,
  ApiTags,
  ApiUnsupportedMediaTypeResponse,
} from '@nestjs/swagger';
import { CurrentActor } from '../common/access/current-actor.decorator.js';
import { Permission } from '../common/access/permission.decorator.js';
import type { Actor } from '../common/actor.js';
import { LICENCES, MEDIA_TYPES } from '../common/attachment.js';
import { RevisionParams } from '../revisions/dto/revision-params.dto.js';
import { AttachmentsService } from './attachments.service.js';
import { AttachmentForm, AttachmentParams, LicenceBody } from './dto/attachment-bodies.dto.js';
import { AttachmentItem, AttachmentsResponse } from './dto/attachments-response.dto.js';
import { LARGEST_DOCUMENT_BYTES } from './inspect-document.js';
import type { UploadedDocument } from './uploaded-document.js';

const ONE_DOCUMENT = {
  limits: {
    fileSize: LARGEST_DOCUMENT_BYTES,
    files: 1,
    fields: 4,
    parts: 5,
    fieldSize: 200,
    fieldNameSize: 50,
    headerPairs: 20,
  },
  defParamCharset: 'utf8',
};

@ApiTags('Attachments')
@Controller('correlations/:slug/revisions/:number/attachments')
export class AttachmentsController {
  constructor(private readonly attachments: AttachmentsService) {}

  @Get()
  @Permission('register.read')
  @ApiOperation({
    operationId: 'listAttachments',
    summary: 'Documents attached to the sources of a revision',
  })
  @ApiOkResponse({ type: AttachmentsResponse })
  @ApiNotFoundResponse({ description: 'There is no such revision that the caller may see' })
  list(@CurrentActor() actor: Actor, @Param() { slug, number }: RevisionParams): AttachmentsResponse {
    return this.attachments.list(actor, { kind: 'correlation', slug, number });
  }

  @Post()
  @Permission('attachment.add')
  @UseInterceptors(FileInterceptor('file', ONE_DOCUMENT))
  @ApiOperation({
    operationId: 'addAttachment',
    summary: 'Attaches a PDF, PNG or JPEG of at most 15 MB to a source',
  })
  @ApiConsumes('multipart/form-data')
  @ApiBody({
    schema: {
      type: 'object',
      required: ['file', 'source', 'licence'],
      properties: {
        file: { type: 'string', format: 'binary' },
        source: { type: 'string', description: 'Index of the source that the document is of' },
        licence: { type: 'string', enum: [...LICENCES] },
      },
    },
  })
  @ApiCreatedResponse({ type: AttachmentItem })
  @ApiConflictResponse({ description: 'The document is attached already' })
  @ApiPayloadTooLargeResponse({ description: 'The file is larger than 15 MB' })
  @ApiUnsupportedMediaTypeResponse({
    description: 'The file is no whole PDF, PNG or JPEG, or is more than that',
  })
  add(
    @CurrentActor() actor: Actor,
    @Param() { slug, number }: RevisionParams,
    @Body() form: AttachmentForm,
    @UploadedFile() file: UploadedDocument | undefined,
  ): Promise<AttachmentItem> {
    return this.attachments.add(actor, { kind: 'correlation', slug, number }, form, file);
  }

  @Get(':id/file')
  @Permission('register.read')
  @Header('X-Content-Type-Options', 'nosniff')
  @Header('Content-Security-Policy', "sandbox; default-src 'none'")
  @ApiOperation({ operationId: 'downloadAttachment', summary: 'The document, always as a file to save' })
  @ApiProduces(...MEDIA_TYPES)
  @ApiOkResponse({ schema: { type: 'string', format: 'binary' } })
  @ApiNotFoundResponse({ description: 'There is no such document that the caller may see' })
  file(
    @CurrentActor() actor: Actor,
    @Param() { slug, number, id }: AttachmentParams,
  ): Promise<StreamableFile> {
    return this.attachments.file(actor, { kind: 'correlation', slug, number }, id);
  }

  @Post(':id/licence')
  @Permission('attachment.add')
  @HttpCode(200)
  @ApiOperation({
    operationId: 'setAttachmentLicence',
    summary: 'Says anew whether a document may leave the office',
  })
  @ApiOkResponse({ type: AttachmentItem })
  @ApiNotFoundResponse({ description: 'There is no such document that the caller may see' })
  setLicence(
    @CurrentActor() actor: Actor,
    @Param() { slug, number, id }: AttachmentParams,
    @Body() { licence }: LicenceBody,
  ): AttachmentItem {
    return this.attachments.setLicence(actor, { kind: 'correlation', slug, number }, id, licence);
  }
}
