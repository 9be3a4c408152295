import { Controller, Get } from '@nestjs/common';
import { ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { Public } from '../common/access/public.decorator.js';
import { HealthResponse } from './health-response.dto.js';
import { HealthService } from './health.service.js';

@ApiTags('Health')
@Controller('health')
export class HealthController {
  constructor(private readonly service: HealthService) {}

  @Get()
  @Public()
  @ApiOperation({ operationId: 'health', summary: 'Whether the server works, and which one it is' })
  @ApiOkResponse({ type: HealthResponse })
  health(): HealthResponse {
    return this.service.health();
  }
}
