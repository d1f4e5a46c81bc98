import type { PhotoMark } from '@rivetside/shared';
import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

@Entity('photos')
@Index('photos_of_owner', ['ownerId'])
export class PhotoEntity {
  @PrimaryColumn('varchar')
  id!: string;

  @ForeignKey('UserEntity')
  @Column('varchar')
  ownerId!: string;

  @Column('varchar')
  contentType!: string;

  @Column('integer')
  width!: number;

  @Column('integer')
  height!: number;

  @Column('integer')
  bytes!: number;

  /** Of the full-size file as stored. */
  @Column('varchar')
  sha256!: string;

  @Column('varchar', { nullable: true })
  caption!: string | null;

  @Column('simple-json')
  marks!: PhotoMark[];

  @Column('varchar')
  storedAt!: string;
}
