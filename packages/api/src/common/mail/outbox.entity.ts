import { Column, Entity, Index, PrimaryColumn } from 'typeorm';

/** A mail that must not be lost: written in the unit of what it tells of, sent later by the worker. */
@Entity('outbox')
@Index('outbox_to_send', ['sentAt', 'dueAt'])
export class OutboxEntity {
  /** Stands in the Message-ID, so that a second try is the same mail. */
  @PrimaryColumn('varchar')
  id!: string;

  @Column('varchar')
  to!: string;

  @Column('varchar')
  subject!: string;

  @Column('text')
  text!: string;

  @Column('text')
  html!: string;

  @Column('varchar')
  createdAt!: string;

  @Column('varchar')
  dueAt!: string;

  @Column('integer')
  attempts!: number;

  @Column('varchar', { nullable: true })
  sentAt!: string | null;

  @Column('varchar', { nullable: true })
  lastError!: string | null;
}
