import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { type TrainFigures } from '@stageyard/libs/train-planner';
import { type Train } from '../entities/train.entity.js';
import { TrainFiguresDto } from './train-figures.dto.js';
import { toTrainSummary, TrainSummaryDto } from './train-summary.dto.js';

/** An adopted train with everything computed of it. */
@ApiSchema({ name: 'Train' })
export class TrainDto extends TrainSummaryDto {
  @ApiProperty({ type: 'string' })
  note!: string;

  @ApiProperty({ type: 'string', description: 'Key of the option it was taken from' })
  optionKey!: string;

  @ApiProperty({ type: TrainFiguresDto })
  figures!: TrainFigures;
}

/** @param train with its `owner` and `brief` loaded */
export function toTrainDto(train: Train, figures: TrainFigures): TrainDto {
  return { ...toTrainSummary(train, figures), note: train.note, optionKey: train.optionKey, figures };
}
