import { Injectable } from '@nestjs/common';
import { OfficeService } from '../people/office.service.js';
import { readBuildInfo } from './build-info.js';
import type { HealthResponse } from './health-response.dto.js';

@Injectable()
export class HealthService {
  private readonly build = readBuildInfo();

  constructor(private readonly office: OfficeService) {}

  /** Asks the database as well, so that "ok" means that it answers. */
  health(): HealthResponse {
    const { version, revision } = this.build;
    return { status: 'ok', version, revision, demo: this.office.isDemo() };
  }
}
