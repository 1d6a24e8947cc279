import { ApiSchema } from '@nestjs/swagger';
import { PageOf } from '../../common/list-query.js';
import { PartSummaryDto } from './part-summary.dto.js';

/** One page of the library. */
@ApiSchema({ name: 'PartPage' })
export class PartPageDto extends PageOf(PartSummaryDto) {}
