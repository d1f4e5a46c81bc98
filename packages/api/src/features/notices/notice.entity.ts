import type { NoticeClass } from '@rivetside/shared';
import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

@Entity('notices')
@Index('notice_number_in_kit', ['kitId', 'number'], { unique: true })
export class NoticeEntity {
  @PrimaryColumn('varchar')
  id!: string;

  @ForeignKey('KitEntity', { onDelete: 'CASCADE' })
  @Column('varchar')
  kitId!: string;

  @Column('varchar')
  number!: string;

  @Column('varchar')
  title!: string;

  @Column('varchar')
  class!: NoticeClass;

  @Column('varchar')
  revision!: string;

  @Column('varchar')
  issuedOn!: string;

  @Column('integer')
  serialFrom!: number;

  @Column('integer')
  serialTo!: number;

  @Column('simple-json')
  sectionCodes!: string[];

  @Column('simple-json')
  partNumbers!: string[];

  @Column('simple-json')
  holeLineCodes!: string[];

  @Column('varchar', { nullable: true })
  holes!: string | null;

  @Column('text')
  text!: string;
}
