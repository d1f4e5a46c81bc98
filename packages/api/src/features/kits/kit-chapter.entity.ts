import { Entity, ForeignKey, PrimaryColumn } from 'typeorm';

/** Chapters whose members build the kit: a question shared with the kit is seen by all of them. */
@Entity('kit_chapters')
export class KitChapterEntity {
  @ForeignKey('KitEntity', { onDelete: 'CASCADE' })
  @PrimaryColumn('varchar')
  kitId!: string;

  @ForeignKey('ChapterEntity', { onDelete: 'CASCADE' })
  @PrimaryColumn('varchar')
  chapterId!: string;
}
