import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

/** Only the hash is kept. A token is used once; a second use ends its session. */
@Entity('refresh_tokens')
@Index('refresh_tokens_of_session', ['sessionId'])
export class RefreshTokenEntity {
  @PrimaryColumn('varchar')
  hash!: string;

  @ForeignKey('SessionEntity', { onDelete: 'CASCADE' })
  @Column('varchar')
  sessionId!: string;

  @Column('varchar')
  issuedAt!: string;

  @Column('varchar')
  expiresAt!: string;

  @Column('varchar', { nullable: true })
  usedAt!: string | null;
}
