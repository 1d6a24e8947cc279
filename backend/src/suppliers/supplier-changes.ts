import { isDeepStrictEqual } from 'node:util';
import { NO_OFFERS, type SupplierDto, toSupplierDto } from './dto/supplier.dto.js';
import { type Supplier } from './entities/supplier.entity.js';

/** Fields that change with every edit, or by themselves, and tell nothing. */
const OF_EVERY_EDIT: ReadonlySet<string> = new Set([
  'id',
  'offers',
  'version',
  'createdAt',
  'updatedAt',
  'updatedBy',
]);

interface SupplierChange {
  /** Names of the fields that differ. */
  fields: string[];
  before: Partial<SupplierDto>;
  after: Partial<SupplierDto>;
}

/** What an edit changed, field by field, for the record of changes. */
export function supplierChange(before: Partial<Supplier>, after: Supplier): SupplierChange {
  const [old, now] = [toSupplierDto(before as Supplier, NO_OFFERS), toSupplierDto(after, NO_OFFERS)];
  const fields = (Object.keys(now) as (keyof SupplierDto)[]).filter(
    (field) => !OF_EVERY_EDIT.has(field) && !isDeepStrictEqual(old[field], now[field]),
  );
  const only = (supplier: SupplierDto): Partial<SupplierDto> =>
    Object.fromEntries(fields.map((field) => [field, supplier[field]]));
  return { fields, before: only(old), after: only(now) };
}
