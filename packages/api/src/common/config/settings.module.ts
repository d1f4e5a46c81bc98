import { type DynamicModule, Global, Module } from '@nestjs/common';
import { Clock } from '../time/clock.js';
import { Settings } from './settings.js';

@Global()
@Module({})
export class SettingsModule {
  static with(settings: Settings, clock: Clock): DynamicModule {
    return {
      module: SettingsModule,
      providers: [
        { provide: Settings, useValue: settings },
        { provide: Clock, useValue: clock },
      ],
      exports: [Settings, Clock],
    };
  }
}
