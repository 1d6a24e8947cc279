import { badInput, type FieldIssue } from '../common/errors.js';
import { type Supplier } from '../suppliers/entities/supplier.entity.js';
import { type OfferInputDto } from './dto/offer-input.dto.js';
import { checkContent, closedReasons, contentOf, type OfferablePart } from './offer-content.js';
import { type NewOffer } from './offer-writer.js';

/**
 * An input with the part and the supplier it names, checked.
 * @throws ProblemError or InputError listing the fields at fault
 */
export function resolvedOffer(
  input: OfferInputDto,
  part: OfferablePart | null | undefined,
  supplier: Supplier | null | undefined,
  today: string,
): NewOffer {
  const unknown: FieldIssue[] = [];
  if (!part) {
    const message = `There is no part “${input.partNumber}”. Check the number, or add the part first.`;
    unknown.push({ field: 'partNumber', value: input.partNumber, message });
  }
  if (!supplier) {
    const message = `There is no supplier “${input.supplierCode}”. Check the code, or add the supplier first.`;
    unknown.push({ field: 'supplierCode', value: input.supplierCode, message });
  }
  if (!part || !supplier) throw badInput(unknown);
  const closed = closedReasons(part, supplier);
  if (closed.length > 0) throw badInput(closed);
  const content = contentOf(input, supplier, today);
  checkContent(content, part, today);
  return { part, supplier, content };
}
