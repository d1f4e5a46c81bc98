import { Global, Module } from '@nestjs/common';
import { LiveGateway } from './live.gateway.js';
import { Realtime } from './realtime.js';

@Global()
@Module({ providers: [LiveGateway, Realtime], exports: [Realtime] })
export class RealtimeModule {}
