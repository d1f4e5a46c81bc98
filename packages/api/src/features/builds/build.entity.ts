import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

@Entity('builds')
@Index('serial_in_kit', ['kitId', 'serial'], { unique: true })
@Index('builds_of_owner', ['ownerId'])
export class BuildEntity {
  @PrimaryColumn('varchar')
  id!: string;

  @ForeignKey('KitEntity')
  @Column('varchar')
  kitId!: string;

  @Column('integer')
  serial!: number;

  @ForeignKey('UserEntity')
  @Column('varchar')
  ownerId!: string;

  @ForeignKey('ChapterEntity')
  @Column('varchar')
  chapterId!: string;

  @ForeignKey('UserEntity', { onDelete: 'SET NULL' })
  @Column('varchar', { nullable: true })
  mentorId!: string | null;

  @Column('varchar')
  ruleProfile!: string;

  @Column('varchar')
  startedOn!: string;
}
