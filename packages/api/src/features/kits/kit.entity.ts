import { Column, Entity, PrimaryColumn } from 'typeorm';

@Entity('kits')
export class KitEntity {
  @PrimaryColumn('varchar')
  id!: string;

  @Column('varchar')
  name!: string;

  @Column('varchar')
  maker!: string;

  @Column('varchar')
  kind!: string;
}
