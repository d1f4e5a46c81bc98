import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

/** Where a photo hangs: it is shown to whoever may see that question. */
@Entity('photo_uses')
@Index('photos_on_question', ['questionId', 'usedIn', 'position'])
export class PhotoUseEntity {
  @ForeignKey('PhotoEntity')
  @PrimaryColumn('varchar')
  photoId!: string;

  @ForeignKey('QuestionEntity')
  @Column('varchar')
  questionId!: string;

  /** `question`, or the id of the event or completion that brought it. */
  @Column('varchar')
  usedIn!: string;

  @Column('integer')
  position!: number;
}
