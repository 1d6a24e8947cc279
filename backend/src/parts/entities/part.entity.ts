import { Column, Entity, Index, PrimaryGeneratedColumn } from 'typeorm';
import type { PartAttributes } from '../dto/attributes/part-attributes.js';
import type { Hand, PartKind, PartStanding, PartSupply } from '../part-kinds.js';

/**
 * One part of the library. The attributes of its kind stand whole in `attributes`; what lists filter and sort by, and
 * what kits look up, is copied into columns of its own (see `part-columns.ts`) so that indexes serve it.
 */
@Entity('part')
@Index('part_kind_number', ['kind', 'number'])
@Index('part_kind_tooth', ['kind', 'module', 'teeth'])
@Index('part_kind_bore', ['kind', 'bore'])
@Index('part_kind_shaft', ['kind', 'shaftDiameter'])
@Index('part_kind_length', ['kind', 'length'])
@Index('part_kind_mass', ['kind', 'mass'])
@Index('part_standing_number', ['standing', 'number'])
@Index('part_standing_updated', ['standing', 'updatedAt'])
export class Part {
  @PrimaryGeneratedColumn({ type: 'integer' })
  id!: number;

  /** Unique whatever the case of its letters; shown as it was written. */
  @Column({ type: 'text', collation: 'NOCASE' })
  @Index('part_number_unique', { unique: true })
  number!: string;

  @Column({ type: 'text' })
  kind!: PartKind;

  @Column({ type: 'text', collation: 'NOCASE' })
  @Index('part_description')
  description!: string;

  @Column({ type: 'text' })
  standing!: PartStanding;

  /** Number of the part to use instead, for a withdrawn part. */
  @Column({ type: 'text', nullable: true, collation: 'NOCASE' })
  @Index('part_successor')
  successorNumber!: string | null;

  @Column({ type: 'text', nullable: true, collation: 'NOCASE' })
  @Index('part_material')
  material!: string | null;

  /** kg each */
  @Column({ type: 'real', nullable: true })
  @Index('part_mass')
  mass!: number | null;

  @Column({ type: 'text' })
  supply!: PartSupply;

  @Column({ type: 'text', nullable: true })
  supplier!: string | null;

  @Column({ type: 'text' })
  note!: string;

  @Column({ type: 'simple-json' })
  attributes!: PartAttributes;

  @Column({ type: 'integer', nullable: true })
  @Index('part_teeth')
  teeth!: number | null;

  /** Normal module, mm. */
  @Column({ type: 'real', nullable: true })
  @Index('part_module')
  module!: number | null;

  @Column({ type: 'real', nullable: true })
  pressureAngleDeg!: number | null;

  @Column({ type: 'real', nullable: true })
  helixAngleDeg!: number | null;

  @Column({ type: 'text', nullable: true })
  hand!: Hand | null;

  /** Profile shift coefficient; null when the maker does not state it. */
  @Column({ type: 'real', nullable: true })
  profileShift!: number | null;

  /** mm */
  @Column({ type: 'real', nullable: true })
  @Index('part_face_width')
  faceWidth!: number | null;

  /** Bore of a gear or a bearing, mm. */
  @Column({ type: 'real', nullable: true })
  @Index('part_bore')
  bore!: number | null;

  /** Diameter of a shaft, or of the shaft that a ring or seal fits, mm. */
  @Column({ type: 'real', nullable: true })
  shaftDiameter!: number | null;

  /** Length of a shaft, key or housing, mm. */
  @Column({ type: 'real', nullable: true })
  length!: number | null;

  /** Width of a key or housing, mm. */
  @Column({ type: 'real', nullable: true })
  width!: number | null;

  /** Height of a key or housing, mm. */
  @Column({ type: 'real', nullable: true })
  height!: number | null;

  /** Whole thousandths of the unit below which the shelf is low; null when nobody watches it. */
  @Index('part_least_stock', { where: '"leastStock" IS NOT NULL' })
  @Column({ type: 'integer', nullable: true })
  leastStock!: number | null;

  /** Grows by one with every change; an edit names the version it saw. */
  @Column({ type: 'integer' })
  version!: number;

  /** ISO 8601, UTC. */
  @Column({ type: 'text' })
  createdAt!: string;

  @Column({ type: 'text' })
  @Index('part_updated')
  updatedAt!: string;

  /** Name of the person who changed it last. */
  @Column({ type: 'text' })
  updatedBy!: string;
}
