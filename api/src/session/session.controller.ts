import { Body, Controller, Delete, Get, HttpCode, Post, Req, Res } from '@nestjs/common';
import {
  ApiNoContentResponse,
  ApiNotFoundResponse,
  ApiOkResponse,
  ApiOperation,
  ApiTags,
  ApiTooManyRequestsResponse,
  ApiUnauthorizedResponse,
} from '@nestjs/swagger';
import type { Request, Response } from 'express';
import { CurrentActor } from '../common/access/current-actor.decorator.js';
import { Public } from '../common/access/public.decorator.js';
import { SignedIn } from '../common/access/signed-in.decorator.js';
import type { Actor } from '../common/actor.js';
import { DemoPeopleResponse, SessionResponse } from './dto/session-response.dto.js';
import { SignInDto } from './dto/sign-in.dto.js';
import { SessionService } from './session.service.js';

@ApiTags('Session')
@Controller('session')
export class SessionController {
  constructor(private readonly sessions: SessionService) {}

  @Post()
  @Public()
  @HttpCode(200)
  @ApiOperation({ operationId: 'signIn', summary: 'Sign in; the session is kept in a cookie' })
  @ApiOkResponse({ type: SessionResponse })
  @ApiUnauthorizedResponse({ description: 'The address or the password is not right' })
  @ApiTooManyRequestsResponse({ description: 'Too many attempts failed' })
  signIn(
    @Body() body: SignInDto,
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ): Promise<SessionResponse> {
    return this.sessions.signIn(body.email, request, response);
  }

  @Get()
  @SignedIn()
  @ApiOperation({ operationId: 'currentSession', summary: 'Who is signed in' })
  @ApiOkResponse({ type: SessionResponse })
  @ApiUnauthorizedResponse({ description: 'Not signed in' })
  current(@CurrentActor() actor: Actor): SessionResponse {
    return this.sessions.current(actor);
  }

  @Delete()
  @SignedIn()
  @HttpCode(204)
  @ApiOperation({ operationId: 'signOut', summary: 'Sign out' })
  @ApiNoContentResponse()
  @ApiUnauthorizedResponse({ description: 'Not signed in' })
  signOut(
    @CurrentActor() actor: Actor,
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ): Promise<void> {
    return this.sessions.signOut(actor, request, response);
  }

  @Get('demo-people')
  @Public()
  @ApiOperation({ operationId: 'listDemoPeople', summary: 'The invented people of a demo office' })
  @ApiOkResponse({ type: DemoPeopleResponse })
  @ApiNotFoundResponse({ description: 'Not a demo office' })
  demoPeople(): DemoPeopleResponse {
    return this.sessions.demoPeople();
  }
}
