import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { type TrainFigures } from '@stageyard/libs/train-planner';
import { FindingDto } from '../../calc/dto/finding.dto.js';
import { MeshGeometryDto } from '../../calc/dto/mesh-geometry.dto.js';
import { BoxDto } from '../../option-searches/dto/box.dto.js';
import { ExactRatioDto } from '../../option-searches/dto/train-option.dto.js';

/** A finding about a train; `stage` is 0 for the first, left out when it concerns the whole. */
@ApiSchema({ name: 'TrainFinding' })
export class TrainFindingDto extends FindingDto {
  @ApiProperty({ type: 'integer', required: false })
  stage?: number;
}

@ApiSchema({ name: 'TrainShaft' })
export class TrainShaftDto {
  @ApiProperty({ type: 'integer', description: '0 is the input' })
  index!: number;

  @ApiProperty({ type: 'number', description: 'Axis, seen along the shafts (mm)' })
  x!: number;

  @ApiProperty({ type: 'number', description: 'Axis, seen along the shafts (mm)' })
  y!: number;

  @ApiProperty({ type: 'number', description: 'Where the shaft begins along the axis (mm)' })
  z1!: number;

  @ApiProperty({ type: 'number', description: 'Where the shaft ends along the axis (mm)' })
  z2!: number;

  @ApiProperty({ type: 'number', nullable: true, description: 'rpm' })
  speed!: number | null;

  @ApiProperty({ type: 'number', nullable: true, description: 'N·m' })
  torque!: number | null;

  @ApiProperty({ type: 'number', nullable: true, description: 'kW' })
  power!: number | null;

  @ApiProperty({ type: 'integer', enum: [1, -1], description: '1 turns like the input' })
  direction!: number;

  @ApiProperty({ type: 'number', nullable: true, description: 'Least diameter for torsion (mm)' })
  leastDiameter!: number | null;
}

/** One requirement held against the train. */
@ApiSchema({ name: 'TrainCheck' })
export class TrainCheckDto {
  @ApiProperty({ type: 'string' })
  code!: string;

  @ApiProperty({ type: 'string' })
  label!: string;

  @ApiProperty({ type: 'number', nullable: true })
  value!: number | null;

  @ApiProperty({ type: 'number', nullable: true })
  limit!: number | null;

  @ApiProperty({ type: 'string' })
  unit!: string;

  @ApiProperty({ enum: ['passes', 'marginal', 'fails'], enumName: 'Verdict' })
  verdict!: 'passes' | 'marginal' | 'fails';

  @ApiProperty({ type: 'integer', required: false })
  stage?: number;

  @ApiProperty({ type: 'string' })
  message!: string;
}

/** Everything computed of a train. */
@ApiSchema({ name: 'TrainFigures' })
export class TrainFiguresDto implements Omit<TrainFigures, 'ratio' | 'shafts' | 'meshes'> {
  @ApiProperty({ type: ExactRatioDto })
  ratio!: ExactRatioDto;

  @ApiProperty({ type: 'number', description: 'mm' })
  centreDistanceSum!: number;

  @ApiProperty({ type: 'number', description: 'kg, solid discs' })
  mass!: number;

  @ApiProperty({ type: BoxDto })
  box!: BoxDto;

  @ApiProperty({ type: 'number', description: 'At the output, input held (arcmin)' })
  backlashArcmin!: number;

  @ApiProperty({ type: 'string', enum: ['same', 'opposite'] })
  direction!: 'same' | 'opposite';

  @ApiProperty({ type: [TrainShaftDto] })
  shafts!: TrainShaftDto[];

  @ApiProperty({ type: [MeshGeometryDto] })
  meshes!: MeshGeometryDto[];

  @ApiProperty({ type: [TrainFindingDto] })
  findings!: TrainFindingDto[];

  @ApiProperty({ type: [TrainCheckDto] })
  checks!: TrainCheckDto[];
}
