import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

@Entity('open_items')
@Index('open_items_of_build', ['buildId', 'clearedAt'])
export class OpenItemEntity {
  @PrimaryColumn('varchar')
  id!: string;

  @ForeignKey('BuildEntity')
  @Column('varchar')
  buildId!: string;

  @ForeignKey('SectionEntity')
  @Column('varchar', { nullable: true })
  sectionId!: string | null;

  @ForeignKey('QuestionEntity')
  @Column('varchar', { nullable: true })
  questionId!: string | null;

  @Column('text')
  text!: string;

  @Column('varchar', { nullable: true })
  due!: string | null;

  @Column('varchar')
  raisedAt!: string;

  @Column('varchar', { nullable: true })
  clearedAt!: string | null;

  @ForeignKey('UserEntity')
  @Column('varchar', { nullable: true })
  clearedById!: string | null;

  @Column('text', { nullable: true })
  clearedNote!: string | null;
}
