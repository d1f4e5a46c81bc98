import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

/** An entry of the record. The database refuses to change or delete one; corrections stand beside it. */
@Entity('entries')
@Index('entries_of_build', ['buildId', 'doneAt', 'id'])
export class EntryEntity {
  @PrimaryColumn('varchar')
  id!: string;

  @ForeignKey('BuildEntity')
  @Column('varchar')
  buildId!: string;

  @Column('varchar')
  kind!: 'work' | 'fix' | 'visit' | 'closeUp';

  @ForeignKey('SectionEntity')
  @Column('varchar', { nullable: true })
  sectionId!: string | null;

  @ForeignKey('StepEntity')
  @Column('varchar', { nullable: true })
  stepId!: string | null;

  @ForeignKey('QuestionEntity')
  @Column('varchar', { nullable: true })
  questionId!: string | null;

  @Column('varchar')
  title!: string;

  @Column('simple-json')
  lines!: { label: string; text: string }[];

  @Column('integer', { nullable: true })
  minutes!: number | null;

  @ForeignKey('UserEntity')
  @Column('varchar')
  byId!: string;

  @Column('simple-json')
  helpers!: string[];

  @Column('simple-json')
  photoIds!: string[];

  @Column('varchar')
  doneAt!: string;

  @Column('varchar')
  writtenAt!: string;
}
