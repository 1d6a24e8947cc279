import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { type TrainFigures } from '@stageyard/libs/train-planner';
import { DEFAULT_BUILD_QUANTITY } from '../../briefs/requirement.js';
import { type Train } from '../entities/train.entity.js';
import { TrainFiguresDto } from './train-figures.dto.js';
import { toTrainSummary, TrainSummaryDto } from './train-summary.dto.js';

/** An offer that a person chose for a part, instead of the one that the rule would. */
@ApiSchema({ name: 'OfferChoice' })
export class OfferChoiceDto {
  @ApiProperty({ type: 'string' })
  partNumber!: string;

  @ApiProperty({ type: 'string', description: 'Id of the offer' })
  offerId!: string;
}

/** An adopted train with everything computed of it. */
@ApiSchema({ name: 'Train' })
export class TrainDto extends TrainSummaryDto {
  @ApiProperty({ type: 'string' })
  note!: string;

  @ApiProperty({ type: 'string', description: 'Key of the option it was taken from' })
  optionKey!: string;

  @ApiProperty({ type: 'integer', description: 'Trains built at once' })
  buildQuantity!: number;

  @ApiProperty({
    type: [OfferChoiceDto],
    description: 'Parts whose offer a person chose; empty for people who may not see prices',
  })
  offerChoices!: OfferChoiceDto[];

  @ApiProperty({ type: TrainFiguresDto })
  figures!: TrainFigures;
}

/** @param train with its `owner` and `brief` loaded */
export function toTrainDto(train: Train, figures: TrainFigures): TrainDto {
  const choices = Object.entries(train.offerChoices ?? {});
  return {
    ...toTrainSummary(train, figures),
    note: train.note,
    optionKey: train.optionKey,
    buildQuantity: train.buildQuantity ?? DEFAULT_BUILD_QUANTITY,
    offerChoices: choices.map(([partNumber, offerId]) => ({ partNumber, offerId: String(offerId) })),
    figures,
  };
}
