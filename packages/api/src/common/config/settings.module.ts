import { type DynamicModule, Global, Module } from '@nestjs/common';
import { Clock } from '../time/clock.js';
import { Settings } from './settings.js';

@Global()
@Module({})
export class SettingsModule {
  static with(settings: Settings): DynamicModule {
    return {
      module: SettingsModule,
      providers: [{ provide: Settings, useValue: settings }, Clock],
      exports: [Settings, Clock],
    };
  }
}
