import { Injectable } from '@nestjs/common';
import { OnEvent } from '@nestjs/event-emitter';
import { Realtime } from '../../common/realtime/realtime.js';
import { SessionEnded } from './accounts.events.js';

@Injectable()
export class AccountsRealtime {
  constructor(private readonly realtime: Realtime) {}

  @OnEvent(SessionEnded.topic)
  onEnded({ sessionId, reason }: SessionEnded): void {
    this.realtime.endSession(sessionId, reason);
  }
}
