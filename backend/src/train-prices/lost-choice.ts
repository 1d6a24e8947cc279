import { type PricedNeed } from '@stageyard/libs/bill-of-materials';
import { type PartOffer } from '../offers/offers-finder.service.js';

const MEND = 'Choose another offer, or leave it to the rule.';

/** Says why a person's choice is not used, and what stands in its place. */
export function lostChoiceMessage(
  partNumber: string,
  lost: NonNullable<PricedNeed['lostChoice']>,
  wanted: PartOffer | undefined,
  instead: PartOffer | null,
): string {
  const now = instead
    ? `The rule chose ${instead.supplierName} in its place.`
    : 'No other offer can be used, so the line has no price.';
  return `${whatIsWrong(partNumber, lost, wanted)} ${now} ${MEND}`;
}

/** For a choice whose part stands on no line any more. */
export function idleChoiceMessage(partNumber: string): string {
  return `${partNumber} is no longer on the bill of materials, so the offer chosen for it is not used. Leave it to the rule to forget the choice.`;
}

function whatIsWrong(
  partNumber: string,
  lost: NonNullable<PricedNeed['lostChoice']>,
  wanted: PartOffer | undefined,
): string {
  if (!wanted || lost === 'gone') return `The offer chosen for ${partNumber} is no longer there.`;
  const offer = `The offer of ${wanted.supplierName} chosen for ${partNumber}`;
  switch (lost) {
    case 'closed':
      return `${offer} is closed.`;
    case 'expired':
      return `${offer} ended on ${wanted.validUntil ?? ''}.`;
    case 'not-yet':
      return `${offer} starts on ${wanted.validFrom}.`;
    case 'supplier-closed':
      return `${offer} cannot be used: the supplier is closed.`;
    case 'not-priced':
      return `${offer} comes to more than can be reckoned.`;
  }
}
