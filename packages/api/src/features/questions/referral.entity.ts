import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

@Entity('referrals')
@Index('referrals_of_question', ['questionId', 'at'])
export class ReferralEntity {
  @PrimaryColumn('varchar')
  id!: string;

  @ForeignKey('QuestionEntity')
  @Column('varchar')
  questionId!: string;

  @Column('varchar')
  at!: string;

  @ForeignKey('UserEntity')
  @Column('varchar')
  byId!: string;

  @Column('text', { nullable: true })
  note!: string | null;

  @Column('varchar', { nullable: true })
  answeredAt!: string | null;

  @ForeignKey('UserEntity')
  @Column('varchar', { nullable: true })
  answeredById!: string | null;

  @Column('text', { nullable: true })
  answer!: string | null;

  @Column('varchar', { nullable: true })
  reference!: string | null;
}
