import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

@Entity('sections')
@Index('section_code_in_kit', ['kitId', 'code'], { unique: true })
export class SectionEntity {
  @PrimaryColumn('varchar')
  id!: string;

  @ForeignKey('KitEntity', { onDelete: 'CASCADE' })
  @Column('varchar')
  kitId!: string;

  @Column('varchar')
  code!: string;

  @Column('varchar')
  name!: string;

  @Column('integer')
  position!: number;

  @Column('boolean')
  critical!: boolean;

  /** Regions of the drawn plan and side view. */
  @Column('simple-json')
  regions!: string[];

  @ForeignKey('UserEntity', { onDelete: 'SET NULL' })
  @Column('varchar', { nullable: true })
  stewardId!: string | null;
}
