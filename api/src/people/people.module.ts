import { Module } from '@nestjs/common';
import { AttemptLimiter } from '../common/attempt-limiter.js';
import { FirstAdministratorController } from './first-administrator.controller.js';
import { FirstAdministratorService } from './first-administrator.service.js';
import { OfficeService } from './office.service.js';
import { PasswordService } from './password.service.js';
import { PeopleController } from './people.controller.js';
import { PeopleRepository } from './people.repository.js';
import { PeopleService } from './people.service.js';
import { SigningService } from './signing.service.js';

@Module({
  controllers: [PeopleController, FirstAdministratorController],
  providers: [
    PeopleRepository,
    PeopleService,
    PasswordService,
    SigningService,
    OfficeService,
    AttemptLimiter,
    FirstAdministratorService,
  ],
  exports: [PeopleService, FirstAdministratorService, SigningService, OfficeService, AttemptLimiter],
})
export class PeopleModule {}
