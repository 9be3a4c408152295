import { Module } from '@nestjs/common';
import { GeometriesController } from './geometries.controller.js';
import { GeometriesReadModel } from './geometries.read-model.js';
import { GeometriesRepository } from './geometries.repository.js';
import { GeometriesService } from './geometries.service.js';

@Module({
  controllers: [GeometriesController],
  providers: [GeometriesReadModel, GeometriesRepository, GeometriesService],
  exports: [GeometriesService],
})
export class GeometriesModule {}
