import type { SheetEventType } from '@rivetside/shared';
import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm';

/** What happened on a sheet, in order; `seq` grows by one per question and is never reused. */
@Entity('question_events', { withoutRowid: true })
export class QuestionEventEntity {
  @ForeignKey('QuestionEntity')
  @PrimaryColumn('varchar')
  questionId!: string;

  @PrimaryColumn('integer')
  seq!: number;

  @Column('varchar')
  id!: string;

  @Column('varchar')
  type!: SheetEventType;

  @Column('varchar')
  at!: string;

  @ForeignKey('UserEntity')
  @Column('varchar')
  byId!: string;

  @Column('simple-json')
  data!: Record<string, unknown>;
}
