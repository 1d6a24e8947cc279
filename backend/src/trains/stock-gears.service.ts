import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { fromThousandths, toThousandths } from '@stageyard/libs/bill-of-materials';
import { In, Repository } from 'typeorm';
import { Clock } from '../common/clock.js';
import { type Row } from '../database/read-task.js';
import { ReadThreads } from '../database/read-threads.js';
import { Part } from '../parts/entities/part.entity.js';
import { type AdoptedSpec, gearsOf } from './adopted-spec.js';
import { BEST_GEARS, FIRST_GEARS, GEAR_MODULES } from './stock-gear-query.js';

/** Figures of the library and of a train that differ by less are the same; both come from decimals. */
const SAME = 1e-6;
/** A stock gear is taken by itself only while it is at most this much wider than asked for. */
const WIDEST = 1.5;

/** A gear that a train asks for, and how many of it. Lengths mm, angles degrees, shift in modules. */
export interface GearNeed {
  module: number;
  teeth: number;
  pressureAngleDeg: number;
  helixAngleDeg: number;
  /** null: a spur gear. */
  hand: 'left' | 'right' | null;
  profileShift: number;
  faceWidth: number;
  wanted: number;
}

/** The stock gear taken for a need. */
export interface MatchedGear {
  number: string;
  /** mm */
  bore: number | null;
  /** Pieces; null when it never lay on a shelf. */
  onShelf: number | null;
}

interface MatchRow {
  need: number;
  number: string;
  bore: number | null;
  /** Whole thousandths. */
  shelf: number | null;
  offered: 0 | 1;
}

/** A need as the query reads it. */
interface Question {
  /** Its place in the list of needs. */
  need: number;
}

/** Stock gears that can stand in a train. */
@Injectable()
export class StockGears {
  constructor(
    @InjectRepository(Part) private readonly parts: Repository<Part>,
    private readonly threads: ReadThreads,
    private readonly clock: Clock,
  ) {}

  /**
   * For each need a cleared gear with the very data asked for and at least its face width, or null. A shift the library
   * does not know counts as 0. Among equal gears: one whose shelf covers what is wanted, then one with a valid offer,
   * then the narrowest, then the lowest number. A reading thread looks them up, in a few queries for any number of needs.
   * @returns in the order of the needs
   */
  async matchMany(needs: readonly GearNeed[]): Promise<(MatchedGear | null)[]> {
    const found: (MatchedGear | null)[] = needs.map(() => null);
    if (needs.length === 0) return found;
    const [modules = []] = await this.threads.read({ sql: GEAR_MODULES, params: [] });
    const asked = needs.flatMap((need, index) => questionsOf(need, index, modules));
    const firsts = await this.ask(FIRST_GEARS, asked);
    // A gear without an offer may still have an equal one with: only then all offers are looked at.
    const unsure = new Set(firsts.filter(({ offered }) => !offered).map(({ need }) => need));
    const bests = await this.ask(
      BEST_GEARS,
      asked.filter(({ need }) => unsure.has(need)),
    );
    for (const { need, number, bore, shelf } of [...firsts, ...bests]) {
      found[need] = { number, bore, onShelf: shelf === null ? null : fromThousandths(shelf) };
    }
    return found;
  }

  private async ask(sql: string, asked: readonly Question[]): Promise<MatchRow[]> {
    if (asked.length === 0) return [];
    const on = this.clock.today();
    const [rows = []] = await this.threads.read({ sql, params: [JSON.stringify(asked), on, on] });
    return rows as unknown as MatchRow[];
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

/** What the query asks for one need: once for each module of the library that is the need's. */
function questionsOf(need: GearNeed, index: number, modules: readonly Row[]): Question[] {
  const near = (value: number) => [value - SAME, value + SAME];
  return modules
    .filter(({ module }) => Math.abs(Number(module) - need.module) <= SAME)
    .map(({ module }) => ({
      need: index,
      module,
      teeth: need.teeth,
      pressure: near(need.pressureAngleDeg),
      helix: near(need.helixAngleDeg),
      hand: need.hand,
      shift: near(need.profileShift),
      width: [need.faceWidth - SAME, need.faceWidth * WIDEST],
      wanted: toThousandths(need.wanted),
    }));
}
