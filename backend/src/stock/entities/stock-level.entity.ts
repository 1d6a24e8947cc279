import { Column, Entity, Index, PrimaryColumn } from 'typeorm';

/**
 * What lies where: the sum of the movements of a part at a place. The database keeps it from them by itself and refuses
 * any other figure.
 */
@Entity('stock_level')
export class StockLevel {
  @PrimaryColumn({ type: 'integer' })
  partId!: number;

  @PrimaryColumn({ type: 'text', collation: 'NOCASE' })
  @Index('stock_level_place')
  place!: string;

  /** Whole thousandths of the part's unit, never below 0. */
  @Column({ type: 'integer' })
  quantity!: number;

  /** The latest movement; a count names the one it saw. */
  @Column({ type: 'integer' })
  lastMovementId!: number;

  /** ISO 8601, UTC; null when it was never counted. */
  @Column({ type: 'text', nullable: true })
  countedAt!: string | null;
}
