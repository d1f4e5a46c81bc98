import type {
  Audience,
  Discipline,
  FitCheck,
  Headline,
  HoleCard,
  HolePlace,
  Mishap,
  QuestionState,
  Wait,
} from '@rivetside/shared';
import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

@Entity('questions')
@Index('question_number_in_kit', ['kitId', 'number'], { unique: true })
@Index('questions_by_activity', ['lastActivityAt', 'id'])
@Index('questions_of_chapter', ['chapterId', 'lastActivityAt', 'id'])
@Index('questions_of_section', ['sectionId', 'lastActivityAt', 'id'])
@Index('questions_of_asker', ['askedById', 'lastActivityAt', 'id'])
@Index('questions_of_build', ['buildId', 'lastActivityAt', 'id'])
@Index('questions_of_part', ['partId', 'lastActivityAt', 'id'])
@Index('questions_of_hole_line', ['holeLineId', 'lastActivityAt', 'id'])
@Index('questions_that_wait', ['waitsFor', 'discipline', 'waitsSince', 'id'])
@Index('questions_by_state', ['state', 'lastActivityAt', 'id'])
export class QuestionEntity {
  @PrimaryColumn('varchar')
  id!: string;

  /** As punched on the sheet: STB-Q-014. */
  @Column('varchar')
  number!: string;

  @ForeignKey('KitEntity')
  @Column('varchar')
  kitId!: string;

  @ForeignKey('SectionEntity')
  @Column('varchar', { nullable: true })
  sectionId!: string | null;

  @ForeignKey('StepEntity')
  @Column('varchar', { nullable: true })
  stepId!: string | null;

  @ForeignKey('PartEntity')
  @Column('varchar', { nullable: true })
  partId!: string | null;

  @ForeignKey('HoleLineEntity')
  @Column('varchar', { nullable: true })
  holeLineId!: string | null;

  @Column('simple-json')
  holes!: HolePlace[];

  @ForeignKey('BuildEntity')
  @Column('varchar', { nullable: true })
  buildId!: string | null;

  @ForeignKey('ChapterEntity')
  @Column('varchar')
  chapterId!: string;

  @Column('varchar')
  audience!: Audience;

  @Column('varchar')
  discipline!: Discipline;

  @Column('varchar')
  mishap!: Mishap;

  @Column('varchar')
  title!: string;

  @Column('text')
  body!: string;

  @Column('simple-json', { nullable: true })
  holeCard!: HoleCard | null;

  /** Frozen with its engine version when the question was asked. */
  @Column('simple-json', { nullable: true })
  fitCheck!: FitCheck | null;

  @Column('simple-json', { nullable: true })
  headline!: Headline | null;

  @ForeignKey('UserEntity')
  @Column('varchar')
  askedById!: string;

  @Column('varchar')
  askedAt!: string;

  /** Kept beside its facts, so that lists need not derive it; rewritten in the unit that changes a fact. */
  @Column('varchar')
  state!: QuestionState;

  @Column('varchar')
  waitsFor!: Wait;

  @Column('varchar')
  waitsSince!: string;

  @Column('integer')
  lastSeq!: number;

  @Column('varchar')
  lastActivityAt!: string;

  @Column('varchar', { nullable: true })
  withdrawnAt!: string | null;

  @Column('text', { nullable: true })
  withdrawnReason!: string | null;
}
