import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { FoundBriefDto } from './found-brief.dto.js';
import { FoundPartDto } from './found-part.dto.js';
import { FoundSupplierDto } from './found-supplier.dto.js';
import { FoundTrainDto } from './found-train.dto.js';

/** At most eight of each kind; kinds that the person may not read stay empty. */
@ApiSchema({ name: 'FinderResult' })
export class FinderResultDto {
  @ApiProperty({ type: [FoundPartDto] })
  parts!: FoundPartDto[];

  @ApiProperty({ type: [FoundBriefDto] })
  briefs!: FoundBriefDto[];

  @ApiProperty({ type: [FoundTrainDto] })
  trains!: FoundTrainDto[];

  @ApiProperty({ type: [FoundSupplierDto] })
  suppliers!: FoundSupplierDto[];
}
