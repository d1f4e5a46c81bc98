import { Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

@Entity('build_crew')
@Index('crew_of_user', ['userId'])
export class BuildCrewEntity {
  @ForeignKey('BuildEntity', { onDelete: 'CASCADE' })
  @PrimaryColumn('varchar')
  buildId!: string;

  @ForeignKey('UserEntity', { onDelete: 'CASCADE' })
  @PrimaryColumn('varchar')
  userId!: string;
}
