import type { KitLimits } from '@rivetside/shared';
import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

@Entity('hole_lines')
@Index('hole_line_code_in_kit', ['kitId', 'code'], { unique: true })
@Index('hole_lines_in_section', ['sectionId'])
export class HoleLineEntity {
  @PrimaryColumn('varchar')
  id!: string;

  @ForeignKey('KitEntity', { onDelete: 'CASCADE' })
  @Column('varchar')
  kitId!: string;

  @ForeignKey('SectionEntity', { onDelete: 'CASCADE' })
  @Column('varchar')
  sectionId!: string;

  @ForeignKey('StepEntity', { onDelete: 'SET NULL' })
  @Column('varchar', { nullable: true })
  stepId!: string | null;

  @Column('varchar')
  code!: string;

  @Column('varchar')
  title!: string;

  /** Part ids, outermost layer first. */
  @Column('simple-json')
  stack!: string[];

  @Column('varchar')
  head!: 'universal' | 'flush';

  @Column('varchar')
  alloy!: string;

  /** Rivet diameter in 1/32 in. */
  @Column('integer')
  dash!: number;

  /** Rivet length in 1/16 in; half sizes exist. */
  @Column('real', { nullable: true })
  lengthDash!: number | null;

  @Column('varchar')
  callOut!: string;

  @Column('varchar')
  drill!: string;

  /** inch, as all lengths here */
  @Column('real')
  holeDiameter!: number;

  @Column('real', { nullable: true })
  pitch!: number | null;

  @Column('real', { nullable: true })
  edge!: number | null;

  @Column('integer')
  count!: number;

  @Column('integer')
  repeats!: number;

  @Column('varchar', { nullable: true })
  drive!: string | null;

  @Column('varchar')
  revision!: string;

  @Column('simple-json', { nullable: true })
  limits!: KitLimits | null;
}
