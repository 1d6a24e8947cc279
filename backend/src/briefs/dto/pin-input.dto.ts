import { ApiSchema } from '@nestjs/swagger';
import { FieldText } from '../../common/field-text.decorator.js';

/** Where the option to pin was found. */
@ApiSchema({ name: 'PinInput' })
export class PinInputDto {
  @FieldText({ description: 'Id of a search of this brief', min: 1, max: 20 })
  searchId!: string;
}
