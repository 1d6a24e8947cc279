import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { IsBoolean } from 'class-validator';
import { FieldFigure } from '../../../common/field-figure.decorator.js';
import { FieldText } from '../../../common/field-text.decorator.js';

/** Longest key of a line, characters: a kind and a description. */
export const LINE_KEY_LENGTH = 400;

/** Another part for a line of the bill of materials. */
@ApiSchema({ name: 'SwapInput' })
export class SwapInputDto {
  @FieldFigure({
    description: 'The version of the train that was seen',
    min: 1,
    max: Number.MAX_SAFE_INTEGER,
    whole: true,
  })
  version!: number;

  @FieldText({ description: 'Key of the line', min: 1, max: LINE_KEY_LENGTH })
  key!: string;

  @FieldText({ description: 'The part to take; null puts the kit’s own back', max: 60, nullable: true })
  partNumber?: string | null;

  @ApiProperty({ type: 'boolean', description: 'Only says what would change' })
  @IsBoolean({ message: 'dryRun must be true or false.' })
  dryRun!: boolean;
}
