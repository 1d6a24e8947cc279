import { addDays, checkOfferTerms } from '@stageyard/libs/bill-of-materials';
import { badInput, type FieldIssue } from '../common/errors.js';
import { type Part } from '../parts/entities/part.entity.js';
import { isCountable, unitOf } from '../parts/part-unit.js';
import { type Supplier } from '../suppliers/entities/supplier.entity.js';
import { type OfferInputDto } from './dto/offer-input.dto.js';
import { type OfferContent } from './offer-changes.js';

/** What is known of a part where an offer is made for it. */
export type OfferablePart = Pick<Part, 'id' | 'number' | 'kind' | 'standing' | 'successorNumber'>;

/** A stated offer with every default filled in, not checked yet. @param today ISO 8601 date */
export function contentOf(
  input: Omit<OfferInputDto, 'partNumber' | 'supplierCode'>,
  supplier: Pick<Supplier, 'currency'>,
  today: string,
): OfferContent {
  return {
    supplierPartNumber: input.supplierPartNumber ?? '',
    standing: 'open',
    currency: input.currency ?? supplier.currency,
    per: input.per ?? 1,
    breaks: input.breaks.map(({ quantity, unitPrice }) => ({ quantity, unitPrice })),
    pack: input.pack ?? 1,
    leastQuantity: input.leastQuantity ?? input.breaks[0]?.quantity ?? 1,
    leadTimeDays: input.leadTimeDays ?? null,
    validFrom: input.validFrom ?? today,
    validUntil: input.validUntil ?? null,
    pricedOn: input.pricedOn ?? today,
    source: input.source ?? '',
    note: input.note ?? '',
  };
}

/**
 * Checks the terms of an offer against what they are, what the part is counted in, and the calendar.
 * @param today ISO 8601 date
 * @throws InputError or ProblemError 400 listing every field at fault
 */
export function checkContent(
  content: OfferContent,
  part: Pick<Part, 'kind' | 'number'>,
  today: string,
): void {
  checkOfferTerms(content);
  const issues = [...brokenPieces(content, part), ...statedLater(content, today)];
  if (issues.length > 0) throw badInput(issues);
}

/** A slip such as 2062 would keep a price from ever growing too old. A day is granted to people ahead of the server. */
function statedLater({ pricedOn }: OfferContent, today: string): FieldIssue[] {
  if (pricedOn <= addDays(today, 1)) return [];
  const message = `The price cannot have been stated on ${pricedOn}: today is ${today}. Give the day of the quotation; a price that starts later has a first day of its own.`;
  return [{ field: 'pricedOn', value: pricedOn, limit: today, message }];
}

function brokenPieces(content: OfferContent, part: Pick<Part, 'kind' | 'number'>): FieldIssue[] {
  const unit = unitOf(part.kind);
  // The terms hold thousandths of a litre to their rule already.
  if (unit !== 'pcs') return [];
  const quantities: [field: string, quantity: number][] = [
    ...content.breaks.map(({ quantity }, index): [string, number] => [`breaks.${index}.quantity`, quantity]),
    ['pack', content.pack],
    // Where it was taken from the first break, that one is named alone.
    ...(content.leastQuantity === content.breaks[0]?.quantity
      ? []
      : [['leastQuantity', content.leastQuantity] as [string, number]]),
  ];
  return quantities
    .filter(([, quantity]) => !isCountable(quantity, unit))
    .map(([field, value]) => {
      const message = `${part.number} is counted in pieces; ${value} is not a whole number of them.`;
      return { field, value, message };
    });
}

/** Why this supplier cannot offer this part any more; empty when it can. */
export function closedReasons(part: OfferablePart, supplier: Supplier): FieldIssue[] {
  const issues: FieldIssue[] = [];
  if (part.standing === 'withdrawn') {
    const instead = part.successorNumber
      ? ` Make the offer for ${part.successorNumber}, which replaces it.`
      : '';
    const message = `${part.number} is withdrawn, so it gets no new offers.${instead || ' Clear the part again first.'}`;
    issues.push({ field: 'partNumber', value: part.number, message });
  }
  if (supplier.standing === 'closed') {
    const message = `${supplier.code} “${supplier.name}” is closed, so it gets no new offers. Open the supplier again first.`;
    issues.push({ field: 'supplierCode', value: supplier.code, message });
  }
  return issues;
}
