import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm';

@Entity('step_progress')
export class StepProgressEntity {
  @ForeignKey('BuildEntity', { onDelete: 'CASCADE' })
  @PrimaryColumn('varchar')
  buildId!: string;

  @ForeignKey('StepEntity', { onDelete: 'CASCADE' })
  @PrimaryColumn('varchar')
  stepId!: string;

  @Column('varchar')
  state!: 'todo' | 'pinned' | 'driven';

  @Column('varchar')
  at!: string;
}
