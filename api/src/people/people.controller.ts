import { Body, Controller, Get, Param, Patch, Post } from '@nestjs/common';
import {
  ApiConflictResponse,
  ApiCreatedResponse,
  ApiNotFoundResponse,
  ApiOkResponse,
  ApiOperation,
  ApiTags,
} from '@nestjs/swagger';
import { CurrentActor } from '../common/access/current-actor.decorator.js';
import { Permission } from '../common/access/permission.decorator.js';
import type { Actor } from '../common/actor.js';
import { ManagedPerson, PeopleResponse } from './dto/people-response.dto.js';
import { PersonChangeDto, ReasonDto } from './dto/person-change.dto.js';
import { PeopleAdministrationService } from './people-administration.service.js';

@ApiTags('People')
@Controller('people')
export class PeopleController {
  constructor(private readonly people: PeopleAdministrationService) {}

  @Get()
  @Permission('people.list')
  @ApiOperation({
    operationId: 'listPeople',
    summary: 'Everybody active, with name and roles; for administrators everybody, with all they look after',
  })
  @ApiOkResponse({ type: PeopleResponse })
  list(@CurrentActor() actor: Actor): PeopleResponse {
    return this.people.list(actor);
  }

  @Patch(':id')
  @Permission('people.manage')
  @ApiOperation({ operationId: 'changePerson', summary: "Change a person's name or roles" })
  @ApiOkResponse({ type: ManagedPerson })
  @ApiNotFoundResponse({ description: 'There is no such person' })
  @ApiConflictResponse({ description: 'Roles that exclude each other, or no administrator left' })
  change(
    @CurrentActor() actor: Actor,
    @Param('id') id: string,
    @Body() body: PersonChangeDto,
  ): ManagedPerson {
    return this.people.change(actor, id, body);
  }

  @Post(':id/deactivation')
  @Permission('people.manage')
  @ApiOperation({ operationId: 'deactivatePerson', summary: 'Shut a person out at once; nothing is deleted' })
  @ApiCreatedResponse({ type: ManagedPerson })
  @ApiNotFoundResponse({ description: 'There is no such person' })
  @ApiConflictResponse({ description: 'Inactive already, or the only administrator' })
  deactivate(@CurrentActor() actor: Actor, @Param('id') id: string, @Body() body: ReasonDto): ManagedPerson {
    return this.people.deactivate(actor, id, body.reason);
  }

  @Post(':id/reactivation')
  @Permission('people.manage')
  @ApiOperation({ operationId: 'reactivatePerson', summary: 'Let a person in again' })
  @ApiCreatedResponse({ type: ManagedPerson })
  @ApiNotFoundResponse({ description: 'There is no such person' })
  @ApiConflictResponse({ description: 'Active already' })
  reactivate(@CurrentActor() actor: Actor, @Param('id') id: string, @Body() body: ReasonDto): ManagedPerson {
    return this.people.reactivate(actor, id, body.reason);
  }
}
