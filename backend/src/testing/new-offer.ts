import { type OfferInputDto } from '../offers/dto/offer-input.dto.js';
import { type SupplierInputDto } from '../suppliers/dto/supplier-input.dto.js';

let count = 0;

/** A supplier to add; each call gives another name. */
export function newSupplier(changes: Partial<SupplierInputDto> = {}): SupplierInputDto {
  count += 1;
  return { name: `Supplier ${count}`, currency: 'EUR', leadTimeDays: 14, ...changes };
}

/** A good offer in euros for single pieces; name the part, the supplier and what the test is about. */
export function newOffer(
  changes: Partial<OfferInputDto> & Pick<OfferInputDto, 'partNumber' | 'supplierCode'>,
): OfferInputDto {
  return {
    supplierPartNumber: '',
    breaks: [
      { quantity: 1, unitPrice: 1250 },
      { quantity: 10, unitPrice: 1100 },
    ],
    ...changes,
  };
}
