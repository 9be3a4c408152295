import { Module } from '@nestjs/common';
import { AttemptLimiter } from '../common/attempt-limiter.js';
import { Departures } from './departures.js';
import { OfficeService } from './office.service.js';
import { OneTimeLinkRepository } from './one-time-link.repository.js';
import { OneTimeLinkService } from './one-time-link.service.js';
import { PasswordService } from './password.service.js';
import { PeopleAdministrationService } from './people-administration.service.js';
import { PeopleController } from './people.controller.js';
import { PeopleRepository } from './people.repository.js';
import { PeopleService } from './people.service.js';
import { SigningService } from './signing.service.js';
import { SignInsReadModel } from './sign-ins.read-model.js';

@Module({
  controllers: [PeopleController],
  providers: [
    PeopleRepository,
    PeopleService,
    PeopleAdministrationService,
    SignInsReadModel,
    Departures,
    OneTimeLinkRepository,
    OneTimeLinkService,
    PasswordService,
    SigningService,
    OfficeService,
    AttemptLimiter,
  ],
  exports: [
    PeopleService,
    PeopleAdministrationService,
    Departures,
    OneTimeLinkService,
    PasswordService,
    SigningService,
    OfficeService,
    AttemptLimiter,
  ],
})
export class PeopleModule {}
