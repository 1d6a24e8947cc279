import { Column, Entity, Index, PrimaryGeneratedColumn } from 'typeorm';
import type { FreightRule, SupplierContact, SupplierLanguage, SupplierStanding } from '../supplier-terms.js';

/** A firm that parts are bought from. */
@Entity('supplier')
@Index('supplier_standing_name', ['standing', 'name'])
export class Supplier {
  @PrimaryGeneratedColumn({ type: 'integer' })
  id!: number;

  /** Running code such as `S-0001`. */
  @Index('supplier_code', { unique: true })
  @Column({ type: 'text' })
  code!: string;

  /** Unique whatever the case of its letters. */
  @Index('supplier_name', { unique: true })
  @Column({ type: 'text', collation: 'NOCASE' })
  name!: string;

  @Column({ type: 'text' })
  standing!: SupplierStanding;

  /** ISO 4217; what enquiries ask for and new offers start with. */
  @Column({ type: 'text' })
  currency!: string;

  /** BCP 47 tag of the language that enquiries are written in. */
  @Column({ type: 'text' })
  language!: SupplierLanguage;

  @Column({ type: 'simple-json' })
  contacts!: SupplierContact[];

  @Column({ type: 'text' })
  address!: string;

  @Column({ type: 'simple-json' })
  freight!: FreightRule;

  /** Least value of one order in minor units of the currency; null when there is none. */
  @Column({ type: 'integer', nullable: true })
  leastOrderValue!: number | null;

  /** What the supplier usually needs, calendar days; offers without a lead time count with it. */
  @Column({ type: 'integer', nullable: true })
  leadTimeDays!: number | null;

  @Column({ type: 'text' })
  note!: string;

  @Column({ type: 'integer' })
  version!: number;

  @Column({ type: 'text' })
  createdAt!: string;

  @Column({ type: 'text' })
  updatedAt!: string;

  /** Name of the person who changed it last. */
  @Column({ type: 'text' })
  updatedBy!: string;
}
