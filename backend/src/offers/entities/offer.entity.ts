import { type PriceBreak } from '@stageyard/libs/bill-of-materials';
import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryGeneratedColumn, type Relation } from 'typeorm';
import { Part } from '../../parts/entities/part.entity.js';
import { Supplier } from '../../suppliers/entities/supplier.entity.js';
import type { OfferStanding, PricePer } from '../offer-terms.js';

/** One supplier's price row for a part. Quantities are in the part's unit, at most three decimals. */
@Entity('offer')
@Index('offer_part', ['partId', 'standing'])
@Index('offer_supplier_part', ['supplierId', 'partId'])
@Index('offer_supplier_state', ['supplierId', 'standing', 'validUntil', 'pricedOn'])
@Index('offer_supplier_number', ['supplierId', 'supplierPartNumber'])
export class Offer {
  @PrimaryGeneratedColumn({ type: 'integer' })
  id!: number;

  @Column({ type: 'integer' })
  partId!: number;

  @ManyToOne(() => Part, { nullable: false })
  @JoinColumn({ name: 'partId', foreignKeyConstraintName: 'offer_part_row' })
  part?: Relation<Part>;

  @Column({ type: 'integer' })
  supplierId!: number;

  @ManyToOne(() => Supplier, { nullable: false })
  @JoinColumn({ name: 'supplierId', foreignKeyConstraintName: 'offer_supplier_row' })
  supplier?: Relation<Supplier>;

  /** The supplier's own number for it; blank when it is not known. */
  @Column({ type: 'text', collation: 'NOCASE' })
  supplierPartNumber!: string;

  @Column({ type: 'text' })
  standing!: OfferStanding;

  /** ISO 4217 */
  @Column({ type: 'text' })
  currency!: string;

  /** Prices are for this many. */
  @Column({ type: 'integer' })
  per!: PricePer;

  /** Ascending quantities; prices in minor units of the currency. */
  @Column({ type: 'simple-json' })
  breaks!: PriceBreak[];

  /** Sold in multiples of this. */
  @Column({ type: 'real' })
  pack!: number;

  @Column({ type: 'real' })
  leastQuantity!: number;

  /** Calendar days; null: the supplier's usual lead time. */
  @Column({ type: 'integer', nullable: true })
  leadTimeDays!: number | null;

  /** ISO 8601 date. */
  @Column({ type: 'text' })
  validFrom!: string;

  /** Last day, ISO 8601 date; null: until further notice. */
  @Index('offer_valid_until')
  @Column({ type: 'text', nullable: true })
  validUntil!: string | null;

  /** Day on which the supplier stated the price, ISO 8601 date; its age counts from here. */
  @Index('offer_priced_on')
  @Column({ type: 'text' })
  pricedOn!: string;

  /** Where the price comes from: a quotation's number, a price list, a call. */
  @Column({ type: 'text' })
  source!: string;

  @Column({ type: 'text' })
  note!: string;

  @Column({ type: 'integer' })
  version!: number;

  @Column({ type: 'text' })
  createdAt!: string;

  @Index('offer_updated')
  @Column({ type: 'text' })
  updatedAt!: string;

  /** Name of the person who changed it last. */
  @Column({ type: 'text' })
  updatedBy!: string;
}
