import { ApiProperty, ApiSchema } from '@nestjs/swagger';

const length = (description: string) => ({ type: 'number', description: `${description} (mm)` }) as const;
const degrees = (description: string) =>
  ({ type: 'number', description: `${description} (degrees)` }) as const;
const modules = (description: string) =>
  ({ type: 'number', description: `${description} (modules)` }) as const;

/** Computed figures of one gear, symbols as in ISO 21771. */
@ApiSchema({ name: 'GearGeometry' })
export class GearGeometryDto {
  @ApiProperty(length('Reference diameter d'))
  referenceDiameter!: number;

  @ApiProperty(length('Base diameter d_b'))
  baseDiameter!: number;

  @ApiProperty(length('Tip diameter d_a'))
  tipDiameter!: number;

  @ApiProperty(length('Root diameter d_f, as cut'))
  rootDiameter!: number;

  @ApiProperty(length('Form diameter d_F, where the usable involute begins, as cut'))
  formDiameter!: number;

  @ApiProperty({ type: 'boolean', description: 'Whether the cutter takes away involute near the root' })
  undercut!: boolean;

  @ApiProperty(modules('Least profile shift without undercut x_min'))
  leastShiftWithoutUndercut!: number;

  @ApiProperty(length('Tooth thickness at the tip, normal, nominal'))
  tipThickness!: number;

  @ApiProperty(length('Tooth thickness at the reference circle, normal, nominal'))
  toothThickness!: number;

  @ApiProperty(length('Transverse base pitch p_bt'))
  basePitch!: number;

  @ApiProperty({ type: 'integer', description: 'Teeth spanned by the base tangent length' })
  spanTeeth!: number;

  @ApiProperty(length('Base tangent length W over the spanned teeth, nominal'))
  spanLength!: number;

  @ApiProperty(modules('Generating profile shift x_E, at the mean thickness allowance'))
  effectiveShift!: number;

  @ApiProperty(length('Transverse module'))
  transverseModule!: number;

  @ApiProperty(degrees('Transverse pressure angle'))
  transversePressureAngleDeg!: number;

  @ApiProperty(degrees('Helix angle at the base circle'))
  baseHelixAngleDeg!: number;

  @ApiProperty({ type: 'number', nullable: true, description: 'Axial pitch (mm); null for a spur gear' })
  axialPitch!: number | null;

  @ApiProperty(length('Tooth depth'))
  toothDepth!: number;

  @ApiProperty(length('Chordal tooth thickness, nominal'))
  chordalThickness!: number;

  @ApiProperty(length('Height of that chord below the tip circle'))
  chordalHeight!: number;
}
