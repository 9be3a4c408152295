import { Body, Controller, Get, Put } from '@nestjs/common';
import { ApiConflictResponse, ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { CurrentActor } from '../common/access/current-actor.decorator.js';
import { Permission } from '../common/access/permission.decorator.js';
import type { Actor } from '../common/actor.js';
import { SettingsDto, SettingsResponse } from './dto/settings.dto.js';
import { SettingsService } from './settings.service.js';

@ApiTags('Office')
@Controller('settings')
export class SettingsController {
  constructor(private readonly settings: SettingsService) {}

  @Get()
  @Permission('settings.read')
  @ApiOperation({ operationId: 'getSettings', summary: 'What the office has decided on' })
  @ApiOkResponse({ type: SettingsResponse })
  show(): SettingsResponse {
    return this.settings.show();
  }

  @Put()
  @Permission('settings.change')
  @ApiOperation({ operationId: 'changeSettings', summary: 'Change what the office has decided on' })
  @ApiOkResponse({ type: SettingsResponse })
  @ApiConflictResponse({ description: 'The person named cannot be the principal' })
  change(@CurrentActor() actor: Actor, @Body() body: SettingsDto): SettingsResponse {
    return this.settings.change(actor, body);
  }
}
