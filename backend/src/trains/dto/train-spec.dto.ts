import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { EnvelopeDto } from '../../calc/dto/envelope.dto.js';
import { DIAMETER_BASES, type DiameterBasis } from '../adopted-spec.js';

@ApiSchema({ name: 'SpecGear' })
export class SpecGearDto {
  @ApiProperty({ type: 'integer' })
  teeth!: number;

  @ApiProperty({ type: 'number', description: 'Profile shift coefficient (modules)' })
  profileShift!: number;

  @ApiProperty({ type: 'number', description: 'mm' })
  faceWidth!: number;

  @ApiProperty({
    enum: ['left', 'right'],
    enumName: 'Hand',
    required: false,
    description: 'Helical gears only',
  })
  hand?: 'left' | 'right';

  @ApiProperty({ type: 'number', required: false, description: 'kg/m³; steel when left out' })
  density?: number;

  @ApiProperty({
    type: 'string',
    nullable: true,
    description: 'The stock part that it is; null: made to order',
  })
  partNumber!: string | null;
}

@ApiSchema({ name: 'SpecStage' })
export class SpecStageDto {
  @ApiProperty({ type: 'number', description: 'Normal module (mm)' })
  module!: number;

  @ApiProperty({ type: 'number', description: 'Operating centre distance (mm)' })
  centreDistance!: number;

  @ApiProperty({ type: SpecGearDto })
  pinion!: SpecGearDto;

  @ApiProperty({ type: SpecGearDto })
  wheel!: SpecGearDto;
}

@ApiSchema({ name: 'SpecTarget' })
export class SpecTargetDto {
  @ApiProperty({ type: 'string', description: 'Decimal' })
  ratio!: string;

  @ApiProperty({ oneOf: [{ type: 'string' }, { type: 'number' }], description: 'Per cent' })
  tolerancePercent!: string | number;
}

@ApiSchema({ name: 'SpecShaft' })
export class SpecShaftDto {
  @ApiProperty({ type: 'number', description: 'mm' })
  diameter!: number;

  @ApiProperty({
    enum: DIAMETER_BASES,
    enumName: 'DiameterBasis',
    description:
      'Where the diameter comes from: the torque (raised to the next bearing bore where it fits), a stock bore, the starting figure, or a person',
  })
  basis!: DiameterBasis;
}

/** What a train consists of. */
@ApiSchema({ name: 'TrainSpec' })
export class TrainSpecDto {
  @ApiProperty({ type: 'number' })
  pressureAngleDeg!: number;

  @ApiProperty({ type: 'number' })
  helixAngleDeg!: number;

  @ApiProperty({ type: SpecTargetDto, required: false })
  target?: SpecTargetDto;

  @ApiProperty({ type: 'number' })
  leastContactRatio!: number;

  @ApiProperty({ type: 'number', required: false, description: 'rpm' })
  inputSpeed?: number;

  @ApiProperty({ type: 'number', required: false, description: 'N·m' })
  inputTorque?: number;

  @ApiProperty({ type: 'number', required: false, description: 'N·m' })
  outputTorque?: number;

  @ApiProperty({ type: 'number', required: false })
  applicationFactor?: number;

  @ApiProperty({ type: EnvelopeDto, required: false })
  envelope?: EnvelopeDto;

  @ApiProperty({
    type: 'number',
    required: false,
    description: 'Between the planes of neighbouring stages (mm)',
  })
  gap?: number;

  @ApiProperty({ type: [SpecStageDto] })
  stages!: SpecStageDto[];

  @ApiProperty({ type: [SpecShaftDto], description: 'Shaft 0 is the input; one more than there are stages' })
  shafts!: SpecShaftDto[];
}
