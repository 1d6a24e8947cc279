import { type SearchOutcome } from '@stageyard/libs/train-planner';
import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryGeneratedColumn, type Relation } from 'typeorm';
import { Brief } from '../../briefs/entities/brief.entity.js';
import { type Requirement } from '../../briefs/requirement.js';
import { UserEntity } from '../../users/entities/user.entity.js';

export const SEARCH_STATES = ['queued', 'running', 'done', 'stopped', 'failed'] as const;
export type SearchState = (typeof SEARCH_STATES)[number];
/** States in which a thread still works, or will work, on the search. */
export const UNFINISHED_STATES: readonly SearchState[] = ['queued', 'running'];

/** One search run for a brief, kept with what was asked and what came out. */
@Entity('option_search')
@Index('option_search_brief', ['briefId', 'id'])
@Index('option_search_state', ['state'])
export class OptionSearch {
  @PrimaryGeneratedColumn()
  id!: number;

  @Column({ type: 'integer' })
  briefId!: number;

  @ManyToOne(() => Brief, { nullable: false })
  @JoinColumn({ name: 'briefId', foreignKeyConstraintName: 'option_search_brief_row' })
  brief?: Relation<Brief>;

  /** The brief's version that was searched: another one means the brief changed since. */
  @Column({ type: 'integer' })
  briefVersion!: number;

  @Column({ type: 'text' })
  state!: SearchState;

  /** Copy of the requirement as it was searched. */
  @Column({ type: 'simple-json' })
  request!: Requirement;

  @Column({ type: 'simple-json', nullable: true })
  outcome!: SearchOutcome | null;

  /** Kept beside the outcome, so that lists need not read it. */
  @Column({ type: 'integer', nullable: true })
  optionCount!: number | null;

  @Column({ type: 'boolean', nullable: true })
  complete!: boolean | null;

  /** In words: why it failed or stopped. */
  @Column({ type: 'text', nullable: true })
  message!: string | null;

  @Column({ type: 'varchar' })
  startedById!: string;

  @ManyToOne(() => UserEntity, { nullable: false })
  @JoinColumn({ name: 'startedById', foreignKeyConstraintName: 'option_search_user' })
  startedBy?: Relation<UserEntity>;

  @Column({ type: 'text' })
  startedAt!: string;

  @Column({ type: 'text', nullable: true })
  finishedAt!: string | null;
}
