import { Module } from '@nestjs/common';
import { OfficeService } from './office.service.js';
import { PasswordService } from './password.service.js';
import { PeopleController } from './people.controller.js';
import { PeopleRepository } from './people.repository.js';
import { PeopleService } from './people.service.js';
import { SigningService } from './signing.service.js';

@Module({
  controllers: [PeopleController],
  providers: [PeopleRepository, PeopleService, PasswordService, SigningService, OfficeService],
  exports: [PeopleService, SigningService, OfficeService],
})
export class PeopleModule {}
