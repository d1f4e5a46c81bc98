import { DomainEvent } from '../../common/events/domain-event.js';

export class SessionEnded extends DomainEvent {
  static override readonly topic = 'session.ended';

  constructor(
    readonly sessionId: string,
    readonly reason: string,
  ) {
    super();
  }
}
