import type { Audience, SheetEvent } from '@rivetside/shared';
import { DomainEvent } from '../../common/events/domain-event.js';

/** Something happened on a sheet and stands in its log. */
export class SheetMoved extends DomainEvent {
  static override readonly topic = 'sheet.moved';

  constructor(
    readonly event: SheetEvent,
    readonly place: { sectionId: string | null; chapterId: string; kitId: string; audience: Audience },
  ) {
    super();
  }
}
