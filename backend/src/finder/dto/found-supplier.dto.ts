import { ApiProperty, ApiSchema } from '@nestjs/swagger';

@ApiSchema({ name: 'FoundSupplier' })
export class FoundSupplierDto {
  @ApiProperty({ type: 'string' })
  code!: string;

  @ApiProperty({ type: 'string' })
  name!: string;
}
