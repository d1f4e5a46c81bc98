import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

@Entity('parts')
@Index('part_number_in_kit', ['kitId', 'number'], { unique: true })
@Index('parts_in_section', ['sectionId'])
export class PartEntity {
  @PrimaryColumn('varchar')
  id!: string;

  @ForeignKey('KitEntity', { onDelete: 'CASCADE' })
  @Column('varchar')
  kitId!: string;

  @ForeignKey('SectionEntity', { onDelete: 'CASCADE' })
  @Column('varchar')
  sectionId!: string;

  @Column('varchar')
  number!: string;

  @Column('varchar')
  name!: string;

  @Column('varchar')
  alloy!: string;

  /** inch */
  @Column('real', { nullable: true })
  thickness!: number | null;

  @Column('integer')
  quantity!: number;

  @Column('varchar', { nullable: true })
  hands!: string | null;
}
