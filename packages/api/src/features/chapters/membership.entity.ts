import type { ChapterRole, Discipline } from '@rivetside/shared';
import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

@Entity('memberships')
@Index('member_of_chapter', ['chapterId', 'userId'], { unique: true })
@Index('memberships_of_user', ['userId'])
export class MembershipEntity {
  @PrimaryColumn('varchar')
  id!: string;

  @ForeignKey('ChapterEntity', { onDelete: 'CASCADE' })
  @Column('varchar')
  chapterId!: string;

  @ForeignKey('UserEntity', { onDelete: 'CASCADE' })
  @Column('varchar')
  userId!: string;

  @Column('simple-json')
  roles!: ChapterRole[];

  @Column('simple-json')
  disciplines!: Discipline[];

  @Column('varchar')
  status!: 'active' | 'requested' | 'suspended';

  /** What is engraved on the member's stamps, such as M-07. */
  @Column('varchar', { nullable: true })
  stampNumber!: string | null;

  @Column('varchar')
  joinedAt!: string;
}
