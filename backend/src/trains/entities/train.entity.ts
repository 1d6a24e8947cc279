import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryGeneratedColumn, type Relation } from 'typeorm';
import { Brief } from '../../briefs/entities/brief.entity.js';
import { type BomEdits } from '../bom-edits.js';
import { UserEntity } from '../../users/entities/user.entity.js';
import { type AdoptedSpec } from '../adopted-spec.js';

/** What a train's present revision may be; later states come with review and issue. */
export const REVISION_STATES = ['working'] as const;
export type RevisionState = (typeof REVISION_STATES)[number];

/** An adopted option, from here on a thing of its own. */
@Entity('train')
export class Train {
  @PrimaryGeneratedColumn()
  id!: number;

  /** Running code such as `T-0001`. */
  @Index('train_code', { unique: true })
  @Column({ type: 'text' })
  code!: string;

  @Column({ type: 'text' })
  title!: string;

  @Column({ type: 'text' })
  note!: string;

  /** Lettered: A, B, C … */
  @Column({ type: 'text' })
  revision!: string;

  @Column({ type: 'text' })
  state!: RevisionState;

  @Index('train_brief')
  @Column({ type: 'integer', nullable: true })
  briefId!: number | null;

  @ManyToOne(() => Brief, { nullable: true })
  @JoinColumn({ name: 'briefId', foreignKeyConstraintName: 'train_brief_row' })
  brief?: Relation<Brief> | null;

  /** The option this train was taken from. */
  @Column({ type: 'text' })
  optionKey!: string;

  @Column({ type: 'simple-json' })
  spec!: AdoptedSpec;

  /** How many are built at once; null: one. */
  @Column({ type: 'integer', nullable: true })
  buildQuantity!: number | null;

  /** What people changed on the bill of materials beside the gears; null: nothing. */
  @Column({ type: 'simple-json', nullable: true })
  bomEdits!: BomEdits | null;

  /** Offer chosen by a person for a part, by part number; null: none, the rule chooses. */
  @Column({ type: 'simple-json', nullable: true })
  offerChoices!: Record<string, number> | null;

  @Index('train_owner')
  @Column({ type: 'varchar' })
  ownerId!: string;

  @ManyToOne(() => UserEntity, { nullable: false })
  @JoinColumn({ name: 'ownerId', foreignKeyConstraintName: 'train_user' })
  owner?: Relation<UserEntity>;

  @Column({ type: 'integer' })
  version!: number;

  @Column({ type: 'text' })
  createdAt!: string;

  @Column({ type: 'text' })
  updatedAt!: string;
}
