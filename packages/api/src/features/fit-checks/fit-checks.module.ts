import { Module } from '@nestjs/common';
import { FitChecksController } from './fit-checks.controller.js';

@Module({ controllers: [FitChecksController] })
export class FitChecksModule {}
