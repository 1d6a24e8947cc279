import { ApiProperty, ApiSchema } from '@nestjs/swagger';

/** What the gears of an option cost in one currency. */
@ApiSchema({ name: 'OptionCost' })
export class OptionCostDto {
  @ApiProperty({ type: 'string', description: 'ISO 4217' })
  currency!: string;

  @ApiProperty({ type: 'integer', description: 'Minor units' })
  minor!: number;
}

/** Where the gears of one option would come from, at the build quantity. */
@ApiSchema({ name: 'OptionSupply' })
export class OptionSupplyDto {
  @ApiProperty({ type: 'string', description: "The option's key" })
  key!: string;

  @ApiProperty({ type: 'integer', description: 'Gear lines: equal gears count once' })
  gears!: number;

  @ApiProperty({ type: 'integer', description: 'Lines that the library has a gear for' })
  fromStock!: number;

  @ApiProperty({ type: 'integer', description: 'Lines whose whole need lies on the shelf' })
  onShelf!: number;

  @ApiProperty({ type: 'integer', description: 'Lines to be made: the library has no such gear' })
  toMake!: number;

  @ApiProperty({
    type: [OptionCostDto],
    description: 'Of the priced lines, the house currency first; what lies on the shelf is not taken off',
  })
  costs!: OptionCostDto[];

  @ApiProperty({ type: 'integer', description: 'Lines in the costs' })
  priced!: number;

  @ApiProperty({
    type: 'integer',
    description: 'Lines that no cost holds: to be made, or without a valid offer',
  })
  unpriced!: number;

  @ApiProperty({ type: 'integer', nullable: true, description: 'Of the priced lines, where known (days)' })
  longestLeadTimeDays!: number | null;
}

/** Cost and stock of every option of a search. */
@ApiSchema({ name: 'SearchSupply' })
export class SearchSupplyDto {
  @ApiProperty({ type: 'integer', description: 'Builds counted with' })
  quantity!: number;

  @ApiProperty({
    type: [OptionSupplyDto],
    description: 'In the order of the options; empty until the search ended',
  })
  options!: OptionSupplyDto[];
}
