import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm';

/** The last number punched, per kit and section code (KIT for the whole build). */
@Entity('question_numbers')
export class QuestionNumberEntity {
  @ForeignKey('KitEntity', { onDelete: 'CASCADE' })
  @PrimaryColumn('varchar')
  kitId!: string;

  @PrimaryColumn('varchar')
  code!: string;

  @Column('integer')
  last!: number;
}
