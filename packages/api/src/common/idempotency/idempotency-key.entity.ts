import { Column, Entity, Index, PrimaryColumn } from 'typeorm';

@Entity('idempotency_keys')
@Index('idempotency_keys_by_age', ['createdAt'])
export class IdempotencyKeyEntity {
  @PrimaryColumn('varchar')
  userId!: string;

  @PrimaryColumn('varchar')
  key!: string;

  @Column('varchar')
  method!: string;

  @Column('varchar')
  path!: string;

  @Column('varchar')
  bodyHash!: string;

  @Column('integer')
  status!: number;

  @Column('text')
  response!: string;

  @Column('varchar')
  createdAt!: string;
}
