import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

@Entity('steps')
@Index('steps_in_section', ['sectionId', 'number'], { unique: true })
export class StepEntity {
  @PrimaryColumn('varchar')
  id!: string;

  @ForeignKey('SectionEntity', { onDelete: 'CASCADE' })
  @Column('varchar')
  sectionId!: string;

  @Column('integer')
  number!: number;

  @Column('varchar')
  code!: string;

  @Column('varchar')
  title!: string;

  @Column('varchar')
  work!: 'fabricate' | 'finish' | 'assemble' | 'inspect';

  @Column('real')
  estimateHours!: number;

  @Column('boolean')
  twoPerson!: boolean;

  @Column('boolean')
  closesStructure!: boolean;

  @Column('varchar', { nullable: true })
  hazard!: string | null;
}
