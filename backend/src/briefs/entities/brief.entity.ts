import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryGeneratedColumn, type Relation } from 'typeorm';
import { UserEntity } from '../../users/entities/user.entity.js';
import { type Requirement } from '../requirement.js';

/** Where a brief stands: nothing searched since its requirement changed, searched, or a train was taken from it. */
export const BRIEF_STANDINGS = ['open', 'searched', 'adopted'] as const;
export type BriefStanding = (typeof BRIEF_STANDINGS)[number];

/** A requirement somebody wants a train for. */
@Entity('brief')
export class Brief {
  @PrimaryGeneratedColumn()
  id!: number;

  /** Running code such as `B-0001`. */
  @Index('brief_code', { unique: true })
  @Column({ type: 'text' })
  code!: string;

  @Column({ type: 'text' })
  title!: string;

  @Column({ type: 'text' })
  note!: string;

  @Column({ type: 'simple-json' })
  requirement!: Requirement;

  @Column({ type: 'text' })
  standing!: BriefStanding;

  @Index('brief_owner')
  @Column({ type: 'varchar' })
  ownerId!: string;

  @ManyToOne(() => UserEntity, { nullable: false })
  @JoinColumn({ name: 'ownerId', foreignKeyConstraintName: 'brief_owner_user' })
  owner?: Relation<UserEntity>;

  @Column({ type: 'integer' })
  version!: number;

  @Column({ type: 'text' })
  createdAt!: string;

  @Column({ type: 'text' })
  updatedAt!: string;
}
