import { Body, Controller, Post } from '@nestjs/common';
import { ApiCreatedResponse, ApiForbiddenResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { Public } from '../common/access/public.decorator.js';
import { FirstAdministratorBody } from './dto/first-administrator.dto.js';
import { PersonEntry } from './dto/people-response.dto.js';
import { FirstAdministratorService } from './first-administrator.service.js';

@ApiTags('People')
@Controller('people/first-administrator')
export class FirstAdministratorController {
  constructor(private readonly first: FirstAdministratorService) {}

  @Post()
  @Public()
  @ApiOperation({
    operationId: 'addFirstAdministrator',
    summary: "The first person of an office, with the token from the server's terminal",
  })
  @ApiCreatedResponse({ type: PersonEntry })
  @ApiForbiddenResponse({ description: 'The token does not hold, or there is an administrator' })
  async accept(@Body() { token, name, email, password }: FirstAdministratorBody): Promise<PersonEntry> {
    const actor = await this.first.accept(token, { name, email, password });
    return { id: actor.id, name: actor.name, roles: [...actor.roles] };
  }
}
