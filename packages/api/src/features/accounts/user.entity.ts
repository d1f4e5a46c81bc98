import type { SiteRole, Units } from '@rivetside/shared';
import { Column, Entity, PrimaryColumn } from 'typeorm';

@Entity('users')
export class UserEntity {
  @PrimaryColumn('varchar')
  id!: string;

  /** Lower case. */
  @Column('varchar', { unique: true })
  email!: string;

  @Column('varchar')
  name!: string;

  @Column('varchar')
  passwordHash!: string;

  @Column('varchar', { nullable: true })
  emailConfirmedAt!: string | null;

  @Column('varchar')
  units!: Units;

  /** IANA zone. */
  @Column('varchar')
  zone!: string;

  @Column('varchar', { nullable: true })
  siteRole!: SiteRole;

  @Column('varchar', { nullable: true })
  disabledAt!: string | null;

  @Column('varchar')
  createdAt!: string;
}
