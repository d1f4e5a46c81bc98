import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm';

/**
 * What somebody signed up with, beside the link that confirms it. It counts when that very link is pressed: whoever
 * signs up with a stranger's address, before or after its owner, thus never sets the owner's password.
 */
@Entity('sign_ups')
export class SignUpEntity {
  /** Of the link's token. */
  @ForeignKey('MailTokenEntity', { onDelete: 'CASCADE' })
  @PrimaryColumn('varchar')
  hash!: string;

  @Column('varchar')
  name!: string;

  @Column('varchar')
  passwordHash!: string;
}
