import { Body, Controller, Delete, Get, HttpCode, Param, Put, Req } from '@nestjs/common';
import {
  ApiBadRequestResponse,
  ApiConflictResponse,
  ApiForbiddenResponse,
  ApiNoContentResponse,
  ApiNotFoundResponse,
  ApiOkResponse,
  ApiOperation,
  ApiTags,
  ApiUnauthorizedResponse,
} from '@nestjs/swagger';
import type { Request } from 'express';
import { CurrentActor } from '../common/access/current-actor.decorator.js';
import { SignedIn } from '../common/access/signed-in.decorator.js';
import type { Actor } from '../common/actor.js';
import { PasswordChangeDto, SessionParams, SessionsResponse } from './dto/own-sessions.dto.js';
import { OwnSessionsService } from './own-sessions.service.js';

@ApiTags('Session')
@ApiUnauthorizedResponse({ description: 'Not signed in' })
@Controller('session')
export class OwnSessionsController {
  constructor(private readonly sessions: OwnSessionsService) {}

  @Get('sessions')
  @SignedIn()
  @ApiOperation({ operationId: 'listSessions', summary: "The caller's own sessions" })
  @ApiOkResponse({ type: SessionsResponse })
  list(@CurrentActor() actor: Actor, @Req() request: Request): SessionsResponse {
    return this.sessions.list(actor, request.sessionID);
  }

  @Delete('sessions/:id')
  @SignedIn()
  @HttpCode(204)
  @ApiOperation({ operationId: 'endSession', summary: "End another of the caller's sessions" })
  @ApiNoContentResponse()
  @ApiNotFoundResponse({ description: 'The caller has no such session' })
  @ApiConflictResponse({ description: 'It is the one in use' })
  end(@CurrentActor() actor: Actor, @Param() path: SessionParams, @Req() request: Request): void {
    this.sessions.end(actor, path.id, request.sessionID);
  }

  @Put('password')
  @SignedIn()
  @HttpCode(204)
  @ApiOperation({
    operationId: 'changePassword',
    summary: 'Change the own password; all other sessions end',
  })
  @ApiNoContentResponse()
  @ApiBadRequestResponse({ description: 'The new password cannot be taken' })
  @ApiForbiddenResponse({ description: 'The present password is not right' })
  changePassword(
    @CurrentActor() actor: Actor,
    @Body() body: PasswordChangeDto,
    @Req() request: Request,
  ): Promise<void> {
    return this.sessions.changePassword(actor, body.current, body.password, request.sessionID);
  }
}
