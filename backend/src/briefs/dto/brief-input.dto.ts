import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { IsObject, ValidateNested } from 'class-validator';
import { FieldText } from '../../common/field-text.decorator.js';
import { RequirementDto } from './requirement.dto.js';

export const TITLE_LENGTH = 200;
export const NOTE_LENGTH = 10_000;

/** A new brief. */
@ApiSchema({ name: 'BriefInput' })
export class BriefInputDto {
  @FieldText({ description: 'What the train is for', min: 1, max: TITLE_LENGTH, example: 'Kelp-line winch' })
  title!: string;

  @FieldText({ description: 'Anything worth knowing', max: NOTE_LENGTH, optional: true, multiline: true })
  note?: string;

  /** Checked field by field by the planner, whose messages name the figure and the limit. */
  @ApiProperty({ type: RequirementDto })
  @Type(() => RequirementDto)
  @IsObject({ message: 'requirement must be an object with named fields.' })
  @ValidateNested()
  requirement!: RequirementDto;
}
