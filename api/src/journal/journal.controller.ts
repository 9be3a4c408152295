import { Controller, Get, HttpCode, Post, Query } from '@nestjs/common';
import { ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { Permission } from '../common/access/permission.decorator.js';
import { CheckpointsResponse, JournalResponse, VerificationResponse } from './dto/journal-response.dto.js';
import { ListJournalDto } from './dto/list-journal.dto.js';
import { JournalService } from './journal.service.js';

@ApiTags('Journal')
@Controller('journal')
export class JournalController {
  constructor(private readonly journal: JournalService) {}

  @Get()
  @Permission('journal.read')
  @ApiOperation({ operationId: 'listJournal', summary: 'Entries of the journal, the latest first' })
  @ApiOkResponse({ type: JournalResponse })
  list(@Query() query: ListJournalDto): JournalResponse {
    return this.journal.list(query);
  }

  @Post('verification')
  @Permission('journal.verify')
  @HttpCode(200)
  @ApiOperation({
    operationId: 'verifyJournal',
    summary: 'Recompute the whole journal and name the first fault',
  })
  @ApiOkResponse({ type: VerificationResponse })
  verify(): VerificationResponse {
    return this.journal.verify();
  }

  @Get('checkpoints')
  @Permission('journal.read')
  @ApiOperation({
    operationId: 'listCheckpoints',
    summary: 'Signed heads of the journal, to be kept elsewhere',
  })
  @ApiOkResponse({ type: CheckpointsResponse })
  checkpoints(): CheckpointsResponse {
    return this.journal.listCheckpoints();
  }
}
