import { Column, Entity, Index, PrimaryColumn } from 'typeorm';

/** Who did what to whom. The database refuses to change or remove a line. */
@Entity('audit_trail')
@Index('audit_of_subject', ['subjectType', 'subjectId', 'at'])
export class AuditTrailEntity {
  @PrimaryColumn('varchar')
  id!: string;

  @Column('varchar')
  at!: string;

  /** Null where the app itself did it, such as an expiry. */
  @Column('varchar', { nullable: true })
  byId!: string | null;

  /** Past tense and dotted: stamp.given, session.ended … */
  @Column('varchar')
  what!: string;

  @Column('varchar')
  subjectType!: string;

  @Column('varchar')
  subjectId!: string;

  @Column('simple-json')
  detail!: Record<string, unknown>;
}
