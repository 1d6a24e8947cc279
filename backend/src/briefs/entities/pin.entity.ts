import { type TrainOption } from '@stageyard/libs/train-planner';
import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryGeneratedColumn, type Relation } from 'typeorm';
import { OptionSearch } from '../../option-searches/entities/option-search.entity.js';
import { UserEntity } from '../../users/entities/user.entity.js';
import { Brief } from './brief.entity.js';

/** An option kept for comparison. The option is a copy, so that a later search cannot lose it. */
@Entity('pin')
@Index('pin_brief_key', ['briefId', 'optionKey'], { unique: true })
export class Pin {
  @PrimaryGeneratedColumn()
  id!: number;

  @Column({ type: 'integer' })
  briefId!: number;

  @ManyToOne(() => Brief, { nullable: false })
  @JoinColumn({ name: 'briefId', foreignKeyConstraintName: 'pin_brief_row' })
  brief?: Relation<Brief>;

  @Column({ type: 'text' })
  optionKey!: string;

  @Column({ type: 'integer' })
  searchId!: number;

  @ManyToOne(() => OptionSearch, { nullable: false })
  @JoinColumn({ name: 'searchId', foreignKeyConstraintName: 'pin_search_row' })
  search?: Relation<OptionSearch>;

  @Column({ type: 'simple-json' })
  option!: TrainOption;

  @Column({ type: 'text' })
  pinnedAt!: string;

  @Column({ type: 'varchar' })
  pinnedById!: string;

  @ManyToOne(() => UserEntity, { nullable: false })
  @JoinColumn({ name: 'pinnedById', foreignKeyConstraintName: 'pin_user' })
  pinnedBy?: Relation<UserEntity>;
}
