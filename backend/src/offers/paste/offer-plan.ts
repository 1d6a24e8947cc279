import { DomainError, type FieldIssue } from '@stageyard/libs/units';
import { ProblemError } from '../../common/errors.js';
import { type RowReader, shownCell } from '../../common/paste/row-reader.js';
import { type Offer } from '../entities/offer.entity.js';
import { type OfferContent, storedContent } from '../offer-changes.js';
import { checkContent, closedReasons, contentOf } from '../offer-content.js';
import { changeLines } from './change-lines.js';
import { type OfferPasteDefaultsDto } from './dto/offer-paste-defaults.dto.js';
import { type OfferPasteAction } from './dto/offer-paste-row.dto.js';
import { type StatedOffer } from './group-rows.js';
import { matchOffer } from './match-offer.js';
import { type OfferColumn } from './paste-columns.js';
import { type PastedPart, type PasteGround } from './paste-ground.js';
import { type StatedTerms } from './read-row.js';

/** What the rows of one offer would do. */
export interface PlannedOffer {
  stated: StatedOffer;
  action: OfferPasteAction;
  part: PastedPart | null;
  /** The offer that changes, or is the same already. */
  before: Offer | null;
  /** What it would say; null when the rows are wrong. */
  content: OfferContent | null;
  changes: string[];
  /** A present offer that stays beside the new one, which starts later. */
  beside: Offer | null;
}

/** Goes through pasted offers and says what each does; what is wrong is noted at its row. */
export class OfferPlan {
  /** The first rows of offers that are changed or added already, by what tells them apart. */
  private readonly taken = new Map<string, number>();

  constructor(
    private readonly ground: PasteGround,
    private readonly defaults: OfferPasteDefaultsDto,
  ) {}

  take(stated: StatedOffer): PlannedOffer {
    const first = firstReader(stated);
    const part = this.partOf(stated, first);
    const wrong: PlannedOffer = {
      stated,
      action: 'wrong',
      part,
      before: null,
      content: null,
      changes: [],
      beside: null,
    };
    if (!part) return wrong;
    for (const { message } of closedReasons(part, this.ground.supplier)) first.wrong('partNumber', message);
    const match = matchOffer(stated, part, this.ground, this.defaults.validFrom);
    if (match.problem !== null) first.wrong(null, match.problem);
    const { before, beside } = match;
    this.refuseTaken(before ? `${before.id}` : `${part.id} ${ownNumber(stated)}`, first);
    if (isWrong(stated)) return wrong;
    const content = before ? this.changed(stated, before) : this.added(stated);
    check(content, part, stated, this.ground.today);
    if (isWrong(stated)) return wrong;
    if (!before) return { ...wrong, action: 'add', content, beside };
    const changes = changeLines(storedContent(before), content);
    return { ...wrong, action: changes.length > 0 ? 'change' : 'same', before, content, changes };
  }

  private partOf(stated: StatedOffer, first: RowReader<OfferColumn>): PastedPart | null {
    const [{ partNumber, supplierPartNumber } = { partNumber: '', supplierPartNumber: '' }] = stated.rows;
    if (partNumber !== '') {
      const part = this.ground.parts.get(partNumber.toLowerCase());
      return (
        part ??
        first.wrong(
          'partNumber',
          `There is no part “${shownCell(partNumber)}”. Check the number, or add the part first.`,
        )
      );
    }
    if (supplierPartNumber === '') return null;
    const { code } = this.ground.supplier;
    const [part, ...others] = this.ground.bySupplierNumber.get(supplierPartNumber.toLowerCase()) ?? [];
    if (!part) {
      return first.wrong(
        'supplierPartNumber',
        `${code} has offered nothing under this number yet. Give the part number too.`,
      );
    }
    if (others.length === 0) return part;
    const numbers = [part, ...others].map(({ number }) => number).join(', ');
    return first.wrong(
      'supplierPartNumber',
      `${code} has offered ${shownCell(numbers)} under this number. Give the part number too.`,
    );
  }

  private refuseTaken(offer: string, first: RowReader<OfferColumn>): void {
    const row = this.taken.get(offer);
    if (row === undefined) this.taken.set(offer, first.row);
    else {
      first.wrong(
        null,
        `Row ${row} is about the same offer. Keep one of them, or give the part number and the supplier part number in both.`,
      );
    }
  }

  private changed(stated: StatedOffer, before: Offer): OfferContent {
    const first = firstReader(stated);
    const { terms } = stated;
    const [
      { currency, currencyStated, supplierPartNumber } = {
        currency: '',
        currencyStated: true,
        supplierPartNumber: '',
      },
    ] = stated.rows;
    // A price must not change a hundredfold because a column is missing.
    if (terms.per === null && before.per !== 1) {
      first.wrong(
        'per',
        `The present offer is priced for ${before.per}, and the row does not say for how many. Say it.`,
      );
    }
    if (!currencyStated && currency !== before.currency) {
      first.wrong(
        'currency',
        `The present offer is in ${before.currency}, and the row does not say its currency. Say it.`,
      );
    }
    const breaks = breaksOf(stated);
    return {
      ...storedContent(before),
      supplierPartNumber: supplierPartNumber || before.supplierPartNumber,
      currency,
      per: terms.per ?? before.per,
      breaks,
      pack: terms.pack ?? before.pack,
      leastQuantity: terms.leastQuantity ?? leastQuantityOf(before, breaks),
      leadTimeDays: terms.leadTimeDays ?? before.leadTimeDays,
      validFrom: terms.validFrom ?? this.defaults.validFrom ?? before.validFrom,
      validUntil: terms.validUntil ?? this.defaults.validUntil ?? before.validUntil,
      pricedOn: terms.pricedOn ?? this.defaults.pricedOn ?? this.ground.today,
      source: terms.source ?? (this.defaults.source || before.source),
      note: terms.note ?? before.note,
    };
  }

  private added(stated: StatedOffer): OfferContent {
    const { terms } = stated;
    const [row] = stated.rows;
    return contentOf(
      {
        breaks: breaksOf(stated),
        supplierPartNumber: row?.supplierPartNumber ?? '',
        ...(row && { currency: row.currency }),
        ...stating(terms),
        validFrom: terms.validFrom ?? this.defaults.validFrom ?? this.ground.today,
        validUntil: terms.validUntil ?? this.defaults.validUntil ?? null,
        pricedOn: terms.pricedOn ?? this.defaults.pricedOn ?? this.ground.today,
        source: terms.source ?? this.defaults.source ?? '',
      },
      this.ground.supplier,
      this.ground.today,
    );
  }
}

/** Whether anything is wrong with any row of the offer: then none of them is booked. */
export function isWrong({ rows }: StatedOffer): boolean {
  return rows.some(({ reader }) => reader.problems.length > 0);
}

function firstReader({ rows: [first] }: StatedOffer): RowReader<OfferColumn> {
  if (!first) throw new Error('An offer was stated without a row.');
  return first.reader;
}

/** The supplier's number that the rows give, in small letters. */
function ownNumber({ rows: [first] }: StatedOffer): string {
  return first?.supplierPartNumber.toLowerCase() ?? '';
}

function breaksOf({ breaks }: StatedOffer): OfferContent['breaks'] {
  return breaks.map(({ quantity, unitPrice }) => ({ quantity, unitPrice }));
}

/** A least quantity that was no more than the first price break goes on with it. */
function leastQuantityOf(before: Offer, [first]: OfferContent['breaks']): number {
  const wasTheFirst = before.leastQuantity === before.breaks[0]?.quantity;
  return wasTheFirst && first ? first.quantity : before.leastQuantity;
}

/** The terms that the rows state. */
function stating({ per, pack, leastQuantity, leadTimeDays, note }: StatedTerms) {
  return {
    leadTimeDays,
    ...(per === null ? {} : { per }),
    ...(pack === null ? {} : { pack }),
    ...(leastQuantity === null ? {} : { leastQuantity }),
    ...(note === null ? {} : { note }),
  };
}

/** Holds the terms against the rules; a fault is noted at the row and the column it comes from. */
function check(content: OfferContent, part: PastedPart, stated: StatedOffer, today: string): void {
  try {
    checkContent(content, part, today);
  } catch (error) {
    if (!(error instanceof DomainError || error instanceof ProblemError)) throw error;
    for (const issue of error.errors ?? []) note(issue, stated);
  }
}

function note({ field, value, message }: FieldIssue, stated: StatedOffer): void {
  const [name = '', index, part] = field.split('.');
  const shown = typeof value === 'string' || typeof value === 'number' ? String(value) : '';
  const price = name === 'breaks' ? stated.breaks[Number(index)] : undefined;
  if (price) price.row.reader.wrong(part === 'quantity' ? 'from' : 'price', message, shown);
  else firstReader(stated).wrong(name === 'breaks' ? 'price' : (name as OfferColumn), message, shown);
}
