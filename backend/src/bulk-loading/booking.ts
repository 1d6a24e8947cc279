import type BetterSqlite3 from 'better-sqlite3';
import { RUNNING_PREFIX, runningNumber } from '../parts/part-number.js';
import { type BulkLoadTask } from './bulk-messages.js';
import { list, OFFER_COLUMNS, PART_COLUMNS } from './columns.js';
import { recordLoad } from './load-record.js';
import { type Stage } from './stage.js';

const STAMPS = ['version', 'createdAt', 'updatedAt', 'updatedBy'] as const;
const PART_TARGETS = ['id', 'number', ...PART_COLUMNS, 'createdAt', 'updatedAt', 'updatedBy'];
const OFFER_TARGETS = ['partId', 'supplierId', ...OFFER_COLUMNS, ...STAMPS];

/** Parts staged from one row to another, both counted from 1 and included. */
interface Turn {
  from: number;
  to: number;
}

/** Books staged rows turn by turn; each turn is one transaction that leaves whole parts with their offers and counts. */
export class Booking {
  private from = 1;
  first: string | null = null;
  last: string | null = null;

  constructor(
    private readonly database: BetterSqlite3.Database,
    private readonly stage: Stage,
    private readonly task: BulkLoadTask,
  ) {
    database.function('running_number', { deterministic: true }, (count: unknown) =>
      runningNumber(Number(count)),
    );
  }

  get done(): number {
    return this.from - 1;
  }

  get isOver(): boolean {
    return this.from > this.stage.parts;
  }

  /** Books the next rows; call it only in a turn of the write queue. */
  turn(): void {
    const turn = { from: this.from, to: Math.min(this.from + this.task.turnSize - 1, this.stage.parts) };
    this.database
      .transaction(() => {
        const idBase = this.lastPartId() - turn.from + 1;
        this.insertParts(turn, idBase, this.takeNumbers(turn));
        this.insertOffers(turn, idBase);
        this.insertCounts(turn, idBase);
        this.note(turn, idBase);
      })
      .immediate();
    this.from = turn.to + 1;
  }

  /** Ids are never given twice, even where the last part was removed. */
  private lastPartId(): number {
    const sequence = this.database.prepare<[], { seq: number }>(
      `SELECT "seq" FROM "main"."sqlite_sequence" WHERE "name" = 'part'`,
    );
    return sequence.get()?.seq ?? 0;
  }

  /**
   * Takes as many running numbers as the turn has blank ones, in a row, none of which any part has or will have.
   * @returns what the count of blanks is added to
   */
  private takeNumbers({ from, to }: Turn): number {
    const [range] = this.database
      .prepare<[number, number], { before: number; blanks: number }>(
        `SELECT MIN("blanks" - ("number" IS NULL)) AS "before", MAX("blanks") AS "blanks"
          FROM "stage"."part" WHERE "row" BETWEEN ? AND ?`,
      )
      .all(from, to);
    if (!range || range.blanks === range.before) return 0;
    const wanted = range.blanks - range.before;
    const series = this.database
      .prepare<[string], { last: number }>(`SELECT "last" FROM "part_number_series" WHERE "prefix" = ?`)
      .get(RUNNING_PREFIX);
    let last = series?.last ?? 0;
    for (let taken = this.lastTaken(last, wanted); taken !== null; taken = this.lastTaken(last, wanted)) {
      last = taken;
    }
    this.database
      .prepare(
        `INSERT INTO "part_number_series" ("prefix", "last") VALUES (?, ?)
          ON CONFLICT ("prefix") DO UPDATE SET "last" = excluded."last"`,
      )
      .run(RUNNING_PREFIX, last + wanted);
    return last - range.before;
  }

  /** The highest of the next running numbers that a part has, in the library or in this load; null when all are free. */
  private lastTaken(last: number, wanted: number): number | null {
    const counts = Array.from({ length: wanted }, (_, index) => last + 1 + index);
    const row = this.database
      .prepare<[string], { taken: number | null }>(
        `SELECT MAX("value") AS "taken" FROM json_each(?)
          WHERE running_number("value") IN (SELECT "number" FROM "main"."part")
             OR running_number("value") IN (SELECT "number" FROM "stage"."part" WHERE "number" IS NOT NULL)`,
      )
      .get(JSON.stringify(counts));
    return row?.taken ?? null;
  }

  private insertParts({ from, to }: Turn, idBase: number, numberBase: number): void {
    const { at, actor } = this.task;
    this.database
      .prepare(
        `INSERT INTO "main"."part" (${list(PART_TARGETS)})
          SELECT "row" + ?, COALESCE("number", running_number("blanks" + ?)), ${list(PART_COLUMNS)}, ?, ?, ?
            FROM "stage"."part" WHERE "row" BETWEEN ? AND ? ORDER BY "row"`,
      )
      .run(idBase, numberBase, at, at, actor.name, from, to);
  }

  private insertOffers({ from, to }: Turn, idBase: number): void {
    const { at, actor } = this.task;
    this.database
      .prepare(
        `INSERT INTO "main"."offer" (${list(OFFER_TARGETS)})
          SELECT "row" + ?, "supplierId", ${list(OFFER_COLUMNS)}, 1, ?, ?, ?
            FROM "stage"."offer" WHERE "row" BETWEEN ? AND ? ORDER BY "row", "nth"`,
      )
      .run(idBase, at, at, actor.name, from, to);
  }

  /** The first count of a place: all that lies there is what it changes. The database keeps the levels by itself. */
  private insertCounts({ from, to }: Turn, idBase: number): void {
    const { at, actor } = this.task;
    this.database
      .prepare(
        `INSERT INTO "main"."stock_movement"
            ("partId", "kind", "change", "counted", "after", "place", "reason", "at", "actorId", "actorName")
          SELECT "row" + ?, 'counted', "thousandths", "thousandths", "thousandths", "place", 'Opening count', ?, ?, ?
            FROM "stage"."opening" WHERE "row" BETWEEN ? AND ? ORDER BY "row"`,
      )
      .run(idBase, at, actor.id, actor.name, from, to);
  }

  /** Writes what the record says of this turn, if it says anything. */
  private note(turn: Turn, idBase: number): void {
    const number = this.database.prepare<[number], { number: string }>(
      `SELECT "number" FROM "main"."part" WHERE "id" = ?`,
    );
    const numberAt = (row: number) => number.get(row + idBase)?.number ?? null;
    this.first ??= numberAt(turn.from);
    this.last = numberAt(turn.to);
    const { parts, offers, counts } = this.stage;
    const load = { parts, offers, counts, first: this.first, last: this.last };
    if (turn.to === parts) recordLoad(this.database, this.task, load, 'loaded');
    else if (turn.from === 1) recordLoad(this.database, this.task, load, 'began to load');
  }
}
