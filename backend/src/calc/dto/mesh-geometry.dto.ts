import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { FindingDto } from './finding.dto.js';
import { MeshGearsDto } from './mesh-gears.dto.js';
import { SpecificSlidingDto } from './specific-sliding.dto.js';

const figure = (description: string) => ({ type: 'number', description }) as const;
const maybe = (description: string) => ({ type: 'number', nullable: true, description }) as const;

/** Computed figures of one pair at its operating centre distance, symbols as in ISO 21771. */
@ApiSchema({ name: 'MeshGeometry' })
export class MeshGeometryDto {
  @ApiProperty(figure('Wheel teeth / pinion teeth'))
  ratio!: number;

  @ApiProperty(figure('Centre distance without backlash (mm)'))
  zeroBacklashCentreDistance!: number;

  @ApiProperty(figure('Reference centre distance (mm)'))
  referenceCentreDistance!: number;

  @ApiProperty(figure('Operating centre distance (mm)'))
  centreDistance!: number;

  @ApiProperty(figure('Operating transverse pressure angle (degrees)'))
  operatingPressureAngleDeg!: number;

  @ApiProperty(figure('Length T1–T2 of the common tangent of the base circles (mm)'))
  tangentPointDistance!: number;

  @ApiProperty(figure('A–C on the path of contact (mm); may be negative'))
  approachLength!: number;

  @ApiProperty(figure('C–E on the path of contact (mm); may be negative'))
  recessLength!: number;

  @ApiProperty(figure('Length of the path of contact (mm)'))
  pathOfContact!: number;

  @ApiProperty(figure('Transverse base pitch (mm)'))
  basePitch!: number;

  @ApiProperty(figure('Transverse contact ratio, undercut included; 0 without contact'))
  contactRatio!: number;

  @ApiProperty(figure('Textbook contact ratio from the tip circles alone'))
  contactRatioIgnoringUndercut!: number;

  @ApiProperty({
    type: 'string',
    nullable: true,
    description: 'Why the textbook value does not hold; null where it does',
  })
  contactRatioLimitedBy!: string | null;

  @ApiProperty(maybe('Overlap ratio; null for a helical pair without a face width'))
  overlapRatio!: number | null;

  @ApiProperty(maybe('Total contact ratio; null where the overlap ratio is'))
  totalContactRatio!: number | null;

  @ApiProperty(figure('Normal backlash (mm); negative means the teeth jam'))
  normalBacklash!: number;

  @ApiProperty(figure('Circumferential backlash at the operating pitch circles (mm)'))
  circumferentialBacklash!: number;

  @ApiProperty(figure('Angular backlash at the wheel, the pinion held (arcmin)'))
  angularBacklashArcmin!: number;

  @ApiProperty(figure("Pinion's tip clearance a − r_a1 − r_f2 (mm)"))
  tipClearancePinion!: number;

  @ApiProperty(figure("Wheel's tip clearance a − r_a2 − r_f1 (mm)"))
  tipClearanceWheel!: number;

  @ApiProperty(maybe('Largest allowance at which the contact ratio is still 1 (modules)'))
  allowanceAtContactRatioOne!: number | null;

  @ApiProperty(maybe('Largest allowance at which the contact ratio is still the least allowed (modules)'))
  allowanceAtLeastContactRatio!: number | null;

  @ApiProperty({
    type: SpecificSlidingDto,
    nullable: true,
    description: 'Specific sliding; null while it is not computed',
  })
  specificSliding!: SpecificSlidingDto | null;

  @ApiProperty(maybe('Mesh loss factor; null while it is not computed'))
  meshLossFactor!: number | null;

  @ApiProperty({ type: MeshGearsDto })
  gear!: MeshGearsDto;

  @ApiProperty({ type: [FindingDto] })
  findings!: FindingDto[];
}
