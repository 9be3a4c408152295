import { Controller, Get } from '@nestjs/common';
import { ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { Permission } from '../common/access/permission.decorator.js';
import { PeopleResponse, peopleResponse } from './dto/people-response.dto.js';
import { PeopleService } from './people.service.js';

@ApiTags('People')
@Controller('people')
export class PeopleController {
  constructor(private readonly people: PeopleService) {}

  @Get()
  @Permission('people.list')
  @ApiOperation({ operationId: 'listPeople', summary: 'Everybody active, with name and roles' })
  @ApiOkResponse({ type: PeopleResponse })
  list(): PeopleResponse {
    return peopleResponse(this.people.list());
  }
}
