import { Column, Entity, PrimaryColumn } from 'typeorm';

@Entity('chapters')
export class ChapterEntity {
  @PrimaryColumn('varchar')
  id!: string;

  @Column('varchar', { unique: true })
  key!: string;

  @Column('varchar')
  name!: string;

  @Column('varchar')
  zone!: string;

  /** ISO 4217 */
  @Column('varchar')
  currency!: string;

  @Column('varchar')
  meets!: string;

  @Column('varchar')
  place!: string;

  @Column('varchar')
  joining!: 'open' | 'approval';

  @Column('varchar')
  createdAt!: string;
}
