import { Module } from '@nestjs/common';
import { CorrelationsModule } from '../../correlations/correlations.module.js';
import { GeometriesModule } from '../../geometries/geometries.module.js';
import { PeopleModule } from '../../people/people.module.js';
import { PropertyEquationsModule } from '../../property-equations/property-equations.module.js';
import { ReviewsModule } from '../../reviews/reviews.module.js';
import { SeedService } from './seed.service.js';

@Module({
  imports: [PeopleModule, GeometriesModule, PropertyEquationsModule, CorrelationsModule, ReviewsModule],
  providers: [SeedService],
})
export class SeedModule {}
