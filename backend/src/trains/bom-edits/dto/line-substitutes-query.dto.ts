import { ApiSchema } from '@nestjs/swagger';
import { FieldText } from '../../../common/field-text.decorator.js';
import { SubstitutesQueryDto } from '../../../substitutes/dto/substitutes-query.dto.js';
import { LINE_KEY_LENGTH } from './swap-input.dto.js';

/** Which line, and how many are needed: what all trains built at once need when left out. */
@ApiSchema({ name: 'LineSubstitutesQuery' })
export class LineSubstitutesQueryDto extends SubstitutesQueryDto {
  @FieldText({ description: 'Key of the line', min: 1, max: LINE_KEY_LENGTH })
  key!: string;
}
