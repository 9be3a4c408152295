import { Controller, Get } from '@nestjs/common';
import { ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { CurrentActor } from '../common/access/current-actor.decorator.js';
import { Permission } from '../common/access/permission.decorator.js';
import type { Actor } from '../common/actor.js';
import { GeometriesResponse } from './dto/geometries-response.dto.js';
import { GeometriesService } from './geometries.service.js';

@ApiTags('Register')
@Controller('geometries')
export class GeometriesController {
  constructor(private readonly geometries: GeometriesService) {}

  @Get()
  @Permission('register.read')
  @ApiOperation({ operationId: 'listGeometries', summary: 'What correlations were measured on' })
  @ApiOkResponse({ type: GeometriesResponse })
  list(@CurrentActor() actor: Actor): GeometriesResponse {
    return this.geometries.list(actor);
  }
}
