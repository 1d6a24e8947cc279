import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { type OptionStage, type TrainOption } from '@stageyard/libs/train-planner';
import { BoxDto } from './box.dto.js';

@ApiSchema({ name: 'TrainStage' })
export class TrainStageDto implements OptionStage {
  @ApiProperty({ type: 'integer' })
  pinionTeeth!: number;

  @ApiProperty({ type: 'integer' })
  wheelTeeth!: number;

  @ApiProperty({ type: 'number', description: 'Normal module (mm)' })
  module!: number;

  @ApiProperty({ type: 'number', description: 'Face width (mm)' })
  faceWidth!: number;

  @ApiProperty({ type: 'number', description: 'Profile shift coefficient of the pinion (modules)' })
  pinionShift!: number;

  @ApiProperty({ type: 'number', description: 'Profile shift coefficient of the wheel (modules)' })
  wheelShift!: number;

  @ApiProperty({ type: 'number', description: 'mm' })
  pinionTipDiameter!: number;

  @ApiProperty({ type: 'number', description: 'mm' })
  wheelTipDiameter!: number;

  @ApiProperty({ type: 'number', description: 'Operating centre distance, allowance included (mm)' })
  centreDistance!: number;

  @ApiProperty({ type: 'number', description: 'Contact ratio at the operating distance' })
  contactRatio!: number;

  @ApiProperty({
    type: 'number',
    nullable: true,
    description: 'Contact ratio at the worse end of the distance band; null while no grade is given',
  })
  contactRatioWorst!: number | null;
}

@ApiSchema({ name: 'ExactRatio' })
export class ExactRatioDto {
  @ApiProperty({ type: 'string', description: 'Digits, lowest terms' })
  numerator!: string;

  @ApiProperty({ type: 'string', description: 'Digits, lowest terms' })
  denominator!: string;

  @ApiProperty({ type: 'number' })
  value!: number;

  @ApiProperty({
    type: 'number',
    nullable: true,
    description: 'Signed: (value / target − 1) × 100; null without a target',
  })
  errorPercent!: number | null;
}

/** An option is always held against a target. */
@ApiSchema({ name: 'OptionRatio' })
export class OptionRatioDto extends ExactRatioDto {
  @ApiProperty({ type: 'number', nullable: false, description: 'Signed: (value / target − 1) × 100' })
  declare errorPercent: number;
}

/** One train found for a brief. */
@ApiSchema({ name: 'TrainOption' })
export class TrainOptionDto implements Omit<TrainOption, 'ratio'> {
  @ApiProperty({
    type: 'string',
    description: 'The same train always has the same key',
    example: '12/50m1+16/64m1',
  })
  key!: string;

  @ApiProperty({ type: [TrainStageDto] })
  stages!: TrainStageDto[];

  @ApiProperty({ type: OptionRatioDto })
  ratio!: OptionRatioDto;

  @ApiProperty({ type: 'number', description: 'Sum of the operating centre distances (mm)' })
  centreDistanceSum!: number;

  @ApiProperty({ type: 'number', description: 'kg, solid discs' })
  mass!: number;

  @ApiProperty({ type: BoxDto })
  box!: BoxDto;

  @ApiProperty({ type: 'number', description: 'At the output, input held (arcmin)' })
  backlashArcmin!: number;

  @ApiProperty({ type: 'number', nullable: true, description: 'Not computed yet: null' })
  lossPercent!: number | null;

  @ApiProperty({ type: 'number', nullable: true, description: 'Not computed without offers: null' })
  cost!: number | null;

  @ApiProperty({ type: 'number', nullable: true, description: 'Not computed yet: null' })
  newParts!: number | null;
}
