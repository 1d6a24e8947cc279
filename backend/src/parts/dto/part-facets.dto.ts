import { ApiProperty, ApiSchema } from '@nestjs/swagger';

/** How many parts share a text value. */
@ApiSchema({ name: 'TextCount' })
export class TextCountDto {
  @ApiProperty({ type: 'string' })
  value!: string;

  @ApiProperty({ type: 'integer' })
  count!: number;
}

/** How many parts share a figure. */
@ApiSchema({ name: 'FigureCount' })
export class FigureCountDto {
  @ApiProperty({ type: 'number' })
  value!: number;

  @ApiProperty({ type: 'integer' })
  count!: number;
}

/** What the library holds, for the choices of the filter bar. */
@ApiSchema({ name: 'Facets' })
export class PartFacetsDto {
  @ApiProperty({ type: [TextCountDto] })
  kinds!: TextCountDto[];

  @ApiProperty({ type: [TextCountDto] })
  standings!: TextCountDto[];

  @ApiProperty({ type: [FigureCountDto], description: 'Modules in mm, smallest first' })
  modules!: FigureCountDto[];

  @ApiProperty({ type: [TextCountDto], description: 'The 200 most used materials, in alphabetical order' })
  materials!: TextCountDto[];
}
