import { ApiProperty } from '@nestjs/swagger';
import { PageOf } from '../../common/list-query.js';
import { type AuditEntry } from '../entities/audit-entry.js';

/** One change of one thing. */
export class Change {
  @ApiProperty({ type: 'integer' })
  id!: number;

  @ApiProperty({ type: String, format: 'date-time' })
  at!: string;

  @ApiProperty({ type: String, description: "The person's name at that time." })
  by!: string;

  @ApiProperty({ type: String })
  action!: string;

  @ApiProperty({ type: String })
  entity!: string;

  @ApiProperty({ type: String })
  entityId!: string;

  @ApiProperty({ type: String })
  summary!: string;

  @ApiProperty({ type: 'object', additionalProperties: true, nullable: true })
  before!: Record<string, unknown> | null;

  @ApiProperty({ type: 'object', additionalProperties: true, nullable: true })
  after!: Record<string, unknown> | null;
}

export class ChangePage extends PageOf(Change) {}

export function toChange(entry: AuditEntry): Change {
  return {
    id: entry.id,
    at: entry.at,
    by: entry.actorName,
    action: entry.action,
    entity: entry.entity,
    entityId: entry.entityId,
    summary: entry.summary,
    before: entry.before as Change['before'],
    after: entry.after as Change['after'],
  };
}
