import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { ArrayMaxSize, IsArray, ValidateIf, ValidateNested } from 'class-validator';
import { NOTE_LENGTH, TITLE_LENGTH } from '../../briefs/dto/brief-input.dto.js';
import { FieldChoice } from '../../common/field-choice.decorator.js';
import { FieldFigure } from '../../common/field-figure.decorator.js';
import { FieldText } from '../../common/field-text.decorator.js';

/** What is chosen for one gear; what is left out stays. */
@ApiSchema({ name: 'GearChoice' })
export class GearChoiceDto {
  @FieldText({
    description: 'A cleared stock gear with the same data; null: made to order',
    max: 60,
    nullable: true,
  })
  partNumber?: string | null;

  @FieldChoice({
    description: 'Helical gears only',
    values: ['left', 'right'],
    optional: true,
    enumName: 'Hand',
  })
  hand?: 'left' | 'right';
}

@ApiSchema({ name: 'StageChoice' })
export class StageChoiceDto {
  @ApiProperty({ type: GearChoiceDto, required: false })
  @ValidateIf((choice: StageChoiceDto) => choice.pinion !== undefined)
  @Type(() => GearChoiceDto)
  @ValidateNested()
  pinion?: GearChoiceDto;

  @ApiProperty({ type: GearChoiceDto, required: false })
  @ValidateIf((choice: StageChoiceDto) => choice.wheel !== undefined)
  @Type(() => GearChoiceDto)
  @ValidateNested()
  wheel?: GearChoiceDto;
}

/** Most stages that a train has. */
const MOST_STAGES = 3;

/** Changes to a train; what is left out stays. */
@ApiSchema({ name: 'TrainPatch' })
export class TrainPatchDto {
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

  @ApiProperty({ type: [StageChoiceDto], required: false, description: 'One a stage, in order' })
  @ValidateIf((patch: TrainPatchDto) => patch.stages !== undefined)
  @IsArray({ message: 'stages must be a list with one entry a stage.' })
  @ArrayMaxSize(MOST_STAGES, { message: `stages can have at most ${MOST_STAGES} entries.` })
  @Type(() => StageChoiceDto)
  @ValidateNested({ each: true })
  stages?: StageChoiceDto[];

  /** Bounds depend on the gears and are checked with them. */
  @ApiProperty({
    type: 'array',
    items: { type: 'number', nullable: true },
    required: false,
    description: 'One a shaft, in order (mm); null leaves that shaft as it is',
  })
  @ValidateIf((patch: TrainPatchDto) => patch.shaftDiameters !== undefined)
  @IsArray({ message: 'shaftDiameters must be a list with one figure a shaft.' })
  @ArrayMaxSize(MOST_STAGES + 1, { message: `shaftDiameters can have at most ${MOST_STAGES + 1} figures.` })
  shaftDiameters?: (number | null)[];
}
