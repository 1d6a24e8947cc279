import { Column, Entity, Index, PrimaryColumn } from 'typeorm';
import { type Role } from '../../auth/permissions.js';

/** A person who can sign in. Never deleted, since records name them; made inactive instead. */
@Entity('users')
export class UserEntity {
  @PrimaryColumn({ type: 'varchar' })
  id!: string;

  /** Lower case, compared without regard to case. */
  @Index('users_email', { unique: true })
  @Column({ type: 'varchar', collation: 'NOCASE' })
  email!: string;

  @Column({ type: 'varchar' })
  name!: string;

  /** argon2id, in its own text form. */
  @Column({ type: 'varchar', select: false })
  passwordHash!: string;

  @Column({ type: 'simple-json' })
  roles!: Role[];

  @Column({ type: 'boolean' })
  active!: boolean;

  /** An account whose password everybody knows: it works in demo mode only. */
  @Column({ type: 'boolean' })
  demo!: boolean;

  @Column({ type: 'integer' })
  version!: number;

  @Column({ type: 'text' })
  createdAt!: string;

  @Column({ type: 'text' })
  updatedAt!: string;
}
