import { Injectable } from '@nestjs/common';
import { OnEvent } from '@nestjs/event-emitter';
import { chapterRoom, kitRoom, Realtime } from '../../common/realtime/realtime.js';
import { PhotosService } from '../photos/photos.service.js';
import { SheetMoved } from './questions.events.js';

/** Tells the sheet its numbered event whole, and every list that something changed. */
@Injectable()
export class QuestionsRealtime {
  constructor(
    private readonly realtime: Realtime,
    private readonly photos: PhotosService,
  ) {}

  @OnEvent(SheetMoved.topic)
  onMoved({ event, place }: SheetMoved): void {
    this.realtime.toSheet(this.shown(event));
    const { chapterId, kitId, audience, sectionId } = place;
    const rooms = audience === 'kit' ? [chapterRoom(chapterId), kitRoom(kitId)] : [chapterRoom(chapterId)];
    this.realtime.questionChanged(rooms, { questionId: event.questionId, sectionId, chapterId });
  }

  private shown(event: SheetMoved['event']): SheetMoved['event'] {
    if (event.type !== 'message') return event;
    const { photoIds, ...data } = event.data;
    const some = Array.isArray(photoIds) && photoIds.length > 0;
    const photos = some ? (this.photos.ofQuestion(event.questionId).get(String(data['id'])) ?? []) : [];
    return { ...event, data: { ...data, photos } };
  }
}
