import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { ArrayMaxSize, IsArray, ValidateIf, ValidateNested } from 'class-validator';
import { FieldFigure } from '../../common/field-figure.decorator.js';
import { FieldText } from '../../common/field-text.decorator.js';
import { BUILD_QUANTITY } from '../../briefs/requirement.js';

/** Most choices in one request; a bill of materials has fewer lines. */
const MOST_CHOICES = 1000;

/** Which offer a part of the train is bought from. */
@ApiSchema({ name: 'OfferChoiceInput' })
export class OfferChoiceInputDto {
  @FieldText({ description: 'A part on the bill of materials', min: 1, max: 60 })
  partNumber!: string;

  @FieldText({ description: 'Id of an offer for it; null: the rule chooses', max: 20, nullable: true })
  offerId?: string | null;
}

/** How a train is bought; what is left out stays. */
@ApiSchema({ name: 'BuyingInput' })
export class BuyingInputDto {
  @FieldFigure({
    description: 'The version that was seen',
    min: 1,
    max: Number.MAX_SAFE_INTEGER,
    whole: true,
  })
  version!: number;

  @FieldFigure({ description: 'Trains built at once', ...BUILD_QUANTITY, whole: true, optional: true })
  buildQuantity?: number;

  @ApiProperty({
    type: [OfferChoiceInputDto],
    required: false,
    description: 'Parts whose offer changes; the others keep theirs',
  })
  @ValidateIf((input: BuyingInputDto) => input.choices !== undefined)
  @IsArray({ message: 'choices must be a list of parts with their offers.' })
  @ArrayMaxSize(MOST_CHOICES, { message: `choices can have at most ${MOST_CHOICES} entries.` })
  @Type(() => OfferChoiceInputDto)
  @ValidateNested({ each: true })
  choices?: OfferChoiceInputDto[];
}
