import { Module } from '@nestjs/common';
import { AttemptLimiter } from '../common/attempt-limiter.js';
import { OfficeService } from './office.service.js';
import { PasswordService } from './password.service.js';
import { PeopleController } from './people.controller.js';
import { PeopleRepository } from './people.repository.js';
import { PeopleService } from './people.service.js';
import { SigningService } from './signing.service.js';

@Module({
  controllers: [PeopleController],
  providers: [
    PeopleRepository,
    PeopleService,
    PasswordService,
    SigningService,
    OfficeService,
    AttemptLimiter,
  ],
  exports: [PeopleService, SigningService, OfficeService, AttemptLimiter],
})
export class PeopleModule {}
