import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

@Entity('objections')
@Index('objections_to_fix', ['fixId'])
export class ObjectionEntity {
  @PrimaryColumn('varchar')
  id!: string;

  @ForeignKey('FixEntity')
  @Column('varchar')
  fixId!: string;

  @ForeignKey('UserEntity')
  @Column('varchar')
  byId!: string;

  @Column('varchar')
  at!: string;

  @Column('text')
  reason!: string;

  @Column('varchar', { nullable: true })
  answeredAt!: string | null;

  @ForeignKey('UserEntity')
  @Column('varchar', { nullable: true })
  answeredById!: string | null;

  @Column('text', { nullable: true })
  answer!: string | null;
}
