import {
  neededQuantity,
  priceAge,
  type PricedNeed,
  type PricedOffer,
  priceNeed,
  totalsByCurrency,
} from '@stageyard/libs/bill-of-materials';
import { HOUSE_RULES } from '../house-rules/house-rules.js';
import { type Preference } from '../offers/offer-terms.js';
import { type PartOffer } from '../offers/offers-finder.service.js';
import { type BomLineDto } from '../trains/dto/bom.dto.js';
import { type LinePriceDto } from './dto/line-price.dto.js';
import {
  type LostChoiceDto,
  type NoPriceReason,
  type TrainPriceLineDto,
  type TrainPricesDto,
} from './dto/train-prices.dto.js';
import { idleChoiceMessage, lostChoiceMessage } from './lost-choice.js';

/** What prices follow from beside the lines. Maps are by part number. */
export interface PriceBasis {
  buildQuantity: number;
  /** The day that offers are held against, ISO 8601 date. */
  on: string;
  prefer: Preference;
  offers: ReadonlyMap<string, readonly PartOffer[]>;
  levels: ReadonlyMap<string, { total: number }>;
  /** Offer ids that people chose. */
  choices: Readonly<Record<string, number>>;
}

type Line = Pick<BomLineDto, 'key' | 'findNumber' | 'partNumber' | 'quantity' | 'unit' | 'supply'>;

interface PricedLine {
  line: TrainPriceLineDto;
  lost: LostChoiceDto | null;
}

/** Prices every line of a bill of materials at a build quantity and adds up what can be added. */
export function priceTrain(lines: readonly Line[], basis: PriceBasis): TrainPricesDto {
  const all = lines.map((line) => priceLine(line, basis));
  const priced = all.map(({ line }) => line);
  const prices = priced.flatMap(({ price }) => price ?? []);
  const amounts = prices.map(({ lineTotal, currency }) => ({ minor: lineTotal, currency }));
  const leadTimes = prices.flatMap(({ leadTimeDays }) => leadTimeDays ?? []);
  return {
    buildQuantity: basis.buildQuantity,
    on: basis.on,
    lines: priced,
    totals: totalsByCurrency(amounts, HOUSE_RULES.currency).map(({ total, amounts: count }) => ({
      ...total,
      lines: count,
    })),
    unpriced: priced.flatMap(({ findNumber, key, reason }) =>
      reason === null || reason === 'made' ? [] : [{ findNumber, key, reason }],
    ),
    lostChoices: [...all.flatMap(({ lost }) => lost ?? []), ...idleChoices(lines, basis)],
    oldestPricedOn: prices.map(({ pricedOn }) => pricedOn).sort()[0] ?? null,
    tooOld: prices.filter(({ tooOld }) => tooOld).length,
    longestLeadTimeDays: leadTimes.length > 0 ? Math.max(...leadTimes) : null,
    shelf: shelfCover(priced),
  };
}

function priceLine(line: Line, basis: PriceBasis): PricedLine {
  const { key, findNumber, partNumber, unit } = line;
  const needed = neededQuantity(line.quantity, basis.buildQuantity);
  const common = {
    key,
    findNumber,
    partNumber,
    needed: needed ?? line.quantity * basis.buildQuantity,
    unit,
    onShelf: partNumber === null ? null : (basis.levels.get(partNumber)?.total ?? null),
  };
  const candidates = partNumber === null ? [] : (basis.offers.get(partNumber) ?? []);
  const chosenId = partNumber === null ? undefined : basis.choices[partNumber];
  if (needed === null || (candidates.length === 0 && chosenId === undefined)) {
    const reason = noOfferReason(line, candidates.length);
    return { line: { ...common, price: null, reason, otherOffers: 0 }, lost: null };
  }
  const { on, prefer } = basis;
  const need = { needed, candidates, chosenId: chosenId === undefined ? null : String(chosenId) };
  const priced = priceNeed(need, { on, prefer, currency: HOUSE_RULES.currency });
  return {
    line: {
      ...common,
      price: linePrice(priced, on),
      reason: priced.reason && noOfferReason(line, candidates.length),
      otherOffers: priced.otherOffers,
    },
    lost: lostChoice(line, need.chosenId, candidates, priced),
  };
}

function noOfferReason({ partNumber, supply }: Line, offers: number): NoPriceReason {
  if (offers > 0) return 'none-valid';
  if (supply === 'made') return 'made';
  return partNumber === null ? 'no-part' : 'no-offers';
}

function linePrice({ offer, chosenBy }: PricedNeed<PartOffer>, on: string): LinePriceDto | null {
  if (!offer?.price || !chosenBy) return null;
  const { price } = offer;
  const ageDays = priceAge(offer.pricedOn, on);
  const { cheaperAt } = price;
  return {
    offerId: offer.id,
    supplier: { code: offer.supplierCode, name: offer.supplierName },
    supplierPartNumber: offer.supplierPartNumber,
    currency: offer.currency,
    per: offer.per,
    unitPrice: price.unitPrice,
    orderQuantity: price.orderQuantity,
    lineTotal: price.lineTotal.minor,
    surplus: price.surplus,
    cheaperAt: cheaperAt && {
      orderQuantity: cheaperAt.orderQuantity,
      lineTotal: cheaperAt.lineTotal.minor,
      saves: cheaperAt.saves.minor,
    },
    leadTimeDays: offer.arrivalDays,
    pricedOn: offer.pricedOn,
    ageDays,
    tooOld: ageDays > HOUSE_RULES.priceAgeDays,
    validUntil: offer.validUntil,
    chosenBy,
  };
}

function lostChoice(
  { key, partNumber }: Line,
  offerId: string | null,
  candidates: readonly PartOffer[],
  { lostChoice: lost, offer }: { lostChoice: PricedNeed['lostChoice']; offer: PricedOffer<PartOffer> | null },
): LostChoiceDto | null {
  if (lost === null || partNumber === null || offerId === null) return null;
  const wanted = candidates.find(({ id }) => id === offerId);
  return { partNumber, offerId, key, message: lostChoiceMessage(partNumber, lost, wanted, offer) };
}

/** Choices for parts that were on the train once. */
function idleChoices(lines: readonly Line[], { choices }: PriceBasis): LostChoiceDto[] {
  const present = new Set(lines.map(({ partNumber }) => partNumber));
  return Object.entries(choices)
    .filter(([partNumber]) => !present.has(partNumber))
    .map(([partNumber, offerId]) => ({
      partNumber,
      offerId: String(offerId),
      key: null,
      message: idleChoiceMessage(partNumber),
    }));
}

/** A shelf covers a line when it covers every line of the same part together. */
function shelfCover(lines: readonly TrainPriceLineDto[]): TrainPricesDto['shelf'] {
  const ofLibrary = lines.filter(({ partNumber }) => partNumber !== null);
  const needs = new Map<string | null, number>();
  for (const { partNumber, needed } of ofLibrary) {
    needs.set(partNumber, (needs.get(partNumber) ?? 0) + needed);
  }
  const covered = ofLibrary.filter(
    ({ partNumber, onShelf }) => (onShelf ?? 0) >= (needs.get(partNumber) ?? 0),
  );
  return { covered: covered.length, lines: ofLibrary.length };
}
