import { Column, Entity, PrimaryColumn } from 'typeorm';

/** The last running number given out, one row a prefix, so that a number is never used twice. */
@Entity('part_number_series')
export class PartNumberSeries {
  @PrimaryColumn({ type: 'text' })
  prefix!: string;

  @Column({ type: 'integer' })
  last!: number;
}
