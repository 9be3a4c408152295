import { Controller, Get } from '@nestjs/common';
import { ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { CurrentActor } from '../common/access/current-actor.decorator.js';
import { SignedIn } from '../common/access/signed-in.decorator.js';
import type { Actor } from '../common/actor.js';
import { DeskService } from './desk.service.js';
import { Desk } from './dto/desk.dto.js';

@ApiTags('Desk')
@Controller('desk')
export class DeskController {
  constructor(private readonly desk: DeskService) {}

  @Get()
  @SignedIn()
  @ApiOperation({ operationId: 'getDesk', summary: 'What waits for the caller, by role' })
  @ApiOkResponse({ type: Desk })
  show(@CurrentActor() actor: Actor): Desk {
    return this.desk.of(actor);
  }
}
