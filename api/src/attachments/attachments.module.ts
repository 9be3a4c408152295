import { Module } from '@nestjs/common';
import { RevisionsModule } from '../revisions/revisions.module.js';
import { AttachmentRepository } from './attachment.repository.js';
import { AttachmentsController } from './attachments.controller.js';
import { AttachmentsService } from './attachments.service.js';
import { DocumentStoreService } from './document-store.service.js';

@Module({
  imports: [RevisionsModule],
  controllers: [AttachmentsController],
  providers: [AttachmentRepository, AttachmentsService, DocumentStoreService],
})
export class AttachmentsModule {}
