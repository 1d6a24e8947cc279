import { isDeepStrictEqual } from 'node:util';
import { type PartSummaryDto, toPartSummaryDto } from './dto/part-summary.dto.js';
import { type Part } from './entities/part.entity.js';

/** Fields that change with every edit and tell nothing. */
const OF_EVERY_EDIT: ReadonlySet<string> = new Set(['id', 'version', 'createdAt', 'updatedAt', 'updatedBy']);

interface PartChange {
  /** Names of the fields that differ. */
  fields: string[];
  before: Partial<PartSummaryDto>;
  after: Partial<PartSummaryDto>;
}

/** What an edit changed, field by field, for the record of changes. */
export function partChange(before: Part, after: Part): PartChange {
  const [old, now] = [toPartSummaryDto(before, null), toPartSummaryDto(after, null)];
  const fields = (Object.keys(now) as (keyof PartSummaryDto)[]).filter(
    (field) => !OF_EVERY_EDIT.has(field) && !isDeepStrictEqual(old[field], now[field]),
  );
  const only = (part: PartSummaryDto): Partial<PartSummaryDto> =>
    Object.fromEntries(fields.map((field) => [field, part[field]]));
  return { fields, before: only(old), after: only(now) };
}
