import type { AsDone, AsDoneCheck } from '@rivetside/shared';
import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm';

@Entity('completions')
export class CompletionEntity {
  @PrimaryColumn('varchar')
  id!: string;

  @ForeignKey('QuestionEntity')
  @Column('varchar', { unique: true })
  questionId!: string;

  @ForeignKey('FixEntity')
  @Column('varchar')
  fixId!: string;

  @Column('simple-json')
  asDone!: AsDone;

  @Column('simple-json', { nullable: true })
  check!: AsDoneCheck | null;

  @Column('integer')
  minutes!: number;

  @Column('simple-json')
  conditionsMet!: string[];

  @Column('simple-json')
  conditionsLeft!: string[];

  @Column('simple-json')
  helpers!: string[];

  @Column('text', { nullable: true })
  note!: string | null;

  @ForeignKey('UserEntity')
  @Column('varchar')
  byId!: string;

  @Column('varchar')
  at!: string;

  @ForeignKey('EntryEntity')
  @Column('varchar', { nullable: true })
  entryId!: string | null;
}
