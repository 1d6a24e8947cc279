import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { type FitPlace, type SubstitutePart } from '@stageyard/libs/bill-of-materials';
import { Repository } from 'typeorm';
import { type SignedInUser } from '../auth/signed-in-user.js';
import { badInput, notFound } from '../common/errors.js';
import { HOUSE_RULES } from '../house-rules/house-rules.js';
import { toPartSummaryDto } from '../parts/dto/part-summary.dto.js';
import { Part } from '../parts/entities/part.entity.js';
import { isCountable, unitOf } from '../parts/part-unit.js';
import { type SubstituteDto, type SubstituteOfferDto, type SubstitutesDto } from './dto/substitutes.dto.js';
import { toFitPart } from './fit-part.js';
import { FittingParts, type FittingPart } from './fitting-parts.service.js';
import { bySuitability } from './rank-substitutes.js';
import { type PartSupplyFigures, SupplyOfParts } from './supply-of-parts.service.js';

/** Most substitutes that one answer lists. */
const MOST_LISTED = 50;

type Viewer = Pick<SignedInUser, 'permissions'>;

/** Parts that drop in for others, ranked by what people wait and pay for them. */
@Injectable()
export class Substitutes {
  constructor(
    @InjectRepository(Part) private readonly parts: Repository<Part>,
    private readonly fitting: FittingParts,
    private readonly supply: SupplyOfParts,
  ) {}

  /** @throws ProblemError 404, or 400 for a quantity that is no whole number of pieces */
  async ofPart(number: string, quantity: number, user: Viewer): Promise<SubstitutesDto> {
    const part = await this.parts.findOneBy({ number: number.trim() });
    if (!part) throw notFound('part', number);
    if (!isCountable(quantity, unitOf(part.kind))) {
      const message = `quantity must be a whole number: ${part.number} is counted in pieces.`;
      throw badInput([{ field: 'quantity', value: quantity, message }]);
    }
    return this.ofPlace(toFitPart(part), {}, part, quantity, user);
  }

  /**
   * Parts that drop in at a place.
   * @param own the original's row; null: the place has no part of its own
   */
  async ofPlace(
    original: SubstitutePart,
    place: FitPlace,
    own: Part | null,
    quantity: number,
    user: Viewer,
  ): Promise<SubstitutesDto> {
    const found = await this.fitting.find(original, place, own);
    const supply = await this.supply.of(
      found.map(({ part }) => part.number),
      quantity,
      user,
      { prefer: 'arrival' },
    );
    const items = found.map((fitting) => toSubstitute(fitting, supply.get(fitting.part.number)));
    items.sort(bySuitability(HOUSE_RULES.currency));
    return { quantity, items: items.slice(0, MOST_LISTED), leftOut: Math.max(0, items.length - MOST_LISTED) };
  }
}

function toSubstitute(
  { part, differences, toCheck, successor }: FittingPart,
  supply: PartSupplyFigures | undefined,
): SubstituteDto {
  const onShelf = supply?.onShelf ?? null;
  return {
    part: toPartSummaryDto(part, onShelf),
    differences,
    toCheck,
    successor,
    onShelf,
    offer: toOffer(supply?.offer ?? null),
    arrivalDays: supply?.arrivalDays ?? null,
  };
}

function toOffer(offer: PartSupplyFigures['offer']): SubstituteOfferDto | null {
  if (!offer?.price) return null;
  const { lineTotal, orderQuantity } = offer.price;
  return {
    supplier: offer.supplierName,
    currency: lineTotal.currency,
    lineTotal: lineTotal.minor,
    orderQuantity,
    leadTimeDays: offer.arrivalDays,
  };
}
