import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryGeneratedColumn, type Relation } from 'typeorm';
import { Part } from '../../parts/entities/part.entity.js';
import type { MovementKind } from '../movement-kinds.js';

/** One change of a shelf quantity; rows are only ever added. Quantities are whole thousandths of the part's unit. */
@Entity('stock_movement')
@Index('stock_movement_part', ['partId', 'place', 'change'])
export class StockMovement {
  @PrimaryGeneratedColumn({ type: 'integer' })
  id!: number;

  @Column({ type: 'integer' })
  partId!: number;

  @ManyToOne(() => Part, { nullable: false })
  @JoinColumn({ name: 'partId', foreignKeyConstraintName: 'stock_movement_part_row' })
  part?: Relation<Part>;

  @Column({ type: 'text' })
  kind!: MovementKind;

  /** What the shelf gained or, below zero, lost; 0 only for a count that found what was expected. */
  @Column({ type: 'integer' })
  change!: number;

  /** What a count found there; null for other kinds. */
  @Column({ type: 'integer', nullable: true })
  counted!: number | null;

  /** What lies at the place after this movement. */
  @Column({ type: 'integer' })
  after!: number;

  /** Rack, shelf, drawer. */
  @Column({ type: 'text', collation: 'NOCASE' })
  place!: string;

  /** Why, in the person's words. */
  @Column({ type: 'text' })
  reason!: string;

  /** ISO 8601, UTC. */
  @Index('stock_movement_at')
  @Column({ type: 'text' })
  at!: string;

  @Column({ type: 'varchar', nullable: true })
  actorId!: string | null;

  @Column({ type: 'text' })
  actorName!: string;

  /** Given by the device that sent it, so that a repeated request books once. */
  @Index('stock_movement_request', { unique: true })
  @Column({ type: 'text', nullable: true })
  requestKey!: string | null;
}
