import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { SUPPLIER_STANDINGS, type SupplierStanding } from '../../suppliers/supplier-terms.js';

/** The supplier that makes an offer. */
@ApiSchema({ name: 'OfferingSupplier' })
export class OfferingSupplierDto {
  @ApiProperty({ type: 'string', example: 'S-0001' })
  code!: string;

  @ApiProperty({ type: 'string' })
  name!: string;

  @ApiProperty({ enum: SUPPLIER_STANDINGS, enumName: 'SupplierStanding' })
  standing!: SupplierStanding;
}
