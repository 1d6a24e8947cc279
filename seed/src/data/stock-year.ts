import { type Build, demoBuilds, lineOf } from './builds.js';
import { type LibraryRow } from './library.js';
import { sellersOf } from './offer-terms-of.js';
import { type PartUsage, usageOf } from './part-usage.js';
import { OVERFLOW_PLACE, placeOf } from './places.js';
import { type Random, randomOf } from './random.js';

/** One movement of the demo year. */
export interface YearMovement {
  kind: 'received' | 'issued' | 'counted' | 'corrected';
  quantity: number;
  place: string;
  reason: string;
  /** Days from the day of loading, below 0. */
  day: number;
}

/** A part's year: what happened, in order, and from where on its shelf is low. */
export interface PartYear {
  movements: YearMovement[];
  /** In the part's unit; null where nobody watches it. */
  leastStock: number | null;
}

/** The van comes every fourth day, and shelves are looked over every other week. */
const VAN_DAYS = 4;
const LOOK_DAYS = 14;
const OPENING_DAYS = [-364, -360] as const;
const MIDYEAR_DAYS = [-184, -178] as const;
/** Orders forgotten from here on leave shelves low today. */
const LATE_SINCE = -75;
const NEVER: PartYear = { movements: [], leastStock: null };

const GAINS = [
  'Found behind the drawer',
  'Put back from a cancelled build',
  'Slip was booked twice',
] as const;
const LOSSES = [
  'Damaged when it fell',
  'Teeth chipped, scrapped',
  'Given away as a sample',
  'Wrong slip',
] as const;

/** What one supplier brings on one day is on one note. */
function deliveryNote(from: string, day: number): string {
  return `Delivery from ${from}, note ${randomOf(`${from} on ${day}`).whole(3000, 9999)}`;
}

/** Plays a part's year through: opening count, builds, deliveries, a count in summer, now and then a correction. */
export function yearOf(row: LibraryRow): PartYear {
  const usage = usageOf(row);
  if (usage === null) return NEVER;
  const year = new ShelfYear(row, usage);
  year.play(demoBuilds().filter(({ line }) => line === lineOf(row)));
  return { movements: year.movements, leastStock: year.leastStock };
}

class ShelfYear {
  readonly movements: YearMovement[] = [];
  private readonly random: Random;
  private readonly place: string;
  private level = 0;
  private delivery: { day: number; steps: number } | null = null;

  constructor(
    private readonly row: LibraryRow,
    private readonly usage: PartUsage,
  ) {
    this.random = randomOf(`year of ${row.description}`);
    this.place = placeOf(row);
  }

  get leastStock(): number | null {
    return this.usage.watched ? this.units(this.usage.reorderAt) : null;
  }

  play(builds: readonly Build[]): void {
    this.count(this.random.whole(...OPENING_DAYS), this.usage.opening, 'Yearly count');
    if (this.random.chance(0.04)) this.overflow();
    const midyear = this.random.chance(0.15) ? this.random.whole(...MIDYEAR_DAYS) : null;
    const mended = this.random.chance(0.05) ? this.random.whole(-24, -1) * LOOK_DAYS : null;
    const happenings = [
      ...builds.map((build) => ({ day: build.day, act: () => this.build(build) })),
      ...(midyear === null ? [] : [{ day: midyear, act: () => this.recount(midyear) }]),
      ...(mended === null ? [] : [{ day: mended, act: () => this.correct(mended) }]),
    ].sort((a, b) => a.day - b.day);
    for (const { day, act } of happenings) {
      this.arrivals(day);
      act();
    }
    this.arrivals(-1);
  }

  private build({ name, day, drives }: Build): void {
    if (this.level > 0 && this.random.chance(this.usage.pace)) {
      const steps = Math.min(this.level, this.usage.perDrive * drives);
      this.book('issued', -steps, day, name);
    }
    this.orderAgain(day);
  }

  /** Made parts come from the own shop, bought ones from the usual supplier. */
  private orderAgain(day: number): void {
    if (this.delivery !== null || this.level > this.usage.reorderAt) return;
    if (this.usage.orderedLate && day > LATE_SINCE) return;
    const wanted = this.usage.reorderAt * 2 + this.usage.perDrive;
    const steps = Math.ceil(wanted / this.usage.pack) * this.usage.pack;
    const days = this.row.supply === 'made' ? this.random.whole(4, 12) : this.random.whole(3, 24);
    this.delivery = { day: Math.ceil((day + days) / VAN_DAYS) * VAN_DAYS, steps };
  }

  private arrivals(day: number): void {
    if (this.delivery === null || this.delivery.day > day) return;
    const { day: arrived, steps } = this.delivery;
    this.delivery = null;
    const [from] = sellersOf(this.row);
    const reason = from === undefined ? 'Made in the own shop' : deliveryNote(from, arrived);
    this.book('received', steps, arrived, reason);
  }

  private recount(day: number): void {
    const off = this.random.chance(0.15) ? this.random.pick([-2, -1, -1, 1]) : 0;
    this.count(day, Math.max(0, this.level + off), off === 0 ? '' : 'Counted twice, the figure is right');
  }

  private correct(day: number): void {
    const steps =
      this.random.chance(0.4) || this.level < 3 ? this.random.whole(1, 2) : -this.random.whole(1, 2);
    this.book('corrected', steps, day, this.random.pick(steps > 0 ? GAINS : LOSSES));
  }

  private overflow(): void {
    const quantity = this.units(this.usage.pack * 2);
    const reason = 'Yearly count';
    this.movements.push({ kind: 'counted', quantity, place: OVERFLOW_PLACE, reason, day: OPENING_DAYS[1] });
  }

  private count(day: number, steps: number, reason: string): void {
    this.level = steps;
    this.movements.push({ kind: 'counted', quantity: this.units(steps), place: this.place, reason, day });
  }

  private book(kind: 'received' | 'issued' | 'corrected', steps: number, day: number, reason: string): void {
    this.level += steps;
    const quantity = this.units(kind === 'issued' ? -steps : steps);
    this.movements.push({ kind, quantity, place: this.place, reason, day });
  }

  private units(steps: number): number {
    return steps / this.usage.stepsPerUnit;
  }
}
