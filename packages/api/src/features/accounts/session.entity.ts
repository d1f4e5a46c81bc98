import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

/** One signed-in device: the family that all its refresh tokens belong to. */
@Entity('sessions')
@Index('sessions_of_user', ['userId', 'endedAt'])
export class SessionEntity {
  @PrimaryColumn('varchar')
  id!: string;

  @ForeignKey('UserEntity', { onDelete: 'CASCADE' })
  @Column('varchar')
  userId!: string;

  @Column('varchar')
  device!: string;

  @Column('varchar')
  createdAt!: string;

  @Column('varchar')
  lastUsedAt!: string;

  @Column('varchar', { nullable: true })
  endedAt!: string | null;

  @Column('varchar', { nullable: true })
  endedReason!: string | null;
}
