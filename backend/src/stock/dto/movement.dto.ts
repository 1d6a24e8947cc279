import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { PageOf } from '../../common/list-query.js';
import type { Part } from '../../parts/entities/part.entity.js';
import { PART_UNITS, unitOf, type PartUnit } from '../../parts/part-unit.js';
import type { StockMovement } from '../entities/stock-movement.entity.js';
import { MOVEMENT_KINDS, type MovementKind } from '../movement-kinds.js';
import { fromThousandths } from '../thousandths.js';

/** One change of a shelf quantity: who, when, why, where. It is never changed afterwards. */
@ApiSchema({ name: 'Movement' })
export class MovementDto {
  @ApiProperty({ type: 'integer' })
  id!: number;

  @ApiProperty({ type: 'string', example: 'KW-00417' })
  number!: string;

  @ApiProperty({ type: 'string' })
  description!: string;

  @ApiProperty({ enum: PART_UNITS, enumName: 'PartUnit' })
  unit!: PartUnit;

  @ApiProperty({ enum: MOVEMENT_KINDS, enumName: 'MovementKind' })
  kind!: MovementKind;

  @ApiProperty({ type: 'number', description: 'What the shelf gained or, below zero, lost' })
  change!: number;

  @ApiProperty({ type: 'number', nullable: true, description: 'What a count found there' })
  counted!: number | null;

  @ApiProperty({ type: 'number', description: 'What lay at the place afterwards' })
  after!: number;

  @ApiProperty({ type: 'string' })
  place!: string;

  @ApiProperty({ type: 'string', description: 'Why, in words; may be empty' })
  reason!: string;

  @ApiProperty({ type: 'string', format: 'date-time' })
  at!: string;

  @ApiProperty({ type: 'string', description: "The person's name at that time" })
  by!: string;
}

@ApiSchema({ name: 'MovementPage' })
export class MovementPageDto extends PageOf(MovementDto) {}

export function toMovementDto(
  movement: StockMovement,
  part: Pick<Part, 'number' | 'description' | 'kind'>,
): MovementDto {
  const { id, kind, change, counted, after, place, reason, at, actorName } = movement;
  return {
    id,
    number: part.number,
    description: part.description,
    unit: unitOf(part.kind),
    kind,
    change: fromThousandths(change),
    counted: counted === null ? null : fromThousandths(counted),
    after: fromThousandths(after),
    place,
    reason,
    at,
    by: actorName,
  };
}
