import type { Basis, Discipline, StampScope } from '@rivetside/shared';
import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

/** A stamp: given once, never edited; only its hold, its reviews and its withdrawal are written later. */
@Entity('endorsements')
@Index('endorsements_of_fix', ['fixId'])
@Index('endorsements_that_end', ['goodUntil'])
export class EndorsementEntity {
  @PrimaryColumn('varchar')
  id!: string;

  @ForeignKey('FixEntity')
  @Column('varchar')
  fixId!: string;

  @ForeignKey('QuestionEntity')
  @Column('varchar')
  questionId!: string;

  @Column('varchar')
  stampNumber!: string;

  @ForeignKey('UserEntity')
  @Column('varchar')
  byId!: string;

  @Column('varchar')
  discipline!: Discipline;

  @Column('varchar')
  basis!: Basis;

  @Column('varchar', { nullable: true })
  reference!: string | null;

  @Column('simple-json', { nullable: true })
  scope!: StampScope | null;

  @Column('simple-json')
  conditions!: string[];

  @Column('varchar')
  givenAt!: string;

  /** A calendar day, the last one on which it stands. */
  @Column('varchar')
  goodUntil!: string;

  @Column('text', { nullable: true })
  reason!: string | null;

  @Column('varchar', { nullable: true })
  heldAt!: string | null;

  @Column('text', { nullable: true })
  heldReason!: string | null;

  @ForeignKey('NoticeEntity')
  @Column('varchar', { nullable: true })
  heldByNoticeId!: string | null;

  @Column('varchar', { nullable: true })
  withdrawnAt!: string | null;

  @Column('text', { nullable: true })
  withdrawnReason!: string | null;

  /** When its running out was told to those who relied on it. */
  @Column('varchar', { nullable: true })
  expiredAt!: string | null;

  @Column('simple-json')
  reviews!: { at: string; byId: string; decision: 'keep' | 'change' | 'withdraw'; reason: string }[];
}
