import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { In, Repository } from 'typeorm';
import { Part } from '../parts/entities/part.entity.js';
import { type AdoptedSpec, gearsOf, type PlacedGear } from './adopted-spec.js';
import { type StockGear } from './train-figures.js';

/** Figures of the library and of a train that differ by less are the same; both come from decimals. */
const SAME = 1e-6;
/** A stock gear is taken by itself only while it is at most this much wider than asked for. */
const WIDEST = 1.5;

/** Stock gears that can stand in a train. */
@Injectable()
export class StockGears {
  constructor(@InjectRepository(Part) private readonly parts: Repository<Part>) {}

  /**
   * A cleared gear with the very data asked for and at least its face width, the narrowest first; null when there
   * is none. A shift the library does not know counts as 0.
   */
  async match(angles: GearAngles, { gear, module }: PlacedGear): Promise<StockGear | null> {
    const rows = this.parts
      .createQueryBuilder('part')
      .where("part.kind = 'gear' AND part.standing = 'cleared'")
      .andWhere('part.teeth = :teeth', { teeth: gear.teeth });
    const same = { module, pressureAngleDeg: angles.pressureAngleDeg, helixAngleDeg: angles.helixAngleDeg };
    for (const [column, value] of Object.entries(same)) {
      rows.andWhere(`part.${column} BETWEEN :${column}Low AND :${column}High`, {
        [`${column}Low`]: value - SAME,
        [`${column}High`]: value + SAME,
      });
    }
    if (angles.helixAngleDeg > 0) rows.andWhere('part.hand = :hand', { hand: gear.hand });
    const found = await rows
      .andWhere('COALESCE(part.profileShift, 0) BETWEEN :shiftLow AND :shiftHigh', {
        shiftLow: gear.profileShift - SAME,
        shiftHigh: gear.profileShift + SAME,
      })
      .andWhere('part.faceWidth BETWEEN :narrow AND :wide', {
        narrow: gear.faceWidth - SAME,
        wide: gear.faceWidth * WIDEST,
      })
      .orderBy('part.faceWidth', 'ASC')
      .addOrderBy('part.number', 'ASC')
      .limit(1)
      .getOne();
    return found && { number: found.number, bore: found.bore, standing: found.standing };
  }

  /** The chosen parts of any number of trains, by number, in one query. */
  async chosenIn(specs: readonly Pick<AdoptedSpec, 'stages'>[]): Promise<Map<string, Part>> {
    const numbers = specs.flatMap((spec) =>
      gearsOf(spec).flatMap(({ gear }) => (gear.partNumber === null ? [] : [gear.partNumber])),
    );
    return this.byNumber(numbers);
  }

  /** Keys are the numbers as they were asked for; the library does not tell capitals from small letters. */
  async byNumber(numbers: readonly string[]): Promise<Map<string, Part>> {
    if (numbers.length === 0) return new Map();
    const found = await this.parts.findBy({ number: In([...new Set(numbers)]) });
    const parts = new Map(found.map((part) => [part.number.toLowerCase(), part]));
    return new Map(
      numbers.flatMap((number) => {
        const part = parts.get(number.toLowerCase());
        return part ? [[number, part] as const] : [];
      }),
    );
  }
}

type GearAngles = Pick<AdoptedSpec, 'pressureAngleDeg' | 'helixAngleDeg'>;
