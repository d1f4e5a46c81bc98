import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

/** What a link in a mail stands for: hashed, used once, ends by itself. */
@Entity('mail_tokens')
@Index('mail_tokens_of_user', ['userId', 'purpose'])
export class MailTokenEntity {
  @PrimaryColumn('varchar')
  hash!: string;

  @ForeignKey('UserEntity', { onDelete: 'CASCADE' })
  @Column('varchar')
  userId!: string;

  @Column('varchar')
  purpose!: 'confirmEmail' | 'resetPassword' | 'changeEmail';

  /** The new address, where one is changed. */
  @Column('varchar', { nullable: true })
  email!: string | null;

  @Column('varchar')
  expiresAt!: string;

  @Column('varchar', { nullable: true })
  usedAt!: string | null;
}
