import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { IsObject, ValidateIf, ValidateNested } from 'class-validator';
import { FieldFigure } from '../../common/field-figure.decorator.js';
import { FieldText } from '../../common/field-text.decorator.js';
import { NOTE_LENGTH, TITLE_LENGTH } from './brief-input.dto.js';
import { RequirementDto } from './requirement.dto.js';

/** Changes to a brief; what is left out stays. */
@ApiSchema({ name: 'BriefPatch' })
export class BriefPatchDto {
  @FieldFigure({
    description: 'The version that was seen',
    min: 1,
    max: Number.MAX_SAFE_INTEGER,
    whole: true,
  })
  version!: number;

  @FieldText({ description: 'What the train is for', min: 1, max: TITLE_LENGTH, optional: true })
  title?: string;

  @FieldText({ description: 'Anything worth knowing', max: NOTE_LENGTH, optional: true, multiline: true })
  note?: string;

  @ApiProperty({ type: RequirementDto, required: false, description: 'Replaces the whole requirement' })
  @ValidateIf((patch: BriefPatchDto) => patch.requirement !== undefined)
  @Type(() => RequirementDto)
  @IsObject({ message: 'requirement must be an object with named fields.' })
  @ValidateNested()
  requirement?: RequirementDto;
}
