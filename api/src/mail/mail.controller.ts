import { Controller, Get } from '@nestjs/common';
import { ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { Permission } from '../common/access/permission.decorator.js';
import { OutboxResponse } from './dto/outbox-response.dto.js';
import { OutboxService } from './outbox.service.js';

@ApiTags('Mail')
@Controller('mail')
export class MailController {
  constructor(private readonly outbox: OutboxService) {}

  @Get('outbox')
  @Permission('mail.read')
  @ApiOperation({ operationId: 'listOutbox', summary: 'The latest letters and what became of them' })
  @ApiOkResponse({ type: OutboxResponse })
  list(): OutboxResponse {
    return this.outbox.list();
  }
}
