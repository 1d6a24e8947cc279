import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { ArrayMaxSize, IsArray, ValidateNested } from 'class-validator';
import { FieldChoice } from '../../../common/field-choice.decorator.js';
import { FieldFigure } from '../../../common/field-figure.decorator.js';
import { FieldText } from '../../../common/field-text.decorator.js';
import { EXTRA_LINE_UNITS, type ExtraLine } from '../../bom-edits.js';

/** Most lines that people add to one bill of materials. */
export const MOST_EXTRA_LINES = 1000;
/** Greatest quantity of an added line. */
export const MOST_QUANTITY = 1_000_000;
export const DESCRIPTION_LENGTH = 200;
export const LINE_NOTE_LENGTH = 500;

/** A line that people add to the bill of materials. */
@ApiSchema({ name: 'ExtraLineInput' })
export class ExtraLineInputDto {
  @FieldText({
    description: 'Of a line that stands already; null or left out: a new line',
    max: 40,
    nullable: true,
  })
  id?: string | null;

  @FieldText({ description: 'A cleared part; null: something without a number yet', max: 60, nullable: true })
  partNumber?: string | null;

  @FieldText({
    description: 'What it is; may be blank where a part is named',
    max: DESCRIPTION_LENGTH,
    optional: true,
  })
  description: string = '';

  @FieldFigure({
    description: 'At most three decimals; pieces are whole',
    min: 0,
    above: true,
    max: MOST_QUANTITY,
  })
  quantity!: number;

  @FieldChoice({
    description: 'That of the part, where one is named',
    values: EXTRA_LINE_UNITS,
    optional: true,
    default: 'pcs',
    enumName: 'LineUnit',
  })
  unit?: ExtraLine['unit'];

  @FieldText({ description: 'Anything worth knowing', max: LINE_NOTE_LENGTH, optional: true })
  note: string = '';
}

/** All added lines of a train; lines that are left out are taken away. */
@ApiSchema({ name: 'ExtraLinesInput' })
export class ExtraLinesInputDto {
  @FieldFigure({
    description: 'The version of the train that was seen',
    min: 1,
    max: Number.MAX_SAFE_INTEGER,
    whole: true,
  })
  version!: number;

  @ApiProperty({ type: [ExtraLineInputDto], maxItems: MOST_EXTRA_LINES })
  @IsArray({ message: 'lines must be a list.' })
  @ArrayMaxSize(MOST_EXTRA_LINES, {
    message: `A bill of materials takes at most ${MOST_EXTRA_LINES.toLocaleString('en-GB')} added lines.`,
  })
  @Type(() => ExtraLineInputDto)
  @ValidateNested({ each: true })
  lines!: ExtraLineInputDto[];
}
