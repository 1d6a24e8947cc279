import { rmSync, writeFileSync } from 'node:fs';
import type BetterSqlite3 from 'better-sqlite3';
import { type FieldIssue } from '../common/errors.js';
import { type CheckedRow } from './check-row.js';
import { OFFER_COLUMNS, PART_COLUMNS, list } from './columns.js';

/** Rows written to the stage in one transaction. */
const ROWS_AT_ONCE = 5000;
/** Findings that one refusal lists. */
export const MOST_FINDINGS = 100;

/**
 * Checked rows wait here, in a file of their own beside the database, until all of them are known to be good. The file
 * is thrown away after the load, so nothing in it needs to outlive a crash.
 */
export class Stage {
  private readonly insertPart: BetterSqlite3.Statement;
  private readonly insertOffer: BetterSqlite3.Statement;
  private readonly insertOpening: BetterSqlite3.Statement;
  parts = 0;
  offers = 0;
  counts = 0;

  /** @param database the writing connection, to which the file is attached as `stage` */
  constructor(
    private readonly database: BetterSqlite3.Database,
    private readonly file: string,
  ) {
    // A connection that must find its database would not make another file either; an empty one is an empty database.
    writeFileSync(file, '', { mode: 0o600 });
    database.prepare(`ATTACH ? AS "stage"`).run(file);
    database.pragma('stage.journal_mode = MEMORY');
    database.pragma('stage.synchronous = OFF');
    database.exec(`
      CREATE TABLE "stage"."part" ("row" integer PRIMARY KEY, "number" text COLLATE NOCASE, "blanks" integer, ${list(PART_COLUMNS)});
      CREATE TABLE "stage"."offer" ("row" integer, "nth" integer, "supplierId" integer, ${list(OFFER_COLUMNS)},
        PRIMARY KEY ("row", "nth")) WITHOUT ROWID;
      CREATE TABLE "stage"."opening" ("row" integer PRIMARY KEY, "place" text, "thousandths" integer);`);
    const marks = (count: number) => Array.from({ length: count }, () => '?').join(', ');
    this.insertPart = database.prepare(
      `INSERT INTO "stage"."part" VALUES (${marks(PART_COLUMNS.length + 3)})`,
    );
    this.insertOffer = database.prepare(
      `INSERT INTO "stage"."offer" VALUES (${marks(OFFER_COLUMNS.length + 3)})`,
    );
    this.insertOpening = database.prepare(`INSERT INTO "stage"."opening" VALUES (?, ?, ?)`);
  }

  /** Parts so far that get the next running number. */
  private blanks = 0;

  /** @param row counted from 1; without gaps, unless the load is refused anyway */
  add(row: number, { number, part, offers, opening }: CheckedRow): void {
    if (this.parts % ROWS_AT_ONCE === 0) this.next();
    this.parts += 1;
    if (number === null) this.blanks += 1;
    const attributes = JSON.stringify(part.attributes);
    const columns = PART_COLUMNS.map((column) => (column === 'attributes' ? attributes : part[column]));
    this.insertPart.run(row, number, this.blanks, columns);
    for (const [nth, { supplierId, content }] of offers.entries()) {
      const breaks = JSON.stringify(content.breaks);
      const terms = OFFER_COLUMNS.map((column) => (column === 'breaks' ? breaks : content[column]));
      this.insertOffer.run(row, nth, supplierId, terms);
    }
    this.offers += offers.length;
    if (opening === null) return;
    this.insertOpening.run(row, opening.place, opening.thousandths);
    this.counts += 1;
  }

  private next(): void {
    this.finish();
    this.database.exec('BEGIN');
  }

  private finish(): void {
    if (this.database.inTransaction) this.database.exec('COMMIT');
  }

  /** Ends the staging; then looks for numbers that stand twice in the load or belong to a part already. */
  close(): FieldIssue[] {
    this.finish();
    this.database.exec(`CREATE INDEX "stage"."part_number" ON "part" ("number") WHERE "number" IS NOT NULL`);
    const doubled = this.database
      .prepare<[number], { row: number; first: number; number: string }>(
        `SELECT MAX("row") AS "row", MIN("row") AS "first", "number" FROM "stage"."part"
          WHERE "number" IS NOT NULL GROUP BY "number" HAVING COUNT(*) > 1 LIMIT ?`,
      )
      .all(MOST_FINDINGS);
    const taken = this.database
      .prepare<[number], { row: number; number: string; description: string }>(
        `SELECT "staged"."row", "part"."number", "part"."description" FROM "stage"."part" "staged"
          CROSS JOIN "main"."part" "part" ON "part"."number" = "staged"."number"
          WHERE "staged"."number" IS NOT NULL LIMIT ?`,
      )
      .all(MOST_FINDINGS);
    return [
      ...doubled.map(({ row, first, number }) => {
        const message = `Row ${row} has the number ${number} of row ${first}. Give one of them another number.`;
        return { field: numberOf(row), value: number, message };
      }),
      ...taken.map(({ row, number, description }) => {
        const message = `Row ${row}: the number ${number} belongs to “${description}” already. Choose another, or leave it blank.`;
        return { field: numberOf(row), value: number, message };
      }),
    ];
  }

  remove(): void {
    if (this.database.inTransaction) this.database.exec('ROLLBACK');
    this.database.exec('DETACH "stage"');
    rmSync(this.file, { force: true });
  }
}

/** How a refusal names the number of a row, counted from 1. */
function numberOf(row: number): string {
  return `rows.${row - 1}.part.number`;
}
