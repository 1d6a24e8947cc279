import { ApiSchema } from '@nestjs/swagger';
import { TITLE_LENGTH } from '../../briefs/dto/brief-input.dto.js';
import { FieldText } from '../../common/field-text.decorator.js';

/** Adopts an option as a train. */
@ApiSchema({ name: 'TrainInput' })
export class TrainInputDto {
  @FieldText({ description: 'Id of the brief', min: 1, max: 20 })
  briefId!: string;

  @FieldText({ description: 'Id of the search that found the option', min: 1, max: 20 })
  searchId!: string;

  @FieldText({ description: 'Key of the option', min: 1, max: 200, example: '12/50m1+16/64m1' })
  optionKey!: string;

  @FieldText({ description: "The brief's title when left out", min: 1, max: TITLE_LENGTH, optional: true })
  title?: string;
}
