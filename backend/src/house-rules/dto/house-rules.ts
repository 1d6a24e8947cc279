import { ApiProperty } from '@nestjs/swagger';

/** The team's own limits. */
export class HouseRules {
  @ApiProperty({ type: Number, description: 'Transverse.' })
  leastContactRatio!: number;

  @ApiProperty({ type: Number, description: 'Normal, in modules.' })
  leastTipThickness!: number;

  @ApiProperty({ type: Number, description: 'Of case-hardened gears, in modules.' })
  leastTipThicknessHardened!: number;

  @ApiProperty({ type: Number, description: 'In modules.' })
  leastTipClearance!: number;

  @ApiProperty({ type: Number, description: 'A figure this close to its limit is marginal, %.' })
  marginalPercent!: number;

  @ApiProperty({ type: Number, description: 'Torsional, MPa.' })
  shaftStress!: number;

  @ApiProperty({ type: Number, description: 'Between the planes of neighbouring stages, mm.' })
  planeGap!: number;

  @ApiProperty({ type: Number, description: 'Between rotating parts that share a plane, mm.' })
  leastPartGap!: number;

  @ApiProperty({ type: Number })
  meshFriction!: number;

  @ApiProperty({ type: Number, description: 'kg/m³' })
  steelDensity!: number;

  @ApiProperty({ type: Number })
  applicationFactor!: number;

  @ApiProperty({ type: Number, description: 'ms' })
  searchTimeLimitMs!: number;

  @ApiProperty({ type: Number, description: 'ms' })
  briefSearchTimeLimitMs!: number;

  @ApiProperty({ type: Number, description: 'A price stated longer ago than this is too old, days.' })
  priceAgeDays!: number;

  @ApiProperty({ type: String, description: 'Prices in it come first. ISO 4217.' })
  currency!: string;
}
