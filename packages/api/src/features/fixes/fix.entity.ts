import type { FixKind, HoleCard, Operation, RemedyCheck } from '@rivetside/shared';
import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

@Entity('fixes')
@Index('fixes_of_question', ['questionId', 'number'], { unique: true })
export class FixEntity {
  @PrimaryColumn('varchar')
  id!: string;

  @ForeignKey('QuestionEntity')
  @Column('varchar')
  questionId!: string;

  @Column('integer')
  number!: number;

  @Column('varchar')
  kind!: FixKind;

  @Column('varchar')
  summary!: string;

  @Column('simple-json')
  operations!: Operation[];

  @Column('simple-json')
  conditions!: string[];

  @Column('simple-json', { nullable: true })
  holeCard!: HoleCard | null;

  /** The remedy's check, frozen when it was proposed. */
  @Column('simple-json', { nullable: true })
  check!: RemedyCheck | null;

  @Column('varchar', { nullable: true })
  engineVersion!: string | null;

  @ForeignKey('UserEntity')
  @Column('varchar')
  byId!: string;

  @Column('varchar')
  at!: string;

  @Column('varchar', { nullable: true })
  withdrawnAt!: string | null;

  @Column('text', { nullable: true })
  withdrawnReason!: string | null;
}
