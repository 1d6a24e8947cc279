import { Injectable } from '@nestjs/common';
import { offerState } from '@stageyard/libs/bill-of-materials';
import { type FieldIssue } from '@stageyard/libs/units';
import { AuditService } from '../audit/audit.service.js';
import { type SignedInUser } from '../auth/signed-in-user.js';
import { DEFAULT_BUILD_QUANTITY } from '../briefs/requirement.js';
import { Clock } from '../common/clock.js';
import { badInput, ChangedMeanwhileError } from '../common/errors.js';
import { updateVersioned } from '../database/update-versioned.js';
import { WriteQueue } from '../database/write-queue.js';
import { OffersFinder, type PartOffer } from '../offers/offers-finder.service.js';
import { BomService } from '../trains/bom.service.js';
import { type TrainDto } from '../trains/dto/train.dto.js';
import { Train } from '../trains/entities/train.entity.js';
import { TrainReader } from '../trains/train-reader.js';
import { type BuyingInputDto, type OfferChoiceInputDto } from './dto/buying-input.dto.js';

type Person = Pick<SignedInUser, 'id' | 'name'>;

/** One part and the offer it is bought from from now on; null: the rule chooses. */
interface CheckedChoice {
  partNumber: string;
  offer: PartOffer | null;
}

/** How trains are bought: how many at once, and which offers. */
@Injectable()
export class BuyingService {
  constructor(
    private readonly writes: WriteQueue,
    private readonly audit: AuditService,
    private readonly clock: Clock,
    private readonly reader: TrainReader,
    private readonly boms: BomService,
    private readonly offers: OffersFinder,
  ) {}

  /**
   * Sets what the input names; what stands that way already is left alone and changes no version.
   * @throws ProblemError 400 naming every choice that cannot be, 404, or 409 when the train changed since
   */
  async choose(code: string, input: BuyingInputDto, actor: Person): Promise<TrainDto> {
    await this.writes.run(async (manager) => {
      const before = await this.reader.load(manager, code);
      // Before the choices: what fits the train as it was seen may not fit it any more.
      if (before.version !== input.version)
        throw new ChangedMeanwhileError(await this.reader.describe(before));
      const checked = (await this.check(before, input.choices ?? [])).filter(
        ({ partNumber, offer }) => (offer?.id ?? null) !== chosenId(before, partNumber),
      );
      const wasBuilt = before.buildQuantity ?? DEFAULT_BUILD_QUANTITY;
      const buildQuantity = input.buildQuantity ?? wasBuilt;
      if (buildQuantity === wasBuilt && checked.length === 0) return;
      const offerChoices = merged(before.offerChoices ?? {}, checked);
      const change = { buildQuantity, offerChoices, updatedAt: this.clock.iso() };
      const current = () => this.reader.describe(before);
      const after = await updateVersioned<Train>(manager, Train, { code }, input.version, change, current);
      const common = { actor, entityId: code };
      if (buildQuantity !== wasBuilt) {
        await this.audit.record(manager, {
          ...common,
          action: 'changed',
          entity: 'train',
          summary: `Build quantity of ${code} is ${buildQuantity}`,
          before: audited(before),
          after: audited(after),
        });
      }
      for (const { partNumber, offer } of checked) {
        await this.audit.record(manager, {
          ...common,
          action: offer ? 'offer chosen' : 'offer left to the rule',
          entity: 'offer-choice',
          summary: offer
            ? `Chose the offer of ${offer.supplierName} for ${partNumber} of ${code}`
            : `Left the offer for ${partNumber} of ${code} to the rule`,
          before: { offerId: chosenId(before, partNumber) },
          after: { offerId: offer?.id ?? null },
        });
      }
    });
    return this.reader.get(code);
  }

  private async check(train: Train, choices: readonly OfferChoiceInputDto[]): Promise<CheckedChoice[]> {
    if (choices.length === 0) return [];
    const { lines } = await this.boms.ofTrain(train.code);
    const onTrain = new Map(
      lines.flatMap(({ partNumber }) => (partNumber === null ? [] : [[lower(partNumber), partNumber]])),
    );
    // A choice for a part that has left the train can still be taken back.
    const chosen = new Map(Object.keys(train.offerChoices ?? {}).map((number) => [lower(number), number]));
    const offers = await this.offers.forParts([...onTrain.values()]);
    const on = this.clock.today();
    const issues: FieldIssue[] = [];
    const checked = choices.map(({ partNumber: asked, offerId = null }, index): CheckedChoice => {
      const known = onTrain.get(lower(asked));
      const partNumber = known ?? chosen.get(lower(asked)) ?? asked;
      if (known === undefined && (offerId !== null || !chosen.has(lower(asked)))) {
        const message = `${asked} is not on the bill of materials of ${train.code}. Choose offers for its own parts.`;
        issues.push({ field: `choices.${index}.partNumber`, value: asked, message });
        return { partNumber, offer: null };
      }
      if (offerId === null) return { partNumber, offer: null };
      const offer = offers.get(partNumber)?.find(({ id }) => id === offerId);
      const message = refusal(partNumber, offer, on);
      if (message) issues.push({ field: `choices.${index}.offerId`, value: offerId, message });
      return { partNumber, offer: offer ?? null };
    });
    issues.push(...doubled(checked));
    if (issues.length > 0) throw badInput(issues);
    return checked;
  }
}

/** Why an offer cannot be chosen for a part; null when it can. */
function refusal(partNumber: string, offer: PartOffer | undefined, on: string): string | null {
  if (!offer) return `This is no offer for ${partNumber}. Choose one of the offers for this part.`;
  const name = `This offer of ${offer.supplierName}`;
  switch (offerState(offer, on, offer.standing)) {
    case 'closed':
      return `${name} is closed. Choose an open one.`;
    case 'expired':
      return `${name} ended on ${offer.validUntil ?? ''}. Ask for a new price, or choose another offer.`;
    case 'not-yet':
      return `${name} starts on ${offer.validFrom}. Choose one that is valid today.`;
    case 'valid':
      return offer.supplierStanding === 'active'
        ? null
        : `${offer.supplierName} is closed. Choose an offer of an active supplier.`;
  }
}

function doubled(checked: readonly CheckedChoice[]): FieldIssue[] {
  const seen = new Set<string>();
  return checked.flatMap(({ partNumber }, index): FieldIssue[] => {
    const key = lower(partNumber);
    if (!seen.has(key)) {
      seen.add(key);
      return [];
    }
    const message = `${partNumber} is named twice. Choose one offer for it.`;
    return [{ field: `choices.${index}.partNumber`, value: partNumber, message }];
  });
}

function merged(
  before: Readonly<Record<string, number>>,
  checked: readonly CheckedChoice[],
): Record<string, number> | null {
  const choices = new Map(Object.entries(before));
  for (const { partNumber, offer } of checked) {
    if (offer) choices.set(partNumber, Number(offer.id));
    else choices.delete(partNumber);
  }
  return choices.size > 0 ? Object.fromEntries(choices) : null;
}

function chosenId({ offerChoices }: Train, partNumber: string): string | null {
  const id = offerChoices?.[partNumber];
  return id === undefined ? null : String(id);
}

function lower(partNumber: string): string {
  return partNumber.toLowerCase();
}

function audited({ buildQuantity, version }: Train) {
  return { buildQuantity: buildQuantity ?? DEFAULT_BUILD_QUANTITY, version };
}
