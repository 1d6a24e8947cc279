import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import {
  type Fit,
  fitAsSubstitute,
  type FitPlace,
  type SubstitutePart,
} from '@stageyard/libs/bill-of-materials';
import { Repository } from 'typeorm';
import { Part } from '../parts/entities/part.entity.js';
import { narrowToCandidates } from './candidate-conditions.js';
import { toFitPart } from './fit-part.js';

/** Most parts that are held against the rules of fit for one question, so that others need not wait long. */
const MOST_CANDIDATES = 500;
/** Longest chain of successors that is followed. */
const LONGEST_CHAIN = 100;

/** A part that drops in, and how. */
export interface FittingPart extends Pick<Fit, 'differences' | 'toCheck'> {
  part: Part;
  /** Follows the original in the library's chain of successors. */
  successor: boolean;
}

/** Cleared parts of the library that drop in for another, or at a place. */
@Injectable()
export class FittingParts {
  constructor(@InjectRepository(Part) private readonly parts: Repository<Part>) {}

  /**
   * @param own the original's row, whose successor is marked; null: a place without a part of its own
   * @returns in no order
   */
  async find(original: SubstitutePart, place: FitPlace, own: Part | null): Promise<FittingPart[]> {
    const rows = this.parts.createQueryBuilder('part');
    narrowToCandidates(rows, original.sizes, place);
    // Without an order: one would tempt the database to walk an index of the whole library.
    const found = await rows.limit(MOST_CANDIDATES).getMany();
    const successor = await this.successorOf(own);
    const candidates =
      successor && found.every(({ id }) => id !== successor.id) ? [successor, ...found] : found;
    return candidates.flatMap((part): FittingPart[] => {
      const { fits, differences, toCheck } = fitAsSubstitute(original, toFitPart(part), place);
      return fits ? [{ part, differences, toCheck, successor: part.id === successor?.id }] : [];
    });
  }

  /** The first cleared part that the chain of successors leads to. */
  private async successorOf(own: Part | null): Promise<Part | null> {
    let part = own;
    for (let steps = 0; part?.successorNumber && steps < LONGEST_CHAIN; steps += 1) {
      part = await this.parts.findOneBy({ number: part.successorNumber });
      if (part?.standing === 'cleared') return part;
    }
    return null;
  }
}
