import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm';

@Entity('question_seen', { withoutRowid: true })
export class QuestionSeenEntity {
  @ForeignKey('UserEntity', { onDelete: 'CASCADE' })
  @PrimaryColumn('varchar')
  userId!: string;

  @ForeignKey('QuestionEntity', { onDelete: 'CASCADE' })
  @PrimaryColumn('varchar')
  questionId!: string;

  @Column('integer')
  seq!: number;
}
