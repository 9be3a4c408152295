import { Body, Controller, Get, Param, Post } from '@nestjs/common';
import {
  ApiBadRequestResponse,
  ApiConflictResponse,
  ApiCreatedResponse,
  ApiNotFoundResponse,
  ApiOkResponse,
  ApiOperation,
  ApiTags,
} from '@nestjs/swagger';
import { CurrentActor } from '../common/access/current-actor.decorator.js';
import { Permission } from '../common/access/permission.decorator.js';
import { Public } from '../common/access/public.decorator.js';
import type { Actor } from '../common/actor.js';
import { ManagedPerson } from '../people/dto/people-response.dto.js';
import { AcceptanceDto, InvitationDto, InvitationResponse, JoinedResponse } from './dto/invitations.dto.js';
import { InvitationsService } from './invitations.service.js';

@ApiTags('People')
@Controller()
export class InvitationsController {
  constructor(private readonly invitations: InvitationsService) {}

  @Post('people/invitations')
  @Permission('people.manage')
  @ApiOperation({
    operationId: 'invitePerson',
    summary: 'Invite somebody by mail; asked again, the former link is void',
  })
  @ApiCreatedResponse({ type: ManagedPerson })
  @ApiConflictResponse({ description: 'The address is taken, or the roles cannot be given' })
  invite(@CurrentActor() actor: Actor, @Body() body: InvitationDto): ManagedPerson {
    return this.invitations.invite(actor, body);
  }

  @Get('invitations/:token')
  @Public()
  @ApiOperation({ operationId: 'getInvitation', summary: 'Whom an invitation is for' })
  @ApiOkResponse({ type: InvitationResponse })
  @ApiNotFoundResponse({ description: 'The link does not hold, or not any more' })
  show(@Param('token') token: string): InvitationResponse {
    return this.invitations.show(token);
  }

  @Post('invitations/:token')
  @Public()
  @ApiOperation({ operationId: 'acceptInvitation', summary: 'Join with a password; the link is used up' })
  @ApiCreatedResponse({ type: JoinedResponse })
  @ApiBadRequestResponse({ description: 'The password cannot be taken' })
  @ApiNotFoundResponse({ description: 'The link does not hold, or not any more' })
  accept(@Param('token') token: string, @Body() body: AcceptanceDto): Promise<JoinedResponse> {
    return this.invitations.accept(token, body);
  }
}
