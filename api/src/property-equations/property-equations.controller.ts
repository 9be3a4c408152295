import { Controller, Get, Param } from '@nestjs/common';
import { ApiNotFoundResponse, ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { CurrentActor } from '../common/access/current-actor.decorator.js';
import { Permission } from '../common/access/permission.decorator.js';
import type { Actor } from '../common/actor.js';
import { PropertyEquationSheet, PropertyEquationsResponse } from './dto/property-equation.dto.js';
import { PropertyEquationsService } from './property-equations.service.js';

@ApiTags('Property equations')
@Controller('property-equations')
export class PropertyEquationsController {
  constructor(private readonly equations: PropertyEquationsService) {}

  @Get()
  @Permission('register.read')
  @ApiOperation({ operationId: 'listPropertyEquations', summary: 'Published equations for fluid properties' })
  @ApiOkResponse({ type: PropertyEquationsResponse })
  list(@CurrentActor() actor: Actor): PropertyEquationsResponse {
    return this.equations.list(actor);
  }

  @Get(':slug')
  @Permission('register.read')
  @ApiOperation({ operationId: 'getPropertyEquation', summary: 'One of them, with its worked checks' })
  @ApiOkResponse({ type: PropertyEquationSheet })
  @ApiNotFoundResponse({ description: 'There is none of this name' })
  one(@CurrentActor() actor: Actor, @Param('slug') slug: string): PropertyEquationSheet {
    return this.equations.sheet(actor, slug);
  }
}
