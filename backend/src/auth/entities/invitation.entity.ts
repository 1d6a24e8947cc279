import { Column, Entity, Index, PrimaryColumn } from 'typeorm';

/** A link that works once. Only the hash of its token is kept; using it deletes the row. */
@Entity('invitations')
export class InvitationEntity {
  @PrimaryColumn({ type: 'varchar' })
  id!: string;

  @Index('invitations_token', { unique: true })
  @Column({ type: 'varchar' })
  tokenHash!: string;

  @Column({ type: 'varchar' })
  purpose!: 'first-admin';

  @Column({ type: 'text' })
  createdAt!: string;

  @Column({ type: 'text' })
  expiresAt!: string;
}
