import { Body, Controller, HttpCode, Param, Post, Req } from '@nestjs/common';
import {
  ApiAcceptedResponse,
  ApiBadRequestResponse,
  ApiNoContentResponse,
  ApiNotFoundResponse,
  ApiOperation,
  ApiTags,
  ApiTooManyRequestsResponse,
} from '@nestjs/swagger';
import type { Request } from 'express';
import { Public } from '../common/access/public.decorator.js';
import { RESET_ASKED, ResetAskedResponse, ResetDto, ResetRequestDto } from './dto/password-resets.dto.js';
import { PasswordResetsService } from './password-resets.service.js';

@ApiTags('Session')
@Controller('password-resets')
export class PasswordResetsController {
  constructor(private readonly resets: PasswordResetsService) {}

  @Post()
  @Public()
  @HttpCode(202)
  @ApiOperation({ operationId: 'askForPassword', summary: 'Ask for a link to choose a new password' })
  @ApiAcceptedResponse({ type: ResetAskedResponse })
  @ApiTooManyRequestsResponse({ description: 'Asked too often' })
  ask(@Body() body: ResetRequestDto, @Req() request: Request): ResetAskedResponse {
    this.resets.ask(body.email, request.ip ?? 'unknown');
    return RESET_ASKED;
  }

  @Post(':token')
  @Public()
  @HttpCode(204)
  @ApiOperation({
    operationId: 'resetPassword',
    summary: 'Choose a new password; the link is used up and all sessions end',
  })
  @ApiNoContentResponse()
  @ApiBadRequestResponse({ description: 'The password cannot be taken' })
  @ApiNotFoundResponse({ description: 'The link does not hold, or not any more' })
  choose(@Param('token') token: string, @Body() body: ResetDto): Promise<void> {
    return this.resets.choose(token, body.password);
  }
}
