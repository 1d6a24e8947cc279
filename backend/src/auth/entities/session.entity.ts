import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { UserEntity } from '../../users/entities/user.entity.js';

/** One sign-in on one device. */
@Entity('sessions')
export class SessionEntity {
  /** SHA-256 of the id in the cookie, so that reading the database gives nobody a session. */
  @PrimaryColumn({ type: 'varchar' })
  id!: string;

  @Index('sessions_user_id')
  @Column({ type: 'varchar' })
  userId!: string;

  @ManyToOne(() => UserEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'userId', foreignKeyConstraintName: 'sessions_user' })
  user!: Relation<UserEntity>;

  @Column({ type: 'text' })
  createdAt!: string;

  /** When the session was last used, to within a few minutes. */
  @Column({ type: 'text' })
  seenAt!: string;

  /** The moment the session ends whatever happens. */
  @Column({ type: 'text' })
  expiresAt!: string;
}
