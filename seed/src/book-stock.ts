import { type INestApplicationContext } from '@nestjs/common';
import { StockService } from '@stageyard/backend/stock/stock.service';
import { type Actors } from './actors.js';
import { type BookedPart } from './book-library.js';
import { type YearMovement, yearOf } from './data/stock-year.js';
import { momentOf } from './demo-days.js';

/** Between two slips of a day. */
const SLIP_SECONDS = 12;

interface Slip extends YearMovement {
  number: string;
}

/** Slips of one day that one person books. */
interface Round {
  day: number;
  by: 'purchaser' | 'librarian';
  slips: Slip[];
}

/**
 * Books the year's movements in their order: deliveries as the purchaser, all else as the librarian, who then says from
 * where on a shelf is low.
 * @param today ISO 8601 date that the days are counted back from
 * @returns how many movements were booked
 */
export async function bookStock(
  app: INestApplicationContext,
  actors: Actors,
  parts: readonly BookedPart[],
  today: string,
): Promise<number> {
  const stock = app.get(StockService);
  const years = parts.map(({ row, number }) => ({ number, ...yearOf(row) }));
  const slips = years.flatMap(({ number, movements }) => movements.map((one) => ({ number, ...one })));
  let booked = 0;
  for (const { day, by, slips: some } of roundsOf(slips)) {
    const start = by === 'purchaser' ? 0 : 3600;
    const movements = some.map(({ number, kind, quantity, place, reason }, index) => {
      const at = momentOf(today, day, start + index * SLIP_SECONDS);
      return { number, kind, quantity, place, reason, at };
    });
    booked += await stock.bookMany(actors[by], movements);
  }
  for (const { number, leastStock } of years) {
    if (leastStock !== null) await stock.setLeast(actors.librarian, number, { leastStock, version: 1 });
  }
  return booked;
}

/** Day by day; on each, deliveries are put away before parts are taken. */
function roundsOf(slips: readonly Slip[]): Round[] {
  const rounds = new Map<string, Round>();
  for (const slip of slips) {
    const by = slip.kind === 'received' ? 'purchaser' : 'librarian';
    const key = `${slip.day} ${by}`;
    const round = rounds.get(key) ?? { day: slip.day, by, slips: [] };
    round.slips.push(slip);
    rounds.set(key, round);
  }
  return [...rounds.values()].sort((a, b) => a.day - b.day || b.by.localeCompare(a.by));
}
