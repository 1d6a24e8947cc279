import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { IsBoolean } from 'class-validator';
import { FieldFigure } from '../../../common/field-figure.decorator.js';
import { FieldPastedText } from '../../../common/field-pasted-text.decorator.js';
import { FieldText } from '../../../common/field-text.decorator.js';

/** Rows as a spreadsheet copies them. */
@ApiSchema({ name: 'BomPasteInput' })
export class BomPasteInputDto {
  @FieldPastedText(
    'Tab-separated rows: find number, part number, quantity, unit, description, note; a head row may name the columns in any order',
  )
  text!: string;
}

/** The pasted rows once more, with what the preview answered. */
@ApiSchema({ name: 'BomPasteBookInput' })
export class BomPasteBookInputDto extends BomPasteInputDto {
  @FieldText({ description: 'From the preview', min: 1, max: 100 })
  token!: string;

  @FieldFigure({
    description: 'The version of the train, from the preview',
    min: 1,
    max: Number.MAX_SAFE_INTEGER,
    whole: true,
  })
  version!: number;

  @ApiProperty({ type: 'boolean', description: 'Books the rest; otherwise one wrong row refuses them all' })
  @IsBoolean({ message: 'leaveOutWrong must be true or false.' })
  leaveOutWrong!: boolean;
}
