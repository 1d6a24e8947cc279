import { Column, Entity, Index, PrimaryGeneratedColumn } from 'typeorm';

/** One change of one thing: who, when, what, before and after. Triggers keep it from being changed. */
@Entity('audit_entries')
@Index('audit_entries_entity', ['entity', 'entityId', 'id'])
export class AuditEntry {
  @PrimaryGeneratedColumn({ type: 'integer' })
  id!: number;

  @Column({ type: 'text' })
  at!: string;

  /** Null when the server itself acted. */
  @Column({ type: 'varchar', nullable: true })
  actorId!: string | null;

  @Column({ type: 'varchar' })
  actorName!: string;

  @Column({ type: 'varchar' })
  action!: string;

  @Column({ type: 'varchar' })
  entity!: string;

  @Column({ type: 'varchar' })
  entityId!: string;

  @Column({ type: 'text' })
  summary!: string;

  @Column({ type: 'simple-json', nullable: true })
  before!: object | null;

  @Column({ type: 'simple-json', nullable: true })
  after!: object | null;
}
