import { Column, Entity, Index, PrimaryGeneratedColumn } from 'typeorm';

/** What a row of the full-text index `search_index` (same rowid) stands for, and who may find it. */
@Entity('search_docs')
@Index('search_docs_of', ['kind', 'refId'], { unique: true })
@Index('search_docs_of_question', ['questionId'])
export class SearchDocEntity {
  @PrimaryGeneratedColumn('increment', { type: 'integer' })
  id!: number;

  @Column('varchar')
  kind!: 'question' | 'message' | 'fix' | 'part' | 'step' | 'holeLine' | 'notice' | 'section';

  @Column('varchar')
  refId!: string;

  @Column('varchar', { nullable: true })
  questionId!: string | null;

  @Column('varchar')
  kitId!: string;

  /** Null where every member of a chapter of the kit may find it. */
  @Column('varchar', { nullable: true })
  chapterId!: string | null;
}
