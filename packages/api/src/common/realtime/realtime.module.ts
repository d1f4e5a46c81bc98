import { Global, Module } from '@nestjs/common';
import { LiveGateway } from './live.gateway.js';
import { Realtime } from './realtime.js';
import { StandingWatch } from './standing-watch.js';

@Global()
@Module({ providers: [LiveGateway, Realtime, StandingWatch], exports: [Realtime] })
export class RealtimeModule {}
