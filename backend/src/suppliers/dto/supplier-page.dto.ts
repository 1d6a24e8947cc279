import { ApiSchema } from '@nestjs/swagger';
import { PageOf } from '../../common/list-query.js';
import { SupplierDto } from './supplier.dto.js';

/** One page of the suppliers. */
@ApiSchema({ name: 'SupplierPage' })
export class SupplierPageDto extends PageOf(SupplierDto) {}
